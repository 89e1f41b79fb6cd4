import type { ReactNode } from "react";

/** A table that may be wider than the page scrolls inside its own box, by keyboard too; what is hidden in it stays in it. */
export function WideTable({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div role="region" aria-label={label} tabIndex={0} className="relative overflow-x-auto">
      <table className="rule-table">{children}</table>
    </div>
  );
}
