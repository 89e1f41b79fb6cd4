import type { SmallMark } from "~/figures/small-marks";

/** Shows a mark that stands in a line or a cell. Its markup is our own, made of numbers. */
export function SmallMarkView({ mark, className }: { mark: SmallMark; className?: string }) {
  return (
    <span
      role="img"
      aria-label={mark.alt}
      className={`inline-block shrink-0 leading-none [&>svg]:block ${className ?? ""}`}
      dangerouslySetInnerHTML={{ __html: mark.svg }}
    />
  );
}
