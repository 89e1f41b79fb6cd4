import { RateLimiterMemory } from "rate-limiter-flexible";
import { inWriteTransaction } from "~/db/connection.server";
import { endSessionsOf, findUser, findUserByEmail, setPassword } from "~/db/unscoped.server";
import { prepareToken, spendToken, subjectOfToken } from "~/mail/one-time-token.server";
import { queueMail } from "~/mail/outbox.server";
import { log } from "~/services/log.server";
import { hashPassword } from "~/services/password.server";

const LIFETIME_MINUTES = 30;
const MINUTE_MS = 60_000;

/** Nobody's mailbox can be filled from here, and one place cannot try many addresses. */
const byAddress = new RateLimiterMemory({ points: 3, duration: 60 * 60 });
const byPlace = new RateLimiterMemory({ points: 20, duration: 60 * 60 });

/**
 * Sends a link to choose a new password, where the address has an account. Returns at once and tells nothing: the answer
 * to an address that has an account must be that of one that has none, in words and in time.
 */
export function requestReset(email: string, place: string): void {
  setImmediate(() => {
    sendReset(email, place).catch((error: unknown) => log().error({ err: error }, "a reset could not be queued"));
  });
}

async function isThrottled(email: string, place: string): Promise<boolean> {
  const counted = await Promise.allSettled([byAddress.consume(email), byPlace.consume(place)]);
  return counted.some(({ status }) => status === "rejected");
}

async function sendReset(email: string, place: string): Promise<void> {
  if (await isThrottled(email, place)) return;
  const user = await findUserByEmail(email);
  if (!user) return;
  await inWriteTransaction(async (transaction) => {
    const tokenId = await prepareToken("reset-password", user.id, LIFETIME_MINUTES * MINUTE_MS, transaction);
    const facts = { name: user.name, minutes: LIFETIME_MINUTES };
    const mail = { template: "reset-password" as const, facts };
    await queueMail({ recipient: user.email, mail, path: "/reset-password/", tokenId }, transaction);
  });
}

/** Whether a link can still be used; looking does not use it up. */
export async function resetIsOpen(token: string): Promise<boolean> {
  return (await subjectOfToken("reset-password", token)) !== null;
}

/** Changes the password, ends every sign-in and tells the person by mail. False where the link is void. */
export async function resetPassword(token: string, password: string, place: string): Promise<boolean> {
  const passwordHash = await hashPassword(password);
  return inWriteTransaction(async (transaction) => {
    const userId = await spendToken("reset-password", token, transaction);
    const user = userId === null ? null : await findUser(userId);
    if (!user) return false;
    await setPassword(user.id, passwordHash, transaction);
    await endSessionsOf(user.id, transaction);
    const when = `${new Date().toISOString().slice(0, 16).replace("T", " ")} UTC`;
    const mail = { template: "password-changed" as const, facts: { name: user.name, when, from: place } };
    await queueMail({ recipient: user.email, mail, path: "/reset-password" }, transaction);
    return true;
  });
}
