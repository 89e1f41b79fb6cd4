import type { ReactNode } from "react";
import { useNavigation } from "react-router";

interface RunButtonProps {
  /** As `run-request.ts` reads it. */
  run: string;
  /** What it runs, for those who hear the page. */
  name: string;
  children: ReactNode;
}

/** A small button among the numbers; it sends the form that stands around the ledger. */
export function RunButton({ run, name, children }: RunButtonProps) {
  const navigation = useNavigation();
  const sending = navigation.formMethod === "POST";
  const own = navigation.formData?.get("run") === run;
  return (
    <button
      type="submit"
      name="run"
      value={run}
      disabled={sending}
      className="min-h-6 text-small text-slate underline underline-offset-2 hover:text-ink disabled:text-quiet disabled:no-underline"
    >
      {sending && own ? "Starting…" : children}
      <span className="sr-only"> {name}</span>
    </button>
  );
}
