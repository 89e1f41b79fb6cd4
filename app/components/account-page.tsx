import type { ReactNode } from "react";
import { Link } from "react-router";
import { Mark } from "./mark";

/** The sheet on which people sign in and up. */
export function AccountPage({ title, children }: { title: string; children: ReactNode }) {
  return (
    <main className="mx-auto max-w-md px-5 py-12 sm:py-20">
      <title>{`${title} · Galeprint`}</title>
      <Link to="/" className="flex items-center gap-2 text-large font-bold no-underline">
        <Mark /> galeprint
      </Link>
      <h1 className="mb-6 mt-10 text-title font-bold">{title}</h1>
      {children}
    </main>
  );
}
