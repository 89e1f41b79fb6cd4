import type { ReactNode } from "react";

interface PageTitleProps {
  children: ReactNode;
  actions?: ReactNode;
  /** Where no project's heading stands above. */
  first?: boolean;
}

/** The heading of a page, below the project's own where there is one, with its actions at the right. */
export function PageTitle({ children, actions, first = false }: PageTitleProps) {
  const Heading = first ? "h1" : "h2";
  return (
    <div className="mb-4 mt-7 flex flex-wrap items-center justify-between gap-3 border-b-2 border-ink pb-2">
      <Heading className="text-large font-bold">{children}</Heading>
      {actions && <div className="flex flex-wrap gap-2">{actions}</div>}
    </div>
  );
}

/** What comes next, where there is nothing yet. */
export function EmptyState({ title, children, action }: { title: string; children: ReactNode; action?: ReactNode }) {
  return (
    <div className="border border-hairline px-5 py-8">
      <p className="font-bold">{title}</p>
      <div className="mt-1 max-w-prose text-slate">{children}</div>
      {action && <div className="mt-4 flex flex-wrap gap-2">{action}</div>}
    </div>
  );
}
