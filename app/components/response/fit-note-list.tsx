import type { FitSeverity } from "~/ocean/response";
import type { ResponseView } from "~/estimates/present-response";

/** A ring, a triangle, a filled square: told apart without colour, and named beside. */
const SHAPES: Record<FitSeverity, React.ReactNode> = {
  ok: <circle cx="7" cy="7" r="5" fill="none" stroke="currentColor" strokeWidth="1.75" />,
  caution: <path d="M7,1.5L13,12.5H1z" fill="none" stroke="currentColor" strokeWidth="1.75" strokeLinejoin="round" />,
  doNotUse: <rect x="1.5" y="1.5" width="11" height="11" fill="currentColor" />,
};

const TONES: Record<FitSeverity, string> = { ok: "border-ink", caution: "border-wind", doNotUse: "border-error" };

export function FitNoteList({ notes, recommendation }: { notes: ResponseView["fitNotes"]; recommendation: string }) {
  return (
    <>
      <ul className="grid gap-3">
        {notes.map(({ severity, word, message, source }) => (
          <li key={message} className={`border-l-4 pl-3 ${TONES[severity]}`}>
            <p className="flex items-baseline gap-2 text-small font-bold">
              <svg viewBox="0 0 14 14" width="12" height="12" aria-hidden="true" className="shrink-0 translate-y-px">
                {SHAPES[severity]}
              </svg>
              {word}
            </p>
            <p>{message}</p>
            <p className="text-small text-quiet">{source}</p>
          </li>
        ))}
      </ul>
      <p className="mt-4 text-slate">{recommendation}</p>
    </>
  );
}
