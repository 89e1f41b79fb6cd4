import { Link } from "react-router";
import { ConfirmButton } from "~/components/confirm-button";
import { CHANNELS } from "~/storms/channels";
import type { ShownRecord } from "~/storms/show-storm.server";
import { formatPeriod, formatTime } from "~/units/format-time";

interface RecordCardProps {
  record: ShownRecord;
  /** Address of the project. */
  home: string;
  zone: string;
  mayEdit: boolean;
}

const ORIGINS = { file: "file", pasted: "pasted rows", constant: "constant" } as const;

/** One record of a storm: where it came from, how it was read, and what is in use from it. */
export function RecordCard({ record, home, zone, mayEdit }: RecordCardProps) {
  const { id, name, origin, state, provenance, inUse, source } = record;
  const scenario = provenance?.scenario;
  return (
    <article className="min-w-0 border border-hairline p-4">
      <h4 className="break-words font-bold">{name}</h4>
      <p className="text-small text-slate">
        {ORIGINS[origin]}
        {scenario && `, taken over from ${scenario.of}`} ·{" "}
        {state === "reading"
          ? "waits for its reading sheet"
          : inUse.length > 0
            ? `in use: ${inUse.join(", ")}`
            : "nothing in use: replaced by other records"}
      </p>
      {provenance && <ProvenanceFacts record={record} zone={zone} />}
      {source && (
        <p className="mt-2 break-all text-small text-quiet">
          {formatBytes(source.size)} · SHA-256 {source.sha256}
        </p>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-2">
        {mayEdit && origin !== "constant" && !scenario && (
          <Link to={`records/${id}`} className={`button ${state === "reading" ? "button-primary" : ""}`}>
            {state === "reading" ? "Look through and confirm" : "Reading sheet"}
          </Link>
        )}
        {source && (
          <a href={`${home}/files/${source.id}`} className="button" download>
            Original
          </a>
        )}
        {mayEdit && !scenario && (
          <ConfirmButton label="Remove" title={`Remove ${name}?`} fields={{ intent: "remove-record", record: id }}>
            {inUse.length > 0 ? `The storm loses ${inUse.join(", ")}` : "The storm loses nothing that is in use"}
            {source ? ", and the original goes where no other record uses it" : ""}. What this record had replaced is
            used again. Estimates of the storm become out of date.
          </ConfirmButton>
        )}
      </div>
    </article>
  );
}

function ProvenanceFacts({ record, zone }: Pick<RecordCardProps, "record" | "zone">) {
  const { provenance, confirmedByName } = record;
  if (!provenance) return null;
  const { formatLabel, rows, first, last, windHeight, averagingMinutes, channels, steps, dropped, confirmedAt } =
    provenance;
  const step = provenance.medianStepSeconds;
  const lines: { label: string; value: string }[] = [
    {
      label: "Read as",
      value: `${formatLabel}, ${rows} rows${step === null ? "" : `, usual step ${Number((step / 60).toFixed(2))} min`}`,
    },
    { label: "Covers", value: formatPeriod(first, last, zone) },
    { label: "Stamps in", value: provenance.zone },
    ...(windHeight === null
      ? []
      : [
          {
            label: "Wind",
            value: `${windHeight} m above the sea, ${averagingMinutes === null ? "averaging not known" : `mean over ${averagingMinutes} min`}`,
          },
        ]),
    ...channels.map(({ channel, count, missing, fromColumns }) => ({
      label: CHANNELS[channel].label,
      value: `${count} values, ${missing} missing${fromColumns.length > 0 ? `, from ${fromColumns.join(", ")}` : ""}`,
    })),
    ...steps.map(({ label, count }) => ({ label: "Conversion", value: `${label}: ${count} values` })),
    ...dropped.map(({ reason, count }) => ({ label: "Dropped", value: `${count} rows: ${reason}` })),
    { label: "Confirmed", value: `by ${confirmedByName ?? "someone who has left"}, ${formatTime(confirmedAt, zone)}` },
  ];
  return (
    <dl className="mt-2 grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5 text-small">
      {lines.map(({ label, value }, index) => (
        <div key={index} className="contents">
          <dt className="text-quiet">{label}</dt>
          <dd className="min-w-0 break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function formatBytes(size: number): string {
  if (size < 1024) return `${size} bytes`;
  if (size < 1024 * 1024) return `${(size / 1024).toFixed(1)} kB`;
  return `${(size / 1024 / 1024).toFixed(1)} MB`;
}
