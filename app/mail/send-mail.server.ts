import { createTransport } from "nodemailer";
import type { Mail } from "./mail-facts";
import { writeMail } from "./mail-templates";
import { renderMail } from "./render-mail";
import { config } from "~/services/config.server";

const PATIENCE_MS = 15_000;

export function mailIsSetUp(): boolean {
  return config().smtpUrl !== null;
}

/** Hands one mail to the mail server. @throws what the mail server or the way to it said */
export async function sendMail(id: string, recipient: string, mail: Mail, link: string): Promise<void> {
  const { smtpUrl, mailFrom, publicUrl } = config();
  if (smtpUrl === null) throw new Error("SMTP_URL is not set.");
  const transport = createTransport({
    url: smtpUrl,
    connectionTimeout: PATIENCE_MS,
    greetingTimeout: PATIENCE_MS,
    socketTimeout: PATIENCE_MS,
    // What a mail says is made here; no file and no address is to be fetched for it.
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  try {
    await transport.sendMail({
      from: mailFrom,
      // As an object, so that an address is never read as a list of them.
      to: { name: "", address: recipient },
      ...renderMail(writeMail(mail, link)),
      messageId: `<${id}@${new URL(publicUrl).hostname}>`,
      headers: { "Auto-Submitted": "auto-generated" },
    });
  } finally {
    transport.close();
  }
}

/** Whether trying again is of no use: the mail server refused this mail for good (a reply of 500 to 599, RFC 5321). */
export function isRefusedForGood(error: unknown): boolean {
  const code = error instanceof Error && "responseCode" in error ? error.responseCode : undefined;
  return typeof code === "number" && code >= 500;
}
