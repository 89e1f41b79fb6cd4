import { FigureView } from "~/components/figure-view";
import { saveFile } from "~/components/save-file";
import { SectionHeading } from "~/components/section-heading";
import { useScripted } from "~/components/use-scripted";
import { figureCsv } from "~/figures/figure-csv";
import { cellText } from "~/figures/table-text";
import type { Figure, FigureTable } from "~/figures/figure";
import type { PresentedWind } from "~/storms/present-wind";
import { formatNumber } from "~/units/format-quantity";

interface WindPartProps extends PresentedWind {
  /** For a telephone. */
  narrowRose: Figure | null;
}

/** Where the wind of the window came from, and for how long it blew how hard. */
export function WindPart({ rose, narrowRose, exceedance, hoursMissing }: WindPartProps) {
  return (
    <>
      <SectionHeading>Wind in the window</SectionHeading>
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-2">
        {rose ? (
          <FigureView figure={rose} narrow={narrowRose ?? undefined} />
        ) : (
          <p className="text-slate">No direction is on record, so there is no rose.</p>
        )}
        <div className="min-w-0">
          <Exceedance table={exceedance} />
          {hoursMissing >= 0.05 && (
            <p className="mt-2 max-w-prose text-small text-slate">
              {formatNumber(hoursMissing, 1)} h of the window have no wind on record; shares are of the rest.
            </p>
          )}
        </div>
      </div>
    </>
  );
}

function Exceedance({ table }: { table: FigureTable }) {
  const scripted = useScripted();
  const { columns, rows } = table;
  if (rows.length === 0) return <p className="text-slate">The wind stayed in one class of speed all the time.</p>;
  return (
    <>
      <div role="region" aria-label="Table: how long the wind was as strong" tabIndex={0} className="overflow-x-auto">
        <table className="w-full max-w-xl border-collapse">
          <caption className="pb-1 text-left text-small text-slate">
            How long the wind was as strong as this, or stronger
          </caption>
          <thead>
            <tr>
              {columns.map(({ name, unit }) => (
                <th key={name} scope="col" className="border-b border-ink py-1 pl-4 text-right align-bottom first:pl-0">
                  {name} <span className="whitespace-nowrap font-normal">({unit})</span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr key={String(row[0])}>
                {row.map((value, column) => (
                  <td key={column} className="border-b border-hairline py-1 pl-4 text-right first:pl-0">
                    {column === 0 ? String(value) : cellText(value, columns[column].decimals ?? 0)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {scripted && (
        <button
          type="button"
          className="py-1 text-small underline underline-offset-4"
          aria-label="Download how long the wind was as strong as CSV"
          // The mark at the start tells spreadsheets that the file is UTF-8.
          onClick={() => saveFile("wind-exceedance.csv", "text/csv", `\ufeff${figureCsv(table)}`)}
        >
          CSV
        </button>
      )}
    </>
  );
}
