import { Link } from "react-router";
import type { Route } from "./+types/list";
import { EmptyState, PageTitle } from "~/components/page-title";
import { WideTable } from "~/components/wide-table";
import { listMemos } from "~/memo/list-memos.server";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.view");
  return {
    memos: await listMemos(tenant, project),
    timeZone: project.timeZone,
    mayWrite: may(organisation, "memo.write"),
    hasEstimates: (await tenant.estimates.count({ projectId: project.id })) > 0,
  };
}

export default function MemoList({ loaderData }: Route.ComponentProps) {
  const { memos, mayWrite, hasEstimates, timeZone } = loaderData;
  const begin = mayWrite && hasEstimates && (
    <Link to="new" className="button button-primary">
      New memo
    </Link>
  );
  return (
    <>
      <PageTitle actions={begin}>Memos</PageTitle>
      {memos.length === 0 ? (
        <EmptyState title="No memo yet" action={begin}>
          {hasEstimates
            ? "A memo answers the client’s question with the numbers of one or more estimates, and keeps pointing at them."
            : "A memo points at estimates. Run one from the ledger first."}
        </EmptyState>
      ) : (
        <WideTable label="Memos">
          <thead>
            <tr>
              <th scope="col">Memo</th>
              <th scope="col">Title</th>
              <th scope="col">Originator</th>
              <th scope="col">Issued ({timeZone})</th>
            </tr>
          </thead>
          <tbody>
            {memos.map(({ id, number, title, originator, revisions }) => (
              <tr key={id}>
                <td className="whitespace-nowrap">{number}</td>
                <td>
                  <Link to={id} className="font-bold">
                    {title}
                  </Link>
                </td>
                <td>{originator}</td>
                <td>
                  {revisions.length === 0
                    ? "draft"
                    : revisions.map((revision) => (
                        <p key={revision.id}>
                          <Link to={`${id}/revisions/${revision.id}`}>Revision {revision.label}</Link>{" "}
                          <span className="text-small text-quiet">
                            {revision.issued}, for {revision.purpose}
                          </span>
                        </p>
                      ))}
                </td>
              </tr>
            ))}
          </tbody>
        </WideTable>
      )}
    </>
  );
}
