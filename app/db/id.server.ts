import { createHash, randomBytes } from "node:crypto";
import { customAlphabet } from "nanoid";

/** Not guessable (103 bits), and free of look-alikes, since ids appear in addresses. */
export const newId = customAlphabet("0123456789abcdefghjkmnpqrstvwxyz", 21);

/** 256 random bits for sessions and share links; only its hash is stored. */
export function newToken(): string {
  return randomBytes(32).toString("base64url");
}

export function hashToken(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}
