import { UnderstoodLines } from "~/components/understood-lines";
import type { PresentedReading } from "~/storms/present-reading";

/** What the reader took a storm's file for, how sure it is, and the conversions that followed. */
export function UnderstoodTable({ reading }: { reading: PresentedReading }) {
  const { rows, first, last, order, duplicates, medianStepSeconds, steps } = reading;
  const counted = [
    { what: "Rows read", taken: `${rows}, ${order === "ascending" ? "in time order" : `${order}, put in time order`}` },
    { what: "First and last stamp", taken: `${first ?? "none"} to ${last ?? "none"} (UTC)` },
    {
      what: "Usual step",
      taken: medianStepSeconds === null ? "not known" : `${Number((medianStepSeconds / 60).toFixed(2))} min`,
    },
    { what: "Repeated stamps", taken: String(duplicates) },
  ].map((line) => ({ ...line, confidence: "counted" }));
  const conversions = steps.map(({ label, count }) => ({
    what: "Conversion",
    taken: label,
    confidence: count === 1 ? "1 value" : `${count} values`,
  }));
  return <UnderstoodLines lines={[...counted, ...reading.understood, ...conversions]} />;
}
