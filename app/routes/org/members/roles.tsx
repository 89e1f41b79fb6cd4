import type { Route } from "./+types/roles";
import { PageTitle } from "~/components/page-title";
import { WideTable } from "~/components/wide-table";
import { currentTenant } from "~/organisations/current-tenant.server";
import { rightsTable, ROLES } from "~/organisations/permissions";

export function loader({ context }: Route.LoaderArgs) {
  currentTenant(context, "project.view");
  return { rows: rightsTable() };
}

export default function Roles({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <title>Roles and rights · Galeprint</title>
      <PageTitle first>What each role may do</PageTitle>
      <p className="mb-4 max-w-prose text-slate">
        This table is the one by which every request is judged. Signing a memo as its checker and issuing a revision are
        rights that are given to each member by name, whatever their role.
      </p>
      <WideTable label="Roles and rights">
        <thead>
          <tr>
            <th scope="col">To do</th>
            {ROLES.map((role) => (
              <th key={role} scope="col">
                {role}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {loaderData.rows.map(({ action, label, answers }) => (
            <tr key={action}>
              <th scope="row" className="font-normal">
                {label}
              </th>
              {answers.map((answer, column) => (
                <td key={ROLES[column]} className={answer === "no" ? "text-quiet" : "font-bold"}>
                  {answer}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </WideTable>
    </>
  );
}
