import { COLOUR_CLASS } from "~/components/colour-class";
import { SmallMarkView } from "~/components/small-mark-view";
import type { HeadlineRowView } from "~/estimates/present-response";

/** The answer first: six figures, each with its unit, its band and what belongs beside it. */
export function HeadlineTable({ rows }: { rows: HeadlineRowView[] }) {
  return (
    <dl className="border-t-2 border-ink">
      {rows.map((row) => (
        <div
          key={row.label}
          className="grid gap-x-5 gap-y-0.5 border-b border-hairline py-2.5 sm:grid-cols-[13rem_minmax(0,10rem)_minmax(0,1fr)] sm:items-baseline"
        >
          <dt>{row.label}</dt>
          <dd>
            <span className={`text-large font-bold ${COLOUR_CLASS[row.colour]}`}>{row.number}</span>{" "}
            <span className="whitespace-nowrap text-small">{row.unit}</span>
            {row.band && <span className="block text-small text-slate">{row.band}</span>}
          </dd>
          <dd className="flex flex-wrap items-center gap-x-4 gap-y-1 text-small text-slate">
            {row.mark && <SmallMarkView mark={row.mark} />}
            <span className="min-w-0">{row.remarks.join(" · ")}</span>
          </dd>
        </div>
      ))}
    </dl>
  );
}
