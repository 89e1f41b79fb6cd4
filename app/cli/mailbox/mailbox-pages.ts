import type { ReceivedMail } from "./mailbox";

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}

function page(title: string, body: string): string {
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escaped(title)}</title>
<meta name="viewport" content="width=device-width, initial-scale=1"><style>
:root { color-scheme: light dark; }
body { max-width: 60rem; margin: 0 auto; padding: 1.5rem; font: 1rem/1.5 "Arial Narrow", Arial, sans-serif; }
table { width: 100%; border-collapse: collapse; }
th, td { padding: .4rem .8rem .4rem 0; border-bottom: 1px solid #8888; text-align: left; overflow-wrap: anywhere; }
pre { padding: 1rem; border: 1px solid #8888; white-space: pre-wrap; overflow-wrap: anywhere; }
iframe { width: 100%; height: 32rem; border: 1px solid #8888; background: #fff; }
</style></head><body><h1>${escaped(title)}</h1>${body}</body></html>`;
}

function time(at: Date): string {
  return `${at.toISOString().slice(0, 19).replace("T", " ")} UTC`;
}

/** Newest first. */
export function listPage(mails: readonly ReceivedMail[]): string {
  if (mails.length === 0) return page("Mailbox", "<p>No mail has come yet. Load this page again to look.</p>");
  const rows = mails
    .map(
      ({ to, subject, receivedAt }, index) =>
        `<tr><td>${time(receivedAt)}</td><td>${escaped(to)}</td><td><a href="/mails/${index}">${escaped(subject)}</a></td></tr>`,
    )
    .reverse()
    .join("");
  return page(
    "Mailbox",
    `<table><thead><tr><th>Came</th><th>To</th><th>Subject</th></tr></thead><tbody>${rows}</tbody></table>`,
  );
}

/** Addresses in the plain text can be followed; the HTML is shown in a frame of its own. */
export function mailPage(mail: ReceivedMail | undefined): string | undefined {
  if (mail === undefined) return undefined;
  const text = escaped(mail.text).replace(/https?:\/\/[^\s&]+/g, (address) => `<a href="${address}">${address}</a>`);
  return page(
    mail.subject,
    `<p><a href="/">All mail</a></p><p>From ${escaped(mail.from)} to ${escaped(mail.to)}, ${time(mail.receivedAt)}</p>` +
      `<h2>Plain text</h2><pre>${text}</pre><h2>HTML</h2><iframe title="The mail as HTML" srcdoc="${escaped(mail.html)}"></iframe>`,
  );
}
