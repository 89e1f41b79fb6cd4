import { Link } from "react-router";
import type { Route } from "./+types/list";
import { EmptyState, PageTitle } from "~/components/page-title";
import { usePoll } from "~/components/use-poll";
import { WideTable } from "~/components/wide-table";
import { STATE_KINDS, STATE_NAMES } from "~/estimates/estimate-state";
import { loadLedger } from "~/estimates/load-ledger.server";
import { presentLedger } from "~/estimates/present-ledger";
import { currentProject } from "~/projects/current-project.server";

const PAGE_SIZE = 50;

export async function loader({ request, context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const search = new URL(request.url).searchParams;
  const chosen = STATE_KINDS.find((kind) => kind === search.get("state")) ?? null;
  const { timeZone: zone, jobNumber } = project;
  const ledger = presentLedger(await loadLedger(tenant, project), {
    figure: "surfaceSalinity",
    units: organisation.units,
    zone,
    jobNumber,
  });
  const matching = ledger.cells.filter(({ state }) => chosen === null || state === chosen);
  const pages = Math.max(1, Math.ceil(matching.length / PAGE_SIZE));
  const page = Math.min(pages, Math.max(1, Math.trunc(Number(search.get("page"))) || 1));
  const nameOf = (rows: { id: string; name: string }[], id: string) => rows.find((row) => row.id === id)?.name ?? "";
  return {
    home: `/o/${organisation.slug}/projects/${project.id}`,
    chosen,
    states: STATE_KINDS.flatMap((kind) => {
      const count = ledger.cells.filter(({ state }) => state === kind).length;
      return count > 0 ? [{ kind, name: STATE_NAMES[kind], count }] : [];
    }),
    total: ledger.cells.length,
    page,
    pages,
    underWay: ledger.underWay,
    rows: matching.slice((page - 1) * PAGE_SIZE, page * PAGE_SIZE).map((cell) => ({
      id: cell.estimateId,
      code: cell.code,
      box: nameOf(ledger.boxes, cell.boxId),
      storm: nameOf(ledger.storms, cell.stormId),
      state: cell.stateText,
      made: cell.made,
      salinity: cell.value,
    })),
  };
}

export default function EstimateList({ loaderData }: Route.ComponentProps) {
  const { home, chosen, states, total, page, pages, rows } = loaderData;
  usePoll(loaderData.underWay);
  const at = (number: number) => `?${new URLSearchParams({ ...(chosen && { state: chosen }), page: String(number) })}`;
  return (
    <>
      <title>Estimates · Galeprint</title>
      <PageTitle>Estimates</PageTitle>
      {total === 0 ? (
        <EmptyState
          title="No estimate yet"
          action={
            <Link to={home} className="button button-primary">
              Open the ledger
            </Link>
          }
        >
          Estimates are run from the ledger: one for each study box and storm.
        </EmptyState>
      ) : (
        <>
          <nav aria-label="Filter by state" className="mb-4 flex flex-wrap gap-x-5 gap-y-1">
            <Link to="." aria-current={chosen === null ? "true" : undefined} className="aria-[current]:font-bold">
              all ({total})
            </Link>
            {states.map(({ kind, name, count }) => (
              <Link
                key={kind}
                to={`?state=${kind}`}
                aria-current={chosen === kind ? "true" : undefined}
                className="aria-[current]:font-bold"
              >
                {name} ({count})
              </Link>
            ))}
          </nav>
          <WideTable label="Estimates">
            <thead>
              <tr>
                <th scope="col">Estimate</th>
                <th scope="col">Study box</th>
                <th scope="col">Storm</th>
                <th scope="col">Lowest salinity</th>
                <th scope="col">State</th>
                <th scope="col">Water column and method sheet</th>
              </tr>
            </thead>
            <tbody>
              {rows.map(({ id, code, box, storm, state, made, salinity }) => (
                <tr key={id}>
                  <td className="whitespace-nowrap">
                    <Link to={id} className="font-bold">
                      {code}
                    </Link>
                  </td>
                  <td>{box}</td>
                  <td>{storm}</td>
                  <td className="whitespace-nowrap">{salinity ?? "none"}</td>
                  <td>{state}</td>
                  <td className="text-small text-slate">{made}</td>
                </tr>
              ))}
            </tbody>
          </WideTable>
          {rows.length === 0 && <p className="py-4 text-slate">No estimate is in this state now.</p>}
          {pages > 1 && (
            <nav aria-label="Pages" className="mt-4 flex gap-3">
              {page > 1 && <Link to={at(page - 1)}>Before</Link>}
              <span className="text-quiet">
                page {page} of {pages}
              </span>
              {page < pages && <Link to={at(page + 1)}>After</Link>}
            </nav>
          )}
        </>
      )}
    </>
  );
}
