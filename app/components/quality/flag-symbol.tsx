import type { Flag } from "~/quality/flags";

/** As on the plots: told apart by shape, and named beside. */
const SHAPES: Partial<Record<Flag, React.ReactNode>> = {
  3: <path d="M7,2L12.5,12H1.5z" fill="none" stroke="currentColor" strokeWidth="1.75" strokeLinejoin="round" />,
  4: <path d="M2,2L12,12M12,2L2,12" fill="none" stroke="currentColor" strokeWidth="2.25" />,
  9: <path d="M7,2V12" fill="none" stroke="currentColor" strokeWidth="2" />,
};

const TONES: Partial<Record<Flag, string>> = { 4: "text-error", 9: "text-quiet" };

export function FlagSymbol({ flag }: { flag: Flag }) {
  return (
    <svg viewBox="0 0 14 14" width="12" height="12" aria-hidden="true" className={`inline-block ${TONES[flag] ?? ""}`}>
      {SHAPES[flag]}
    </svg>
  );
}
