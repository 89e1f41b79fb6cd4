import { mkdir, writeFile } from "node:fs/promises";
import path from "node:path";
import type { MailName } from "~/mail/mail-facts";
import { MAIL_TEMPLATES, writeMail } from "~/mail/mail-templates";
import { renderMail } from "~/mail/render-mail";
import { config } from "~/services/config.server";

function sampleOf<Name extends MailName>(template: Name) {
  const link = `${config().publicUrl}/address-of-the-link`;
  return renderMail(writeMail<Name>({ template, facts: MAIL_TEMPLATES[template].sample }, link));
}

export async function mailsCommand([folder, ...rest]: string[]): Promise<number> {
  if (folder === undefined || rest.length > 0) {
    process.stderr.write("mails takes one argument, the folder to write to.\n");
    return 2;
  }
  await mkdir(folder, { recursive: true });
  for (const name of Object.keys(MAIL_TEMPLATES) as MailName[]) {
    const { subject, text, html } = sampleOf(name);
    await writeFile(path.join(folder, `${name}.txt`), `Subject: ${subject}\n\n${text}`);
    await writeFile(path.join(folder, `${name}.html`), html);
    process.stdout.write(`${name}: ${subject}\n`);
  }
  return 0;
}
