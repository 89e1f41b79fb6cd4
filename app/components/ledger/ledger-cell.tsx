import { Link } from "react-router";
import { COLOUR_CLASS } from "~/components/colour-class";
import { SmallMarkView } from "~/components/small-mark-view";
import type { LedgerCellView } from "~/estimates/present-ledger";
import { Hatch } from "./hatch";
import { RunButton } from "./run-button";

interface LedgerCellProps {
  cell: LedgerCellView;
  /** Name the column and sheet. */
  showMade: boolean;
  /** Address of the project. */
  home: string;
  mayRun: boolean;
  /** Box in storm, for buttons that are read aloud. */
  name: string;
}

export function LedgerCell({ cell, showMade, home, mayRun, name }: LedgerCellProps) {
  const underWay = cell.state === "queued" || cell.state === "running";
  const to = `${home}/estimates/${cell.estimateId}`;
  return (
    <div className="relative isolate flex h-full flex-col p-3">
      {cell.state === "outOfDate" && <Hatch />}
      {cell.state === "failed" ? (
        <Failed cell={cell} to={to} />
      ) : (
        cell.value !== null && (
          <Link to={to} className="group flex items-start gap-3 no-underline" aria-label={`${name}: ${cell.value}`}>
            {cell.arrow && <SmallMarkView mark={cell.arrow} />}
            <span className="min-w-0">
              <span className={`block text-large font-bold group-hover:underline ${COLOUR_CLASS[cell.colour]}`}>
                {cell.value}
              </span>
              <span className="block text-small text-slate">
                {[cell.band, cell.remark].filter(Boolean).join(" · ")}
              </span>
            </span>
          </Link>
        )
      )}
      {cell.state !== "current" && cell.state !== "failed" && (
        <p className="mt-1 text-small font-bold">{underWay ? `${cell.stateText}…` : cell.stateText}</p>
      )}
      {cell.fit && cell.value !== null && cell.state !== "failed" && (
        <p className="mt-2 line-clamp-3 border-l-4 border-wind pl-2 text-small text-slate">
          <strong className="text-ink">{cell.fit.severity === "doNotUse" ? "Do not use. " : "Caution. "}</strong>
          {cell.fit.message}
        </p>
      )}
      <p className="mt-auto flex flex-wrap items-baseline justify-between gap-x-3 pt-2 text-small text-quiet">
        <Link to={to} className="text-slate">
          {cell.code}
        </Link>
        {mayRun && !underWay && (
          <RunButton run={`cell:${cell.boxId}:${cell.stormId}`} name={name}>
            Run again
          </RunButton>
        )}
        {showMade && <span className="w-full">{cell.made}</span>}
      </p>
    </div>
  );
}

function Failed({ cell, to }: { cell: LedgerCellView; to: string }) {
  const [first, ...more] = cell.problems;
  return (
    <div className="border-l-4 border-error pl-2">
      <p className="font-bold text-error">{cell.stateText}</p>
      {first && <p className="text-small text-slate">{first}</p>}
      {more.length > 0 && (
        <Link to={to} className="text-small">
          and {more.length} more
        </Link>
      )}
    </div>
  );
}
