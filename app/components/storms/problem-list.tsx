import { SectionHeading } from "~/components/section-heading";
import { WideTable } from "~/components/wide-table";
import type { ReadingProblem, SeriesReading } from "~/readers/reading";

interface ProblemListProps {
  problems: ReadingProblem[];
  dropped: SeriesReading["dropped"];
}

/** What is wrong, where, and what to do; then the rows that were dropped and why. */
export function ProblemList({ problems, dropped }: ProblemListProps) {
  return (
    <>
      {problems.length > 0 && (
        <>
          <SectionHeading>Problems</SectionHeading>
          <ul className="grid gap-2">
            {problems.map(({ severity, code, row, column, message, count }) => (
              <li key={`${code} ${row} ${column}`} className="border-b border-hairline pb-2">
                <span className={`mr-2 font-bold ${severity === "error" ? "text-error" : ""}`}>{severity}</span>
                {message}
                {count !== undefined && count > 1 && <span className="text-quiet"> Met {count} times.</span>}
              </li>
            ))}
          </ul>
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
