import type { ReactNode } from "react";

/** Heads a part of a page, under the page's own title. */
export function SectionHeading({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <h3 id={id} className="mb-2 mt-8 border-b border-hairline pb-1 text-base font-bold">
      {children}
    </h3>
  );
}
