import { WideTable } from "~/components/wide-table";
import { Link } from "react-router";
import { Equations, MethodFacts } from "~/components/method-entry";
import type { MethodView } from "~/estimates/present-methods";
import type { BudgetView, MethodRowView } from "~/estimates/present-response";

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

/** The equations behind a response, each opening to its symbols and source. */
export function EquationList({ methods }: { methods: MethodView[] }) {
  return (
    <>
      <ul>
        {methods.map((method) => (
          <li key={method.id} className="border-b border-hairline">
            <details>
              <summary className="py-2">
                {method.title} <span className="text-small text-quiet">· {method.provenance}</span>
              </summary>
              <div className="pb-4 pl-4">
                <Equations equations={method.equations} label={method.title} />
                <MethodFacts method={method} />
              </div>
            </details>
          </li>
        ))}
      </ul>
      <p className="mt-2 text-small">
        <Link to="/methods">All methods of the engine</Link>
      </p>
    </>
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
