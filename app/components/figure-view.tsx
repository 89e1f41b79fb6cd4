import { saveFile } from "~/components/save-file";
import { useScripted } from "~/components/use-scripted";
import type { Figure } from "~/figures/figure";
import { figureCsv } from "~/figures/figure-csv";
import { fileSvg, pageSvg } from "~/figures/present-svg";
import { cellText, columnDecimals } from "~/figures/table-text";

/** A longer table is for the file, not for the page. */
const MAX_ROWS = 200;

interface FigureViewProps {
  figure: Figure;
  /** The same figure made for a telephone: shown below 640 px in its place. */
  narrow?: Figure;
  /** Before the caption, as in `Figure 3`. */
  number?: number;
  /** Where the whole table can be had as CSV from the server; without it the page makes the file itself. */
  csvHref?: string;
  /** Level of the heading; none is shown where it is absent. */
  heading?: "h2" | "h3" | "h4";
}

/** A figure with its caption, the table of what it shows, and both as files. */
export function FigureView({ figure, narrow, number, csvHref, heading: Heading }: FigureViewProps) {
  return (
    <figure className="m-0 min-w-0 break-inside-avoid">
      {Heading && <Heading className="mb-2 border-b border-hairline pb-1 text-base font-bold">{figure.title}</Heading>}
      <Drawing figure={figure} className={narrow ? "hidden sm:block print:block" : ""} />
      {narrow && <Drawing figure={narrow} className="sm:hidden print:hidden" />}
      <figcaption className="mt-1 max-w-prose text-small text-slate">
        {number !== undefined && <span className="font-bold">Figure {number}. </span>}
        {figure.caption}
      </figcaption>
      <div className="mt-1 flex flex-wrap items-start gap-x-4 text-small print:hidden">
        <Numbers figure={figure} csvHref={csvHref} />
        <Downloads figure={figure} csvHref={csvHref} />
      </div>
    </figure>
  );
}

function Drawing({ figure, className }: { figure: Figure; className: string }) {
  return <div className={`${className} [&_text]:font-sans`} dangerouslySetInnerHTML={{ __html: pageSvg(figure) }} />;
}

function Numbers({ figure, csvHref }: { figure: Figure; csvHref?: string }) {
  const { columns, rows } = figure.table;
  const decimals = columns.map((_, column) => columnDecimals(figure.table, column));
  const shown = rows.slice(0, MAX_ROWS);
  return (
    <details className="min-w-0 max-w-full open:w-full">
      <summary className="py-1 underline underline-offset-4">
        Table, {rows.length} {rows.length === 1 ? "row" : "rows"}
      </summary>
      <div role="region" aria-label={`Table: ${figure.title}`} tabIndex={0} className="max-h-96 overflow-auto">
        <table className="border-collapse text-left text-small">
          <thead>
            <tr>
              {columns.map(({ name, unit }, column) => (
                <th
                  key={column}
                  scope="col"
                  className={`sticky top-0 min-w-24 border-b border-ink bg-paper py-1 pr-4 align-bottom font-bold ${isNumeric(unit) ? "text-right" : ""}`}
                >
                  {name}
                  {unit !== "" && <span className="whitespace-nowrap font-normal"> ({unit})</span>}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {shown.map((row, index) => (
              <tr key={index}>
                {row.map((value, column) => (
                  <td
                    key={column}
                    className={`whitespace-nowrap border-b border-hairline py-0.5 pr-4 ${isNumeric(columns[column]?.unit) ? "text-right" : ""}`}
                  >
                    {cellText(value, decimals[column] ?? 0)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {rows.length > MAX_ROWS && (
        <p className="my-2">
          The first {MAX_ROWS} of {rows.length} rows.{" "}
          {csvHref ? <a href={csvHref}>All rows as CSV</a> : "The CSV file has all of them."}
        </p>
      )}
    </details>
  );
}

function isNumeric(unit: string | undefined): boolean {
  return unit !== undefined && unit !== "";
}

/** Made in the browser from what the page holds already; without scripts only the server's own address is offered. */
function Downloads({ figure, csvHref }: { figure: Figure; csvHref?: string }) {
  const scripted = useScripted();
  const button = "py-1 underline underline-offset-4";
  return (
    <>
      {scripted && (
        <button
          type="button"
          className={button}
          aria-label={`Download figure “${figure.title}” as SVG`}
          onClick={() => saveFile(`${figure.id}.svg`, "image/svg+xml", fileSvg(figure))}
        >
          SVG
        </button>
      )}
      {csvHref ? (
        <a href={csvHref} className={button} aria-label={`Download the numbers of “${figure.title}” as CSV`}>
          CSV
        </a>
      ) : (
        scripted && (
          <button
            type="button"
            className={button}
            aria-label={`Download the numbers of “${figure.title}” as CSV`}
            // The mark at the start tells spreadsheets that the file is UTF-8.
            onClick={() => saveFile(`${figure.id}.csv`, "text/csv", `\ufeff${figureCsv(figure.table)}`)}
          >
            CSV
          </button>
        )
      )}
    </>
  );
}
