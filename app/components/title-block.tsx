/** The block at the foot of a sheet, as on a drawing. */
export interface TitleBlockEntry {
  label: string;
  value: string;
}

export function TitleBlock({ entries }: { entries: TitleBlockEntry[] }) {
  return (
    <dl
      aria-label="Title block"
      className="mt-12 grid grid-cols-2 border-2 border-ink sm:grid-cols-3 lg:flex lg:[&>:first-child]:grow-[2]"
    >
      {entries.map(({ label, value }) => (
        <div key={label} className="-mb-px -mr-px min-w-0 grow basis-0 border-b border-r border-ink px-2.5 py-2">
          <dt className="text-small text-quiet">{label}</dt>
          <dd className="break-words text-small text-ink">{value || "–"}</dd>
        </div>
      ))}
    </dl>
  );
}
