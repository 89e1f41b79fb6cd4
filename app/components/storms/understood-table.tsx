import { WideTable } from "~/components/wide-table";
import type { PresentedReading } from "~/storms/present-reading";

/** What the reader took the file for, how sure it is, and the conversions that followed. */
export function UnderstoodTable({ reading }: { reading: PresentedReading }) {
  const { rows, first, last, order, duplicates, medianStepSeconds } = reading;
  const lines = [
    { what: "Rows read", taken: `${rows}, ${order === "ascending" ? "in time order" : `${order}, put in time order`}` },
    { what: "First and last stamp", taken: `${first ?? "none"} to ${last ?? "none"} (UTC)` },
    {
      what: "Usual step",
      taken: medianStepSeconds === null ? "not known" : `${Number((medianStepSeconds / 60).toFixed(2))} min`,
    },
    { what: "Repeated stamps", taken: String(duplicates) },
  ].map((line) => ({ ...line, confidence: "counted" }));
  return (
    <WideTable label="What was understood">
      <thead>
        <tr>
          <th scope="col">What</th>
          <th scope="col">Taken for</th>
          <th scope="col">How sure</th>
        </tr>
      </thead>
      <tbody>
        {[...lines, ...reading.understood].map(({ what, taken, confidence }) => (
          <tr key={`${what} ${taken}`}>
            <td>{what}</td>
            <td className="min-w-36">{taken}</td>
            <td>{confidence}</td>
          </tr>
        ))}
        {reading.steps.map(({ id, label, channel, count }) => (
          <tr key={`${id} ${channel}`}>
            <td>Conversion</td>
            <td>{label}</td>
            <td>{count === 1 ? "1 value" : `${count} values`}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
