import { WideTable } from "./wide-table";

interface UnderstoodLinesProps {
  lines: readonly { what: string; taken: string; confidence: string }[];
}

/** What a reader took a file for, and how sure it is. */
export function UnderstoodLines({ lines }: UnderstoodLinesProps) {
  return (
    <WideTable label="What was understood">
      <thead>
        <tr>
          <th scope="col">What</th>
          <th scope="col">Taken for</th>
          <th scope="col">How sure</th>
        </tr>
      </thead>
      <tbody>
        {lines.map(({ what, taken, confidence }, index) => (
          <tr key={index}>
            <td>{what}</td>
            <td className="min-w-36">{taken}</td>
            <td>{confidence}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
