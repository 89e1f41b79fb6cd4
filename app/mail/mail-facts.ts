/** What each mail tells. None carries a secret: the token of a link is made as the mail leaves. */
export interface MailFacts {
  invitation: { organisation: string; invitedBy: string; role: string; hours: number };
  "reset-password": { name: string; minutes: number };
  "password-changed": { name: string; when: string; from: string };
}
export type MailName = keyof MailFacts;

/** A mail before it is written: its template and what it tells. */
export type Mail<Name extends MailName = MailName> = {
  [Each in Name]: { template: Each; facts: MailFacts[Each] };
}[Name];
