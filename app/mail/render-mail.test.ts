import { describe, expect, it } from "vitest";
import type { MailName } from "./mail-facts";
import { MAIL_TEMPLATES, writeMail } from "./mail-templates";
import { renderMail } from "./render-mail";

const LINK = "https://memos.example.com/invitations/abc?x=1&y=2";
const names = Object.keys(MAIL_TEMPLATES) as MailName[];

function sampleOf<Name extends MailName>(template: Name) {
  return writeMail<Name>({ template, facts: MAIL_TEMPLATES[template].sample }, LINK);
}

describe("renderMail", () => {
  it.each(names)("says in plain text all that the HTML of %s says", (name) => {
    const { subject, text, html } = renderMail(sampleOf(name));
    const shown = html
      .replace(/<title>.*<\/title>/, "")
      .replace(/<[^>]+>/g, "\n")
      .replace(/&#(\d+);/g, (_, code: string) => String.fromCharCode(Number(code)));
    for (const line of shown.split("\n").filter(Boolean)) {
      if (line !== "galeprint") expect(text).toContain(line);
    }
    expect(text).toContain(LINK);
    expect(subject.length).toBeLessThan(90);
  });

  it("keeps what people wrote as text, in one line of a subject", () => {
    const facts = {
      organisation: "<script>x</script>\r\nBcc: all@example.com",
      invitedBy: 'I. "Q" & Co',
      role: "viewer",
      hours: 72,
    };
    const { subject, html } = renderMail(writeMail({ template: "invitation", facts }, LINK));
    expect(subject).toBe('I. "Q" & Co invites you to <script>x</script> Bcc: all@example.com on Galeprint');
    expect(html).not.toContain("<script");
    expect(html).toContain("I. &#34;Q&#34; &#38; Co");
  });
});
