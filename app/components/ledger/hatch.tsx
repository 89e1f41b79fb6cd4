import { useId } from "react";

/** Fine strokes over a cell whose numbers no longer belong to its inputs. */
export function Hatch() {
  const id = useId();
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute inset-0 -z-10 size-full">
      <pattern id={id} width="10" height="10" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <path d="M0,0V10" stroke="var(--hairline)" strokeWidth="1.5" />
      </pattern>
      <rect width="100%" height="100%" fill={`url(#${id})`} />
    </svg>
  );
}
