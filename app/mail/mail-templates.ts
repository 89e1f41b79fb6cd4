import type { Mail, MailFacts, MailName } from "./mail-facts";

/** A mail in words: the same for its plain text and its HTML. */
export interface MailContent {
  subject: string;
  paragraphs: string[];
  /** What the mail asks for; its address is `link` of the template. */
  action?: { label: string; address: string };
  closing: string[];
}

interface MailTemplate<Facts> {
  /** Facts to look at the mail with. */
  sample: Facts;
  write(facts: Facts, link: string): MailContent;
}

export const MAIL_TEMPLATES: { [Name in MailName]: MailTemplate<MailFacts[Name]> } = {
  invitation: {
    sample: { organisation: "Merrow & Quill", invitedBy: "Ida Renholt", role: "consultant", hours: 72 },
    write: ({ organisation, invitedBy, role, hours }, link) => ({
      subject: `${invitedBy} invites you to ${organisation} on Galeprint`,
      paragraphs: [
        `${invitedBy} invites you to work in ${organisation} as ${role}.`,
        "Galeprint turns the records of a storm into a checked memo of what it did to the water.",
      ],
      action: { label: "Accept the invitation", address: link },
      closing: [
        `The link works once and for ${hours} hours. A later mail replaces it.`,
        "If you did not expect this, leave it: nothing happens without you.",
      ],
    }),
  },
  "reset-password": {
    sample: { name: "Ida Renholt", minutes: 30 },
    write: ({ name, minutes }, link) => ({
      subject: "Choose a new password for Galeprint",
      paragraphs: [`${name}, someone asked to reset the password of your account. If it was you, choose a new one.`],
      action: { label: "Choose a new password", address: link },
      closing: [
        `The link works once and for ${minutes} minutes. A later mail replaces it.`,
        "If it was not you, leave this mail: your password stays as it is.",
      ],
    }),
  },
  "password-changed": {
    sample: { name: "Ida Renholt", when: "2026-03-04 09:30 UTC", from: "192.0.2.14" },
    write: ({ name, when, from }, link) => ({
      subject: "Your Galeprint password was changed",
      paragraphs: [`${name}, your password was changed on ${when}, from ${from}. All your other sign-ins have ended.`],
      action: { label: "Reset the password", address: link },
      closing: ["If this was not you, reset your password at once and tell the owner of your organisation."],
    }),
  },
};

/** Puts a mail into words. `link` is where its button leads, a whole address. */
export function writeMail<Name extends MailName>(mail: Mail<Name>, link: string): MailContent {
  return MAIL_TEMPLATES[mail.template].write(mail.facts, link);
}
