import { WideTable } from "~/components/wide-table";
import type { BudgetView, MethodRowView } from "~/estimates/present-response";
import type { MethodSource } from "~/ocean/sources";

/** Heads a row, without the rule that heads a column. */
const ROW_HEAD = "border-b border-hairline align-top text-base font-normal text-ink";

/** Every law and parameter with its value, its source, and whether someone chose it. */
export function MethodTable({ rows }: { rows: MethodRowView[] }) {
  return (
    <WideTable label="Laws and parameters">
      <thead>
        <tr>
          <th scope="col">Law or parameter</th>
          <th scope="col">Value</th>
          <th scope="col">Chosen or default</th>
          <th scope="col">Source</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ label, value, origin, source }) => (
          <tr key={label}>
            <th scope="row" className={ROW_HEAD}>
              {label}
            </th>
            <td>{value}</td>
            <td className={origin === "chosen" ? "font-bold" : "text-quiet"}>{origin}</td>
            <td className="text-small text-slate">{source}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}

export function EquationList({ sources }: { sources: MethodSource[] }) {
  return (
    <ul>
      {sources.map((source) => (
        <li key={source.id} className="border-b border-hairline">
          <details>
            <summary className="py-2">
              {source.title} <span className="text-small text-quiet">· {source.provenance}</span>
            </summary>
            <div className="pb-4 pl-4">
              <pre className="overflow-x-auto py-1 font-sans text-base" tabIndex={0}>
                {source.equation}
              </pre>
              <dl className="mt-2 grid grid-cols-[auto_1fr] gap-x-4 text-small">
                {source.symbols.map(({ symbol, meaning, unit }) => (
                  <div key={symbol} className="contents">
                    <dt className="font-bold">{symbol}</dt>
                    <dd className="text-slate">
                      {meaning}
                      {unit !== "" && unit !== "1" && ` (${unit})`}
                    </dd>
                  </div>
                ))}
              </dl>
              <p className="mt-2 text-small text-slate">Valid: {source.validRange}</p>
              <p className="text-small text-slate">
                {source.citation}
                {source.doi && (
                  <>
                    {" · "}
                    <a href={`https://doi.org/${source.doi}`}>doi:{source.doi}</a>
                  </>
                )}
              </p>
              {source.remark && <p className="text-small text-slate">{source.remark}</p>}
            </div>
          </details>
        </li>
      ))}
    </ul>
  );
}

/** What the water's content changed by, what was put in, and what is left over: a check of the arithmetic. */
export function BudgetTable({ rows }: { rows: BudgetView[] }) {
  return (
    <WideTable label="Budgets">
      <thead>
        <tr>
          <th scope="col">Budget</th>
          <th scope="col" className="number">
            Change
          </th>
          <th scope="col" className="number">
            Input
          </th>
          <th scope="col" className="number">
            Residual
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ label, unit, change, input, residual }) => (
          <tr key={label}>
            <th scope="row" className={ROW_HEAD}>
              {label} ({unit})
            </th>
            <td className="number">{change}</td>
            <td className="number">{input}</td>
            <td className="number">{residual}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
