import { Mark } from "~/components/mark";
import { TitleBlock } from "~/components/title-block";
import { BlockView, type HeadingTag } from "./document-blocks";
import type { MemoDocument } from "./document";
import { titleBlockCells } from "./title-block";

interface DocumentViewProps {
  document: MemoDocument;
  /** Level of the memo's title where the page around it has one of its own. */
  titleLevel?: 1 | 2;
}

/** A memo on screen: the same document as the PDF, in the same order. Needs no script. */
export function DocumentView({ document: memo, titleLevel = 1 }: DocumentViewProps) {
  const Title: HeadingTag = `h${titleLevel}`;
  const headings = { 1: `h${titleLevel + 1}`, 2: `h${titleLevel + 2}` } as Record<1 | 2, HeadingTag>;
  const cells = titleBlockCells(memo.titleBlock, "").filter(({ label }) => label !== "Sheet");
  return (
    <article
      lang={memo.language}
      className="mx-auto mt-6 max-w-4xl border border-hairline bg-sheet px-4 py-6 text-ink sm:px-10 sm:py-9 print:m-0 print:border-0 print:p-0"
    >
      <header>
        <p className="flex items-center gap-2.5 font-bold">
          <Mark size={22} />
          <span className="min-w-0 break-words">{memo.organisation}</span>
        </p>
        {memo.notice !== "" && (
          <p role="status" className="mt-4 border-l-4 border-wind py-1 pl-3 font-bold">
            {memo.notice}.
          </p>
        )}
        <Title className="mt-4 break-words text-title font-bold">{memo.title}</Title>
        <p className="mt-1 text-small text-slate">{memo.subtitle}</p>
      </header>
      {memo.blocks.map((block, index) => (
        <BlockView key={index} block={block} headings={headings} />
      ))}
      <TitleBlock entries={cells} />
      <p className="mt-3 text-small text-slate">{memo.caution}</p>
    </article>
  );
}
