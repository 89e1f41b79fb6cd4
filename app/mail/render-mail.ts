import type { MailContent } from "./mail-templates";

const FOOT = "Galeprint · What the storm leaves in the water";

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}

/** One line: a name with a line break in it must not begin another header. */
function oneLine(text: string): string {
  return text.replace(/[\s\p{Cc}]+/gu, " ").trim();
}

function asText({ paragraphs, action, closing }: MailContent): string {
  const link = action ? [`${action.label}:\n${action.address}`] : [];
  return `${[...paragraphs, ...link, ...closing, `--\n${FOOT}`].join("\n\n")}\n`;
}

const INK = "#17212b";

function paragraph(text: string): string {
  return `<p style="margin:0 0 16px">${escaped(text)}</p>`;
}

/** Styles stand on the elements, since mail programs drop a sheet; the address is written out for those who show no button. */
function asHtml({ subject, paragraphs, action, closing }: MailContent): string {
  const address = action ? escaped(action.address) : "";
  const button = action
    ? `<p style="margin:0 0 16px"><a href="${address}" style="display:inline-block;padding:10px 18px;background:${INK};color:#f7f5f0;text-decoration:none;font-weight:bold">${escaped(action.label)}</a></p>` +
      `<p style="margin:0 0 16px;font-size:13px;word-break:break-all">${address}</p>`
    : "";
  return (
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escaped(subject)}</title></head>` +
    `<body style="margin:0;background:#f7f5f0;color:${INK};font-family:'Arial Narrow',Arial,sans-serif;font-size:16px;line-height:24px">` +
    `<div style="max-width:560px;margin:0 auto;padding:32px 20px">` +
    `<p style="margin:0 0 24px;padding:0 0 8px;border-bottom:2px solid ${INK};font-size:20px;font-weight:bold">galeprint</p>` +
    paragraphs.map(paragraph).join("") +
    button +
    closing.map(paragraph).join("") +
    `<p style="margin:24px 0 0;padding:8px 0 0;border-top:1px solid #c9cfce;font-size:13px;color:#55636f">${FOOT}</p>` +
    `</div></body></html>`
  );
}

/** The subject, the plain text and the HTML of one mail; whatever people wrote into it stays text. */
export function renderMail(content: MailContent): { subject: string; text: string; html: string } {
  const clean = { ...content, subject: oneLine(content.subject) };
  return { subject: clean.subject, text: asText(clean), html: asHtml(clean) };
}
