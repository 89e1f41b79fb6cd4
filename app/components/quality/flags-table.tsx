import { Link } from "react-router";
import { WideTable } from "~/components/wide-table";
import type { FlagRow } from "~/quality/present-flags";
import { FlagSymbol } from "./flag-symbol";

interface FlagsTableProps {
  rows: readonly FlagRow[];
  zone: string;
  /** Id of the form that the ticks belong to; null where nothing may be set. */
  formId: string | null;
}

/** Samples with their flags, and which tests raised them. */
export function FlagsTable({ rows, zone, formId }: FlagsTableProps) {
  return (
    <WideTable label="Flags">
      <thead>
        <tr>
          {formId !== null && (
            <th scope="col">
              <span className="sr-only">Chosen</span>
            </th>
          )}
          <th scope="col">Time ({zone})</th>
          <th scope="col">Channel</th>
          <th scope="col" className="number">
            Value
          </th>
          <th scope="col">Flag</th>
          <th scope="col">Raised by</th>
          <th scope="col">Set by a person</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, time, channel, value, flag, flagWords, raisedBy, set, present }) => (
          <tr key={key}>
            {formId !== null && (
              <td>
                {present && (
                  <input
                    type="checkbox"
                    form={formId}
                    name="sample"
                    value={key}
                    aria-label={`${channel}, ${time}`}
                    className="size-5 accent-ink"
                  />
                )}
              </td>
            )}
            <td className="whitespace-nowrap">{time}</td>
            <td>{channel}</td>
            <td className="number whitespace-nowrap">{present ? value : "none"}</td>
            <td className="whitespace-nowrap">
              <FlagSymbol flag={flag} /> {flag} · {flagWords}
            </td>
            <td className="text-small text-slate">{raisedBy}</td>
            <td className="min-w-40 break-words text-small text-slate">{set}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}

interface PagesProps {
  page: number;
  pages: number;
  /** The address of a page of the same rows. */
  to: (page: number) => string;
}

export function Pages({ page, pages, to }: PagesProps) {
  if (pages === 1) return null;
  return (
    <nav aria-label="Pages of the flags" className="mt-3 flex flex-wrap items-center gap-3">
      {page > 1 && (
        <Link to={to(page - 1)} preventScrollReset className="button">
          Earlier rows
        </Link>
      )}
      <span className="text-slate">
        Page {page} of {pages}
      </span>
      {page < pages && (
        <Link to={to(page + 1)} preventScrollReset className="button">
          More rows
        </Link>
      )}
    </nav>
  );
}
