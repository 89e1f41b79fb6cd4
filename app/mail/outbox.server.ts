/**
 * Mail is written into the database together with what it tells of, and sent from there: what is rolled back is never
 * sent, and a mail server that is away loses nothing.
 */
import { Op, type Transaction } from "sequelize";
import type { Mail } from "./mail-facts";
import { issueToken } from "./one-time-token.server";
import { retryDelay } from "./retry-delay";
import { isRefusedForGood, mailIsSetUp, sendMail } from "./send-mail.server";
import { newId } from "~/db/id.server";
import { OutboxMail } from "~/db/models/outbox-mail.server";
import { config } from "~/services/config.server";
import { log } from "~/services/log.server";
import { onShutdown } from "~/services/shutdown.server";

const AT_ONCE = 20;
const LONGEST_TIMER_MS = 60 * 60 * 1000;

export interface QueuedMail {
  recipient: string;
  mail: Mail;
  /** Where its button leads, from the root of the site. With a token it ends in a slash. */
  path: string;
  tokenId?: string;
}

/** Puts a mail in line; it leaves when the transaction has been committed. */
export async function queueMail({ recipient, mail, path, tokenId }: QueuedMail, transaction: Transaction) {
  const values = { recipient, mail, path, tokenId: tokenId ?? null, state: "waiting" as const, attempts: 0 };
  await OutboxMail.create({ id: newId(), ...values, dueAt: new Date(), lastError: null }, { transaction });
  transaction.afterCommit(startSending);
}

let sending: Promise<void> | undefined;
let timer: NodeJS.Timeout | undefined;
let again = false;
let stopping = false;
let registered = false;

/** Sends what is due, now and whenever something comes due again. Called at the start and after each new mail. */
export function startSending(): void {
  if (!mailIsSetUp() || stopping) return;
  if (!registered) {
    registered = true;
    onShutdown("outbox", stopSending);
  }
  again = true;
  sending ??= sendInTurn()
    .catch((error: unknown) => log().error({ err: error }, "the outbox could not be worked off"))
    .finally(() => {
      sending = undefined;
    });
}

async function stopSending(): Promise<void> {
  stopping = true;
  clearTimeout(timer);
  await sending;
  stopping = false;
  registered = false;
}

async function sendInTurn(): Promise<void> {
  clearTimeout(timer);
  while (again && !stopping) {
    again = false;
    const due = await OutboxMail.findAll({
      where: { state: "waiting", dueAt: { [Op.lte]: new Date() } },
      order: [["dueAt", "ASC"]],
      limit: AT_ONCE,
    });
    for (const row of due) if (!stopping) await sendOne(row);
    if (due.length > 0) again = true;
  }
  const next = await OutboxMail.findOne({ where: { state: "waiting" }, order: [["dueAt", "ASC"]] });
  if (!next || stopping) return;
  const wait = Math.min(Math.max(next.dueAt.getTime() - Date.now(), 0), LONGEST_TIMER_MS);
  timer = setTimeout(startSending, wait).unref();
}

async function sendOne(row: OutboxMail): Promise<void> {
  const token = row.tokenId === null ? "" : await issueToken(row.tokenId);
  if (token === null) {
    await row.update({ state: "dropped" });
    return;
  }
  const attempts = row.attempts + 1;
  try {
    await sendMail(row.id, row.recipient, row.mail, `${config().publicUrl}${row.path}${token}`);
    await row.update({ state: "sent", attempts, lastError: null });
  } catch (error) {
    const delay = isRefusedForGood(error) ? null : retryDelay(attempts);
    const lastError = error instanceof Error ? error.message : String(error);
    const state = delay === null ? "failed" : "waiting";
    await row.update({ state, attempts, lastError, dueAt: new Date(Date.now() + (delay ?? 0)) });
    log().warn(
      { mail: row.id, template: row.mail.template, attempts, reason: lastError, state },
      "a mail was not sent",
    );
  }
}
