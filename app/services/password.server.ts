import { hash, verify } from "@node-rs/argon2";

/** argon2id with 19 MiB, two passes, one lane: the first choice of OWASP's password storage guidance (from memory). */
const SETTINGS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export async function hashPassword(password: string): Promise<string> {
  return hash(password.normalize("NFKC"), SETTINGS);
}

/** Made once at first need: an unknown address must cost as much time as a known one. */
let decoy: Promise<string> | undefined;

export async function passwordMatches(passwordHash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword("no account has this password");
  const matches = await verify(passwordHash ?? (await decoy), password.normalize("NFKC"));
  return matches && passwordHash !== null;
}
