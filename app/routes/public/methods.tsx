import type { ReactNode } from "react";
import { Link } from "react-router";
import type { Route } from "./+types/methods";
import { Equations, MethodFacts } from "~/components/method-entry";
import { Mark } from "~/components/mark";
import { WideTable } from "~/components/wide-table";
import { PROVENANCES, presentMethods, UNCERTAIN_INPUTS, type MethodView } from "~/estimates/present-methods";
import { CAUTION } from "~/ocean/caution";
import { ENGINE_VERSION } from "~/ocean/version";
import { mathMarkup } from "~/services/typeset.server";

export function loader() {
  return { groups: presentMethods(mathMarkup), engine: ENGINE_VERSION };
}

/** Every method of the engine with its equation, range and source: the same entries that responses and memos cite. */
export default function Methods({ loaderData }: Route.ComponentProps) {
  const { groups, engine } = loaderData;
  return (
    <main className="mx-auto max-w-6xl px-5 py-10">
      <title>Methods · Galeprint</title>
      <meta name="description" content="The published methods behind Galeprint's estimates, each with its source." />
      <Link to="/" className="flex items-center gap-2 text-large font-bold no-underline">
        <Mark /> galeprint
      </Link>
      <h1 className="mt-8 text-title font-bold">Methods</h1>
      <p className="mt-2 max-w-prose text-slate">
        Every formula that an estimate may use, with what its letters mean, where it holds and where it comes from.
        Engine {engine}.
      </p>
      <p className="mt-3 max-w-prose text-slate">{CAUTION}</p>
      <div className="mt-8 gap-x-12 lg:grid lg:grid-cols-[14rem_minmax(0,1fr)]">
        <nav
          aria-label="Methods"
          className="mb-8 lg:sticky lg:top-6 lg:mb-0 lg:max-h-[calc(100vh-3rem)] lg:self-start lg:overflow-y-auto print:hidden"
        >
          <ol className="columns-2 gap-x-6 text-small sm:columns-3 lg:columns-1">
            {groups.map(({ id, name }) => (
              <li key={id} className="break-inside-avoid">
                <a href={`#${id}`} className="block py-1">
                  {name}
                </a>
              </li>
            ))}
          </ol>
        </nav>
        <div className="min-w-0">
          <section aria-labelledby="provenance">
            <h2 id="provenance" className="border-b-2 border-ink pb-2 text-large font-bold">
              How well each is known
            </h2>
            <dl className="mt-3 grid gap-x-6 gap-y-1 sm:grid-cols-[auto_minmax(0,1fr)]">
              {PROVENANCES.map(({ name, meaning }) => (
                <div key={name} className="contents">
                  <dt className="font-bold">{name}</dt>
                  <dd className="text-slate">{meaning}</dd>
                </div>
              ))}
            </dl>
          </section>
          {groups.map(({ id, name, methods }) => (
            <section key={id} aria-labelledby={id}>
              <h2 id={id} className="mt-12 scroll-mt-6 border-b-2 border-ink pb-2 text-large font-bold">
                {name}
              </h2>
              {methods.map((method) => (
                <Method key={method.id} method={method}>
                  {method.id === "ensemble" && <UncertainInputs />}
                </Method>
              ))}
            </section>
          ))}
        </div>
      </div>
    </main>
  );
}

function Method({ method, children }: { method: MethodView; children?: ReactNode }) {
  return (
    <article
      id={method.id}
      className="-mx-3 scroll-mt-6 break-inside-avoid border-b border-hairline px-3 py-4 target:bg-mist"
    >
      <h3 className="flex flex-wrap items-baseline justify-between gap-x-4 font-bold">
        <a href={`#${method.id}`} className="text-ink no-underline">
          {method.title}
        </a>
        <span className="text-small font-normal text-quiet">{method.provenance}</span>
      </h3>
      <Equations equations={method.equations} label={method.title} />
      <MethodFacts method={method} />
      {children}
    </article>
  );
}

/** Each input that an ensemble varies, with its range. */
function UncertainInputs() {
  return (
    <WideTable label="Uncertain inputs of an ensemble">
      <thead>
        <tr>
          <th scope="col">Uncertain input</th>
          <th scope="col">Range</th>
          <th scope="col">Where the range comes from</th>
          <th scope="col">Varied</th>
        </tr>
      </thead>
      <tbody>
        {UNCERTAIN_INPUTS.map(({ name, range, basis, when }) => (
          <tr key={name}>
            <td>{name}</td>
            <td className="min-w-44">{range}</td>
            <td className="text-small text-slate">{basis}</td>
            <td className="text-small text-slate">{when}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
