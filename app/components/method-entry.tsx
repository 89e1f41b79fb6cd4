import type { MethodView } from "~/estimates/present-methods";

/** Equations in a box of their own, which scrolls where one is wider than the page. */
export function Equations({ equations, label }: { equations: string[]; label: string }) {
  return (
    <div role="group" aria-label={`Equations: ${label}`} tabIndex={0} className="equations overflow-x-auto py-2">
      {equations.map((markup) => (
        // The markup is made on the server of the engine's own TeX.
        <div key={markup} dangerouslySetInnerHTML={{ __html: markup }} />
      ))}
    </div>
  );
}

/** What a method's letters mean, where it holds, and where it comes from. */
export function MethodFacts({ method }: { method: MethodView }) {
  return (
    <>
      <dl className="mt-1 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 text-small">
        {method.symbols.map(({ symbol, meaning, unit }) => (
          <div key={symbol} className="contents">
            <dt className="font-bold">{symbol}</dt>
            <dd className="text-slate">
              {meaning}
              {unit !== "" && unit !== "1" && ` (${unit})`}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 text-small text-slate">Valid: {method.validRange}</p>
      <p className="text-small text-slate">
        {method.citation}
        {method.doi !== null && (
          <>
            {" · "}
            <a href={`https://doi.org/${method.doi}`}>doi:{method.doi}</a>
          </>
        )}
      </p>
      {method.remark !== "" && <p className="text-small text-slate">{method.remark}</p>}
    </>
  );
}
