import type { ReactNode } from "react";

/** Asks before something far-reaching is done, without scripts too: the first press shows what it means and the form that does it. */
export function Reveal({ label, children }: { label: string; children: ReactNode }) {
  return (
    <details className="border-t border-hairline py-3">
      <summary className="w-fit cursor-pointer font-bold underline">{label}</summary>
      <div className="mt-3 grid max-w-prose gap-3 border-l-4 border-ink pl-4">{children}</div>
    </details>
  );
}
