import { useId } from "react";
import type { RingEditing } from "./use-ring-editing";
import type { CoordinateStyle } from "~/area/format-coordinates";

const STYLES: { style: CoordinateStyle; name: string }[] = [
  { style: "decimal", name: "Decimal degrees" },
  { style: "minutes", name: "Degrees, minutes" },
  { style: "seconds", name: "Degrees, minutes, seconds" },
];

interface CoordinateFieldProps {
  editing: RingEditing;
  /** Sentences about the text or the box. */
  problems: string[];
  warnings: string[];
}

/** The box as text, one corner a line: equal to the map, and all that is needed without a pointer. */
export function CoordinateField({ editing, problems, warnings }: CoordinateFieldProps) {
  const id = useId();
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap items-end justify-between gap-2">
        <label htmlFor={`${id}-text`} className="text-small font-bold text-slate">
          Corners, one a line: latitude, longitude (WGS 84)
        </label>
        <label className="text-small text-quiet">
          <span className="sr-only">Write corners in </span>
          <select
            className="min-h-9 border border-quiet bg-sheet px-1 text-small text-ink"
            value={editing.style}
            onChange={({ target }) => editing.writeIn(target.value as CoordinateStyle)}
          >
            {STYLES.map(({ style, name }) => (
              <option key={style} value={style}>
                {name}
              </option>
            ))}
          </select>
        </label>
      </div>
      <textarea
        id={`${id}-text`}
        className="input font-sans"
        rows={7}
        spellCheck={false}
        autoComplete="off"
        placeholder={"54.40 N 8.20 W\n54.40 N 8.00 W\n54.30 N 8.00 W"}
        value={editing.text}
        onChange={({ target }) => editing.type(target.value)}
        aria-invalid={problems.length > 0}
        aria-describedby={`${id}-problems ${id}-hint`}
      />
      <div id={`${id}-problems`} role="status" className="text-small">
        {problems.length > 0 && (
          <ul className="text-error">
            {problems.map((problem) => (
              <li key={problem}>{problem}</li>
            ))}
          </ul>
        )}
        {warnings.map((warning) => (
          <p key={warning}>Note: {warning}</p>
        ))}
      </div>
      <p id={`${id}-hint`} className="text-small text-quiet">
        Decimal degrees, degrees and minutes, or degrees, minutes and seconds; N, S, E, W or a minus sign for south and
        west. The map follows as you type.
      </p>
    </div>
  );
}
