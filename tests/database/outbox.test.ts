import { afterAll, beforeEach, expect, test } from "vitest";
import { startMailbox } from "../../app/cli/mailbox/mailbox";
import { openOwnDatabase } from "../setup/own-database";

const mailbox = await startMailbox({ smtpPort: 0, port: 0 });
process.env.SMTP_URL = mailbox.smtpUrl;
process.env.LOG_LEVEL = "silent";
const database = openOwnDatabase();
const { inWriteTransaction } = await import("../../app/db/connection.server");
const { OutboxMail } = await import("../../app/db/models/outbox-mail.server");
const { prepareToken, spendToken, subjectOfToken } = await import("../../app/mail/one-time-token.server");
const { queueMail } = await import("../../app/mail/outbox.server");
const { closeEverything } = await import("../../app/services/shutdown.server");

const HOUR = 3_600_000;
const FACTS = { organisation: "Sandbar & Sons", invitedBy: "S. Bar", role: "viewer", hours: 72 };

beforeEach(() => OutboxMail.destroy({ where: {} }));

afterAll(async () => {
  await closeEverything();
  await mailbox.close();
  await database.remove();
});

async function invite(recipient: string, lifetimeMs = HOUR): Promise<string> {
  return inWriteTransaction(async (transaction) => {
    const tokenId = await prepareToken("invitation", recipient, lifetimeMs, transaction);
    const mail = { template: "invitation" as const, facts: FACTS };
    await queueMail({ recipient, mail, path: "/invitations/", tokenId }, transaction);
    return tokenId;
  });
}

/** The token at the end of the link of the next mail to someone. */
async function tokenSentTo(recipient: string, from = 0): Promise<string> {
  const { text } = await mailbox.next(recipient, from);
  return /\/invitations\/(\S+)/.exec(text)?.[1] ?? "";
}

const spend = (token: string) => inWriteTransaction((transaction) => spendToken("invitation", token, transaction));

test("a mail goes out with a link that works once, and nothing of the link is kept", async () => {
  await invite("a@sandbar.example");
  const token = await tokenSentTo("a@sandbar.example");
  expect(token).toMatch(/^[\w-]{43}$/);
  const { subject, html } = await mailbox.next("a@sandbar.example");
  expect(subject).toBe("S. Bar invites you to Sandbar & Sons on Galeprint");
  expect(html).toContain(`/invitations/${token}`);
  expect(await subjectOfToken("invitation", token)).toBe("a@sandbar.example");
  expect(await subjectOfToken("reset-password", token)).toBeNull();
  const rows = JSON.stringify(await OutboxMail.findAll());
  expect(rows).not.toContain(token);
  const together = await Promise.all([spend(token), spend(token), spend(token)]);
  expect(together.filter((subjectId) => subjectId !== null)).toEqual(["a@sandbar.example"]);
  expect(await spend(token)).toBeNull();
  expect(await subjectOfToken("invitation", token)).toBeNull();
});

test("a later link replaces the earlier one, and one that has run out is not sent", async () => {
  await invite("b@sandbar.example");
  const first = await tokenSentTo("b@sandbar.example");
  const from = mailbox.mails.length;
  await invite("b@sandbar.example");
  const second = await tokenSentTo("b@sandbar.example", from);
  expect(await subjectOfToken("invitation", first)).toBeNull();
  expect(await subjectOfToken("invitation", second)).toBe("b@sandbar.example");
  const late = await invite("c@sandbar.example", -1);
  await expect.poll(async () => (await OutboxMail.findOne({ where: { tokenId: late } }))?.state).toBe("dropped");
});

test("what is rolled back is never sent", async () => {
  const failing = inWriteTransaction(async (transaction) => {
    await queueMail(
      { recipient: "d@sandbar.example", mail: { template: "invitation", facts: FACTS }, path: "/" },
      transaction,
    );
    throw new Error("no");
  });
  await expect(failing).rejects.toThrow("no");
  await invite("e@sandbar.example");
  await mailbox.next("e@sandbar.example");
  expect(mailbox.mails.some(({ to }) => to === "d@sandbar.example")).toBe(false);
});
