import { Link } from "react-router";
import type { Route } from "./+types/list";
import { EmptyState, PageTitle } from "~/components/page-title";
import { SampleFile } from "~/components/storms/sample-file";
import { WideTable } from "~/components/wide-table";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { listStorms, type StormLine } from "~/storms/list-storms.server";
import { formatQuantity } from "~/units/format-quantity";
import { formatPeriod, formatTime } from "~/units/format-time";
import type { UnitChoices } from "~/units/unit-choices";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const storms = await listStorms(tenant, project.id);
  return {
    storms: storms.map((storm) => present(storm, organisation.units, project.timeZone)),
    mayEdit: may(organisation, "project.edit"),
  };
}

function present(storm: StormLine, units: UnitChoices, zone: string) {
  const { id, name, window, peakWind, rainTotal, scenarioOf, trackAt, records, gaps } = storm;
  const waiting = records.filter(({ state }) => state === "reading");
  return {
    id,
    name,
    scenarioOf,
    trackAt,
    window: window && formatPeriod(window.startsAt, window.endsAt, zone),
    peakWind: peakWind && {
      value: formatQuantity(peakWind.value, "windSpeed", units).text,
      at: formatTime(peakWind.at, zone),
    },
    rainTotal:
      rainTotal === null
        ? window
          ? "no rain record"
          : "none yet"
        : formatQuantity(rainTotal, "rainTotal", units).text,
    records: records.length,
    waiting: waiting.map((record) => ({ id: record.id, name: record.name })),
    gaps,
  };
}

export default function StormList({ loaderData }: Route.ComponentProps) {
  const { storms, mayEdit } = loaderData;
  const bring = mayEdit && (
    <span className="flex flex-wrap gap-2">
      <Link to="tracks/new" className="button">
        From a track
      </Link>
      <Link to="new" className="button button-primary">
        New storm
      </Link>
    </span>
  );
  return (
    <>
      <PageTitle actions={storms.length > 0 && bring}>Storms</PageTitle>
      {storms.length === 0 ? (
        <EmptyState title="No storm yet" action={bring}>
          A storm is a time window with its wind, and where there are any its rain and heat. Bring a file from a buoy, a
          mast or an airport, or paste rows from a spreadsheet; a reading sheet then says what was understood.
          {mayEdit && <SampleFile />}
        </EmptyState>
      ) : (
        <WideTable label="Storms">
          <thead>
            <tr>
              <th scope="col">Storm</th>
              <th scope="col">Window</th>
              <th scope="col">Peak wind</th>
              <th scope="col">Rain in the window</th>
              <th scope="col" className="number">
                Records
              </th>
              <th scope="col">State</th>
            </tr>
          </thead>
          <tbody>
            {storms.map((storm) => (
              <StormRow key={storm.id} storm={storm} />
            ))}
          </tbody>
        </WideTable>
      )}
    </>
  );
}

function StormRow({ storm }: { storm: Route.ComponentProps["loaderData"]["storms"][number] }) {
  return (
    <tr>
      <td className="min-w-40">
        <Link to={storm.id} className="font-bold underline">
          {storm.name}
        </Link>
        {storm.trackAt && <span className="block text-small text-quiet">{storm.trackAt}</span>}
        {storm.scenarioOf && <span className="block text-small text-quiet">scenario of {storm.scenarioOf}</span>}
      </td>
      <td className="min-w-44">{storm.window ?? "none yet"}</td>
      <td className="min-w-36">
        {storm.peakWind ? (
          <>
            {storm.peakWind.value}
            <span className="block text-small text-quiet">{storm.peakWind.at}</span>
          </>
        ) : storm.window ? (
          "no wind record"
        ) : (
          "none yet"
        )}
      </td>
      <td>{storm.rainTotal}</td>
      <td className="number">{storm.records}</td>
      <td className="min-w-40">
        {storm.waiting.length === 0 ? (storm.window ? "confirmed" : "no record") : null}
        {storm.waiting.map(({ id, name }) => (
          <Link key={id} to={`${storm.id}/records/${id}`} className="block underline">
            confirm {name}
          </Link>
        ))}
        {storm.gaps > 0 && (
          <span className="block text-small text-error">
            {storm.gaps === 1 ? "a gap" : `${storm.gaps} gaps`} of more than 6 h
          </span>
        )}
      </td>
    </tr>
  );
}
