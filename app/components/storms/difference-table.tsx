import { WideTable } from "~/components/wide-table";
import type { Difference } from "~/storms/reading-difference";

/** What the last answers changed. */
export function DifferenceTable({ differences }: { differences: Difference[] }) {
  if (differences.length === 0) {
    return (
      <p role="status" className="mt-4 border-l-4 border-ink py-1 pl-3">
        Read again: these answers change none of the figures below.
      </p>
    );
  }
  return (
    <section role="status" aria-label="What the answers changed" className="mt-4 border-l-4 border-ink py-1 pl-3">
      <p className="mb-1 font-bold">Read again. This changed:</p>
      <WideTable label="What the answers changed">
        <thead>
          <tr>
            <th scope="col">What</th>
            <th scope="col">Before</th>
            <th scope="col">Now</th>
          </tr>
        </thead>
        <tbody>
          {differences.map(({ what, before, after }) => (
            <tr key={what}>
              <td>{what}</td>
              <td className="text-quiet">{before}</td>
              <td>{after}</td>
            </tr>
          ))}
        </tbody>
      </WideTable>
    </section>
  );
}
