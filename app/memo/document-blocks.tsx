/** Each kind of block of a memo on screen. */
import { FigureView } from "~/components/figure-view";
import { SmallMarkView } from "~/components/small-mark-view";
import { WideTable } from "~/components/wide-table";
import type { Block, ColourToken, HeadlineRow, Run } from "./document";
import { gravestFirst, SEVERITY_WORDS } from "./fit-words";

export type HeadingTag = "h1" | "h2" | "h3" | "h4";

interface BlockViewProps {
  block: Block;
  headings: Record<1 | 2, HeadingTag>;
}

export function BlockView({ block, headings }: BlockViewProps) {
  switch (block.kind) {
    case "heading": {
      const Heading = headings[block.level];
      const style = block.level === 1 ? "mt-9 text-large" : "mt-6 text-base";
      return <Heading className={`${style} break-words font-bold break-after-avoid`}>{block.text}</Heading>;
    }
    case "paragraph":
      return (
        <p className={PARAGRAPHS[block.style]}>
          <Runs runs={block.runs} />
        </p>
      );
    case "list":
      return (
        <ul className="mt-3 list-['–__'] pl-4">
          {block.items.map((item, index) => (
            <li key={index} className="mt-1 max-w-prose break-words">
              <Runs runs={item} />
            </li>
          ))}
        </ul>
      );
    case "headlines":
      return <Headlines {...block} />;
    case "figure":
      return (
        <div
          role="region"
          aria-label={`Figure ${block.number}`}
          tabIndex={0}
          // On a telephone a figure keeps a size that can be read, and scrolls.
          className="mt-6 overflow-x-auto [&_svg]:min-w-[34rem] sm:[&_svg]:min-w-0 print:[&_svg]:min-w-0"
        >
          <FigureView
            number={block.number}
            figure={{ ...block.figure, caption: `${block.figure.caption} ${block.source}`.trim() }}
          />
        </div>
      );
    case "table":
      return <Table {...block} />;
    case "facts":
      return <Facts {...block} />;
    case "fitNotes":
      return <FitNotes {...block} />;
    case "equation":
      return <Equation {...block} />;
    case "references":
      return <References {...block} />;
    case "caution":
      return (
        <p className="mt-5 border-y border-slate py-2 text-small text-slate">
          <strong>Caution.</strong> {block.text}
        </p>
      );
    case "pageBreak":
      return <div className="break-after-page" />;
  }
}

type Of<Kind extends Block["kind"]> = Extract<Block, { kind: Kind }>;

const PARAGRAPHS: Record<Of<"paragraph">["style"], string> = {
  lead: "mt-5 break-words text-large",
  body: "mt-3 max-w-prose break-words",
  small: "mt-2 max-w-prose break-words text-small text-slate",
};

const COLOURS: Record<ColourToken, string> = {
  ink: "text-ink",
  slate: "text-slate",
  wind: "text-wind",
  rain: "text-rain",
  heat: "text-heat",
  density: "text-density",
  drift: "text-drift",
  shore: "text-shore",
};

function Runs({ runs }: { runs: readonly Run[] }) {
  return runs.map((run, index) => <RunView key={index} run={run} />);
}

function RunView({ run }: { run: Run }) {
  const style = [run.bold ? "font-bold" : "", run.italic ? "italic" : "", run.colour ? COLOURS[run.colour] : ""];
  const className = style.filter((part) => part !== "").join(" ") || undefined;
  const lines = run.text.split("\n").flatMap((line, index) => (index === 0 ? [line] : [<br key={index} />, line]));
  if (run.link !== undefined)
    return (
      <a href={run.link} className={`break-all ${className ?? ""}`}>
        {lines}
      </a>
    );
  // Within a line, so that a raised figure does not push the lines apart.
  if (run.rise === "super") return <sup className={`leading-none ${className ?? ""}`}>{lines}</sup>;
  if (run.rise === "sub") return <sub className={`leading-none ${className ?? ""}`}>{lines}</sub>;
  return <span className={className}>{lines}</span>;
}

/** Rows fold into two lines on a telephone; the roles keep the table a table. */
function Headlines({ caption, rows }: Of<"headlines">) {
  return (
    <div role="table" aria-label={caption} className="mt-5 border-t-2 border-ink">
      {rows.map((row) => (
        <div
          key={row.label}
          role="row"
          className="grid grid-cols-2 items-center gap-x-4 gap-y-1 border-b border-hairline py-2.5 sm:grid-cols-[minmax(0,5fr)_minmax(0,5fr)_auto_minmax(0,7fr)]"
        >
          <HeadlineCells row={row} />
        </div>
      ))}
    </div>
  );
}

function HeadlineCells({ row }: { row: HeadlineRow }) {
  return (
    <>
      <div role="rowheader">{row.label}</div>
      <div role="cell">
        <strong className="text-large">{row.value}</strong> {row.unit}
      </div>
      <div role="cell" className="min-w-0 sm:w-[188px]">
        {row.mark && <SmallMarkView mark={row.mark} className="max-w-full overflow-hidden" />}
      </div>
      <div role="cell" className="text-small text-slate">
        {row.band !== "" && <div>{row.band}</div>}
        {row.remark}
      </div>
    </>
  );
}

function Table({ caption, columns, rows }: Of<"table">) {
  const number = (index: number) => (columns[index]?.align === "right" ? "number" : undefined);
  return (
    <div className="mt-5">
      <WideTable label={caption || "Table"}>
        {caption !== "" && <caption className="pb-1 text-left text-small text-slate">{caption}</caption>}
        <thead>
          <tr>
            {columns.map(({ label, unit }, index) => (
              <th key={index} scope="col" className={number(index)}>
                {label}
                {unit !== "" && <span className="whitespace-nowrap font-normal"> ({unit})</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody className="text-small">
          {rows.map((row, index) => (
            <tr key={index}>
              {columns.map((_, at) => (
                <td key={at} className={number(at) ?? "[overflow-wrap:anywhere]"}>
                  <Runs runs={row[at] ?? []} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </WideTable>
    </div>
  );
}

function Facts({ rows }: Of<"facts">) {
  return (
    <dl className="mt-2 text-small">
      {rows.map(({ label, value }, index) => (
        <div
          key={index}
          className="grid gap-x-4 border-b border-hairline py-1 sm:grid-cols-[minmax(0,1fr)_minmax(0,3fr)]"
        >
          <dt className="text-quiet">{label}</dt>
          <dd className="[overflow-wrap:anywhere]">
            <Runs runs={value} />
          </dd>
        </div>
      ))}
    </dl>
  );
}

function FitNotes({ notes }: Of<"fitNotes">) {
  return (
    <ul className="mt-3 border-t border-ink">
      {gravestFirst(notes).map(({ severity, message, source }, index) => (
        <li
          key={index}
          className="grid gap-x-4 border-b border-hairline py-2 sm:grid-cols-[6rem_minmax(0,1fr)_minmax(0,14rem)]"
        >
          <span className={severity === "ok" ? "" : "font-bold"}>{SEVERITY_WORDS[severity]}</span>
          <span>{message}</span>
          <span className="text-small text-quiet">{source}</span>
        </li>
      ))}
    </ul>
  );
}

function Equation({ number, name, runs, symbols, source }: Of<"equation">) {
  return (
    <div className="mt-5 break-inside-avoid">
      <p className="text-small text-slate">{name}</p>
      <div className="mt-1 flex gap-4 pl-4">
        <p className="min-w-0 grow break-words">
          <Runs runs={runs} />
        </p>
        <span className="text-small text-quiet">({number})</span>
      </div>
      {symbols.length > 0 && (
        <table className="ml-4 mt-1 border-collapse text-left text-small text-slate">
          <tbody>
            {symbols.map(({ symbol, unit, meaning }, index) => (
              <tr key={index}>
                <th scope="row" className="min-w-10 pr-4 align-top font-normal">
                  <Runs runs={symbol} />
                </th>
                <td className="min-w-14 whitespace-nowrap pr-4 align-top">{unit}</td>
                <td className="align-top">{meaning}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
      {source !== "" && <p className="mt-1 pl-4 text-small text-slate">{source}</p>}
    </div>
  );
}

function References({ items }: Of<"references">) {
  return (
    <ol className="mt-3 text-small">
      {items.map(({ id, text, link }, index) => (
        <li key={id} className="mt-1 grid grid-cols-[2rem_minmax(0,1fr)]">
          <span>[{index + 1}]</span>
          <span className="break-words">
            {text}{" "}
            {link !== undefined && (
              <a href={link} className="break-all">
                {link}
              </a>
            )}
          </span>
        </li>
      ))}
    </ol>
  );
}
