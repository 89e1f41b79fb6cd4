import { sha256 } from "@noble/hashes/sha2.js";
import { utf8ToBytes } from "@noble/hashes/utils.js";

/** Crockford's base 32: no I, L, O or U, which are read as something else. */
const DIGITS = "0123456789ABCDEFGHJKMNPQRSTVWXYZ";
const LENGTH = 8;
const PREFIX = "GP";

/**
 * The short code that ties a memo, its PDF and its inputs together, as `GP-7K2M-41XQ`: the first 40 bits of the
 * SHA-256 of `content`, five bits a digit.
 * @param content bytes, or text taken as UTF-8, that the stamp stands for
 */
export function stampOf(content: Uint8Array | string): string {
  const hash = sha256(typeof content === "string" ? utf8ToBytes(content) : content);
  let code = "";
  for (let index = 0; index < LENGTH; index++) {
    const bit = index * 5;
    const byte = Math.floor(bit / 8);
    const pair = (hash[byte]! << 8) | hash[byte + 1]!;
    code += DIGITS[(pair >> (11 - (bit % 8))) & 31];
  }
  return `${PREFIX}-${code.slice(0, 4)}-${code.slice(4)}`;
}

/**
 * A stamp as a person typed it, in the form it was given out: lower case, missing hyphens, and letters mistaken for
 * digits are mended; null for what cannot be a stamp.
 */
export function readStamp(typed: string): string | null {
  const code = typed
    .toUpperCase()
    .replace(/[\s–—-]/g, "")
    .replace(/^GP/, "")
    .replaceAll("O", "0")
    .replace(/[IL]/g, "1");
  if (code.length !== LENGTH || [...code].some((digit) => !DIGITS.includes(digit))) return null;
  return `${PREFIX}-${code.slice(0, 4)}-${code.slice(4)}`;
}
