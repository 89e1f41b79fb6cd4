import type { TriggerView } from "~/estimates/present-response";

/** The client's limits, and whether the storm met them. */
export function TriggerList({ triggers }: { triggers: TriggerView[] }) {
  if (triggers.length === 0) {
    return (
      <p className="text-slate">No trigger level is set for this box. Limits of the client are set with the box.</p>
    );
  }
  return (
    <ul>
      {triggers.map(({ level, verdict, met, detail }) => (
        <li key={level + detail} className="flex flex-wrap items-baseline gap-x-4 border-b border-hairline py-2">
          <span className="min-w-0 grow basis-56">
            <span className="block">{level}</span>
            <span className="block text-small text-slate">{detail}</span>
          </span>
          <strong className={met ? "border-2 border-ink px-2" : "px-2 font-normal text-slate"}>{verdict}</strong>
        </li>
      ))}
    </ul>
  );
}
