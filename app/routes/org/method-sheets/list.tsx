import { Link } from "react-router";
import type { Route } from "./+types/list";
import { PageTitle } from "~/components/page-title";
import { METHOD_KEYS, PARAMETERS, parameterText } from "~/estimates/method-parameters";
import { defaultMethodSheet } from "~/estimates/start-estimates.server";
import { currentTenant } from "~/organisations/current-tenant.server";
import { may } from "~/organisations/permissions";

export async function loader({ context }: Route.LoaderArgs) {
  const { organisation, tenant } = currentTenant(context, "project.view");
  const [sheets, standard] = await Promise.all([
    tenant.methodSheets.list({
      order: [
        ["name", "ASC"],
        ["version", "DESC"],
      ],
    }),
    defaultMethodSheet(tenant),
  ]);
  return {
    sheets: sheets.map(({ id, name, version, choices, ensemble, createdAt }) => ({
      id,
      name,
      version,
      created: createdAt.toISOString().slice(0, 10),
      isDefault: id === standard?.id,
      isNewest: sheets.every((other) => other.name !== name || other.version <= version),
      chosen: [
        ...METHOD_KEYS.flatMap((key) => {
          const value = choices[key];
          const parameter = PARAMETERS[key];
          if (value === undefined) return [];
          return [
            `${parameter.label}: ${parameterText(key, value, parameter.kind === "number" ? parameter.unit : "")}`,
          ];
        }),
        ensemble ? `range from ${ensemble.members} members, seed ${ensemble.seed}` : "no range",
      ],
    })),
    mayEdit: may(organisation, "project.edit"),
  };
}

export default function MethodSheetList({ loaderData }: Route.ComponentProps) {
  const { sheets, mayEdit } = loaderData;
  const create = mayEdit && (
    <Link to="new" className="button button-primary">
      New method sheet
    </Link>
  );
  return (
    <>
      <title>Method sheets · Galeprint</title>
      <PageTitle first actions={create}>
        Method sheets
      </PageTitle>
      <p className="mb-4 max-w-prose text-slate">
        A method sheet is the choice of laws and parameters of an estimate. A version never changes: what was run can be
        traced to it for good, and a change is the next version.
      </p>
      <ul className="border-t-2 border-ink">
        {sheets.map((sheet) => (
          <li key={sheet.id} className="flex flex-wrap items-start gap-x-6 gap-y-2 border-b border-hairline py-3">
            <div className="min-w-0 grow basis-80">
              <p>
                <strong>{sheet.name}</strong>, version {sheet.version}
                {sheet.isDefault && <span className="text-small text-slate"> · default of new estimates</span>}
              </p>
              <p className="text-small text-slate">{sheet.chosen.join(" · ")}</p>
              <p className="text-small text-quiet">
                since {sheet.created} UTC; all else as the engine’s stated defaults
              </p>
            </div>
            {mayEdit && sheet.isNewest && (
              <Link to={`new?from=${sheet.id}`} className="button">
                Next version
              </Link>
            )}
          </li>
        ))}
      </ul>
    </>
  );
}
