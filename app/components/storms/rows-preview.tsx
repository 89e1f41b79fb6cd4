import { WideTable } from "~/components/wide-table";
import { CHANNEL_UNITS, type PreviewRow } from "~/readers/reading";
import { CHANNELS } from "~/storms/channels";
import type { PresentedReading } from "~/storms/present-reading";

/** Rows as they stand in the file, and beneath what was made of them. */
export function RowsPreview({ reading }: { reading: PresentedReading }) {
  const { columns, channels, firstRows, lastRows } = reading;
  const rows = [...firstRows, ...lastRows.filter(({ line }) => !firstRows.some((row) => row.line === line))];
  const opensGap = (index: number) => index === firstRows.length && index > 0;
  return (
    <div className="grid gap-4">
      <WideTable label="Rows as written">
        <caption className="pb-1 text-left text-small text-quiet">As written in the file</caption>
        <thead>
          <tr>
            <th scope="col" className="number">
              Line
            </th>
            {columns.map(({ index, name }) => (
              <th key={index} scope="col">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            <tr key={row.line} className={opensGap(index) ? "border-t-2 border-t-ink" : undefined}>
              <td className="number">{row.line}</td>
              {columns.map((column) => (
                <td key={column.index} className="whitespace-nowrap">
                  {row.cells[column.index] ?? ""}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </WideTable>
      <WideTable label="Rows as read">
        <caption className="pb-1 text-left text-small text-quiet">As read</caption>
        <thead>
          <tr>
            <th scope="col" className="number">
              Line
            </th>
            <th scope="col">Time (UTC)</th>
            {channels.map(({ channel }) => (
              <th key={channel} scope="col" className="number">
                {CHANNELS[channel].label} ({CHANNEL_UNITS[channel]})
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            <tr key={row.line} className={opensGap(index) ? "border-t-2 border-t-ink" : undefined}>
              <td className="number">{row.line}</td>
              <td className="whitespace-nowrap">{row.time ?? "not read"}</td>
              {channels.map(({ channel }) => (
                <td key={channel} className="number">
                  {asRead(row.values[channel])}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </WideTable>
    </div>
  );
}

function asRead(value: PreviewRow["values"][keyof PreviewRow["values"]]): string {
  return value === null || value === undefined ? "missing" : String(Number(value.toPrecision(7)));
}
