/** What an author types, as blocks: blank lines part paragraphs, `- ` starts a list item, `**…**` is bold, `*…*` italic. */
import type { Block, Run } from "./document";

/** Paragraphs and lists of a text; nothing for a blank one. */
export function authorBlocks(text: string): Block[] {
  return text
    .replace(/\r\n?/g, "\n")
    .split(/\n[ \t]*\n/)
    .flatMap((part) => splitLists(part.split("\n").filter((line) => line.trim() !== "")));
}

function splitLists(lines: readonly string[]): Block[] {
  const blocks: Block[] = [];
  for (const line of lines) {
    const last = blocks.at(-1);
    const item = /^\s*[-•] +(.*)$/.exec(line)?.[1];
    if (item !== undefined) {
      if (last?.kind === "list") last.items.push(authorRuns(item));
      else blocks.push({ kind: "list", items: [authorRuns(item)] });
    } else if (last?.kind === "paragraph") last.runs.push({ text: " " }, ...authorRuns(line));
    else if (last?.kind === "list") last.items.at(-1)!.push({ text: " " }, ...authorRuns(line));
    else blocks.push({ kind: "paragraph", style: "body", runs: authorRuns(line) });
  }
  return blocks;
}

const STYLED = /\*\*([^*]+)\*\*|\*([^*\s][^*]*)\*/g;

/** Runs of one line. An asterisk without a partner is an asterisk. */
export function authorRuns(line: string): Run[] {
  const text = line.trim();
  const runs: Run[] = [];
  let from = 0;
  for (const match of text.matchAll(STYLED)) {
    if (match.index > from) runs.push({ text: text.slice(from, match.index) });
    if (match[1] !== undefined) runs.push({ text: match[1], bold: true });
    else if (match[2] !== undefined) runs.push({ text: match[2], italic: true });
    from = match.index + match[0].length;
  }
  if (from < text.length) runs.push({ text: text.slice(from) });
  return runs;
}
