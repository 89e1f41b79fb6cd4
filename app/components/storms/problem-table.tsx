import { SectionHeading } from "~/components/section-heading";
import { WideTable } from "~/components/wide-table";
import type { ReadingProblem, SeriesReading } from "~/readers/reading";

interface ProblemTableProps {
  problems: ReadingProblem[];
  dropped: SeriesReading["dropped"];
}

/** What is wrong, where, and what to do; then the rows that were dropped and why. */
export function ProblemTable({ problems, dropped }: ProblemTableProps) {
  return (
    <>
      {problems.length > 0 && (
        <>
          <SectionHeading>Problems</SectionHeading>
          <WideTable label="Problems">
            <thead>
              <tr>
                <th scope="col">Kind</th>
                <th scope="col" className="number">
                  Line
                </th>
                <th scope="col">Column</th>
                <th scope="col">What, and what to do</th>
              </tr>
            </thead>
            <tbody>
              {problems.map(({ severity, code, row, column, message, count }) => (
                <tr key={`${code} ${row} ${column}`}>
                  <td className={severity === "error" ? "font-bold text-error" : undefined}>{severity}</td>
                  <td className="number">{row ?? "–"}</td>
                  <td>{column ?? "–"}</td>
                  <td className="min-w-64">
                    {message}
                    {count !== undefined && count > 1 && <span className="text-quiet"> Met {count} times.</span>}
                  </td>
                </tr>
              ))}
            </tbody>
          </WideTable>
        </>
      )}
      {dropped.length > 0 && (
        <>
          <SectionHeading>Rows dropped</SectionHeading>
          <WideTable label="Rows dropped">
            <thead>
              <tr>
                <th scope="col">Why</th>
                <th scope="col" className="number">
                  Rows
                </th>
                <th scope="col" className="number">
                  First on line
                </th>
              </tr>
            </thead>
            <tbody>
              {dropped.map(({ reason, count, firstRow }) => (
                <tr key={reason}>
                  <td className="min-w-52">{reason}</td>
                  <td className="number">{count}</td>
                  <td className="number">{firstRow}</td>
                </tr>
              ))}
            </tbody>
          </WideTable>
        </>
      )}
    </>
  );
}
