import { Link } from "react-router";
import type { Route } from "./+types/list";
import { EmptyState, PageTitle } from "~/components/page-title";
import { WideTable } from "~/components/wide-table";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { presentColumn, type PresentedLayer } from "~/water/present-column";
import { castSentence } from "~/water/present-cast";
import { listCasts } from "~/water/stored-cast.server";
import { twoLayersOf } from "~/water/stored-column.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const columns = await tenant.waterColumns.list({ where: { projectId: project.id }, order: [["name", "ASC"]] });
  const casts = await listCasts(tenant, project.id);
  return {
    columns: columns.map((column) => {
      const cast = casts.find(({ waterColumnId }) => waterColumnId === column.id);
      return {
        id: column.id,
        name: column.name,
        source: column.source,
        cast: cast ? castSentence(cast, organisation.units) : null,
        ...presentColumn(twoLayersOf(column), organisation.units),
      };
    }),
    waiting: casts.filter(({ waterColumnId }) => waterColumnId === null).map(({ id, name }) => ({ id, name })),
    mayEdit: may(organisation, "project.edit"),
  };
}

export default function WaterList({ loaderData }: Route.ComponentProps) {
  const { columns, waiting, mayEdit } = loaderData;
  const describeOne = mayEdit && (
    <>
      <Link to="casts/new" className="button button-primary">
        Import a cast
      </Link>
      <Link to="new" className="button">
        New water column
      </Link>
    </>
  );
  return (
    <>
      <PageTitle actions={columns.length > 0 && describeOne}>Water</PageTitle>
      {mayEdit && waiting.length > 0 && <Waiting casts={waiting} />}
      {columns.length === 0 ? (
        <EmptyState title="No water column yet" action={describeOne}>
          A water column is what the storm finds: a layer with its temperature, salinity and depth, and where they are
          known those of the water below. Import a cast, and the whole profile is used; or type two layers from a
          mooring or an atlas, and say from which.
        </EmptyState>
      ) : (
        <WideTable label="Water columns">
          <thead>
            <tr>
              <th scope="col">Column</th>
              <th scope="col">Layer</th>
              <th scope="col" className="number">
                Layer depth
              </th>
              <th scope="col">Water below</th>
              <th scope="col" className="number">
                Density step
              </th>
              <th scope="col">Source</th>
            </tr>
          </thead>
          <tbody>
            {columns.map(({ id, name, source, cast, layer, layerDepth, below, densityStep }) => (
              <tr key={id}>
                <td className="min-w-36 font-bold">
                  {mayEdit ? (
                    <Link to={id} className="underline">
                      {name}
                    </Link>
                  ) : (
                    name
                  )}
                </td>
                <td className="min-w-40">
                  <LayerCell layer={layer} />
                </td>
                <td className="number whitespace-nowrap">{layerDepth}</td>
                <td className="min-w-40">{below ? <LayerCell layer={below} /> : "not given"}</td>
                <td className="number whitespace-nowrap">{densityStep ?? "not known"}</td>
                <td className="min-w-48 text-small text-slate">
                  {source}
                  {cast && <span className="block text-quiet">{cast}</span>}
                </td>
              </tr>
            ))}
          </tbody>
        </WideTable>
      )}
    </>
  );
}

/** Casts whose sheet nobody confirmed yet: they count for nothing. */
function Waiting({ casts }: { casts: { id: string; name: string }[] }) {
  return (
    <div className="mb-5 border-l-4 border-ink py-1 pl-3">
      {casts.length === 1 ? "A cast waits" : `${casts.length} casts wait`} to be looked through and confirmed:
      <ul>
        {casts.map(({ id, name }) => (
          <li key={id} className="break-words">
            <Link to={`casts/${id}`} className="underline">
              {name}
            </Link>
          </li>
        ))}
      </ul>
    </div>
  );
}

function LayerCell({ layer }: { layer: PresentedLayer }) {
  return (
    <>
      <span className="text-heat">{layer.temperature}</span> · <span className="text-rain">{layer.salinity}</span>
      <span className="block text-small text-density">{layer.density}</span>
    </>
  );
}
