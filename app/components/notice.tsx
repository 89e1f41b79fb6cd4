import type { ReactNode } from "react";

/** What was done, announced when it appears. */
export function Notice({ children }: { children: ReactNode }) {
  return (
    <p role="status" className="mb-4 border-l-4 border-ink py-1 pl-3">
      {children}
    </p>
  );
}
