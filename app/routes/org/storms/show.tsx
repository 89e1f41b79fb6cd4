import { Link, redirect } from "react-router";
import type { Route } from "./+types/show";
import { ConfirmButton } from "~/components/confirm-button";
import { FormErrors } from "~/components/field";
import { EmptyState, PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { AddRecord } from "~/components/storms/add-record";
import { BoxChoice } from "~/components/storms/box-choice";
import { RecordCard } from "~/components/storms/record-card";
import { ScenarioForm } from "~/components/storms/scenario-form";
import { SeriesFigure } from "~/components/storms/series-figure";
import { StormFacts } from "~/components/storms/storm-facts";
import { StormSettings } from "~/components/storms/storm-settings";
import { TrackNote } from "~/components/storms/track-note";
import { WindPart } from "~/components/storms/wind-part";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { flagMarksOf, insideWindow } from "~/quality/flag-marks-of";
import { judgeSeries, qualityInputs } from "~/quality/quality-inputs.server";
import { config } from "~/services/config.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { addConstant } from "~/storms/constant-record.server";
import { copyAsScenario } from "~/storms/copy-as-scenario.server";
import { presentWind } from "~/storms/present-wind";
import { postedConstant } from "~/storms/posted-constant";
import { postedScenario } from "~/storms/posted-scenario";
import { postedWindow } from "~/storms/posted-window";
import { originalFrom, receiveForm } from "~/storms/receive-original.server";
import { WHOLE_FORM } from "~/storms/refusal";
import { removeRecord, removeStorm } from "~/storms/remove-record.server";
import { renameStorm } from "~/storms/rename-storm.server";
import { changeWindow } from "~/storms/set-window.server";
import { scenarioWords } from "~/storms/scenario";
import { showStorm } from "~/storms/show-storm.server";
import { startRecord } from "~/storms/start-record.server";
import { recordOf, stormOf } from "~/storms/stored-record.server";
import { stormFigure } from "~/storms/storm-figure";
import { postedName } from "~/storms/storm-name";
import { parametricAt, trackSentence } from "~/storms/storm-track";
import { summariseStorm } from "~/storms/storm-summary";
import { trackPlace } from "~/storms/track-place.server";
import { TRACK_WIND_HEIGHT, withTrack } from "~/storms/track-series";
import { totalsFigure } from "~/storms/totals-figure";
import { extentOf, wallClock, windowOf, withinWindow } from "~/storms/storm-window";

const MOST_TABLE_ROWS = 1000;
/** px; a rose needs no more, and leaves room beside it. */
const ROSE_WIDTH = 420;

export async function loader({ request, context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const storm = await stormOf(tenant, project.id, params.storm);
  const { series: recorded, ...shown } = await showStorm(tenant, storm);
  const { boxes, box, place } = await trackPlace(tenant, project.id, request);
  const series = withTrack(recorded, storm.track, place);
  const parametric = storm.track !== null && box !== null && !recorded.some(({ channel }) => channel === "windSpeed");
  const window = windowOf(storm);
  const inside = window ? series.map((entry) => withinWindow(entry, window)) : series;
  const summary = window && summariseStorm(series, window);
  const windHeight = parametric ? TRACK_WIND_HEIGHT : shown.windHeight;
  const scenario = shown.records.find(({ provenance }) => provenance?.scenario)?.provenance?.scenario;
  const sized = (width: number) => ({
    document: serverPlotDocument(),
    zone: project.timeZone,
    units: organisation.units,
    width,
  });
  const confirmed = shown.records.filter(({ state }) => state === "confirmed");
  // What is computed from a track is no record and has no flags.
  const judged = judgeSeries(recorded, await qualityInputs(tenant, storm, confirmed));
  const marks = new Map(
    judged.map((entry) => [entry.channel, flagMarksOf(window ? insideWindow(entry, window) : entry)]),
  );
  const draw = (width: number) =>
    stormFigure(
      inside,
      {
        id: "storm-series",
        title: storm.name,
        windHeight,
        mostTableRows: MOST_TABLE_ROWS,
        ...(parametric && { told: parametricAt(box.name) }),
        marks,
        ...(scenario && { told: "as changed for the scenario" }),
      },
      sized(width),
    );
  const drawWind = (width: number) =>
    window && summary?.peakWind
      ? presentWind(series, window, { peak: summary.peakWind.value, windHeight }, sized(width))
      : null;
  const drawTotals = (width: number) =>
    window && totalsFigure(series, window, { mostTableRows: MOST_TABLE_ROWS }, sized(width));
  return {
    scenario: scenario ? { of: scenario.of, words: scenarioWords(scenario) } : null,
    storm: { id: storm.id, name: storm.name },
    // In full, since a file's link is not the router's: one that is relative would hang on a slash at the end.
    home: `/o/${organisation.slug}/projects/${project.id}`,
    ...shown,
    track: storm.track || storm.trackFileId !== null ? { sentence: storm.track && trackSentence(storm.track) } : null,
    ...(storm.track ? { boxes: boxes.map(({ id, name }) => ({ id, name })), box } : { boxes: [], box: null }),
    windHeight,
    ...(parametric && { averagingMinutes: 10 }),
    window,
    extent: extentOf(series),
    clock: window && {
      startsAt: wallClock(window.startsAt, project.timeZone),
      endsAt: wallClock(window.endsAt, project.timeZone),
    },
    summary,
    wind: drawWind(ROSE_WIDTH),
    narrowRose: drawWind(FIGURE_WIDTHS.narrow)?.rose ?? null,
    totals: drawTotals(FIGURE_WIDTHS.wide),
    narrowTotals: drawTotals(FIGURE_WIDTHS.narrow),
    figure: draw(FIGURE_WIDTHS.wide),
    narrowFigure: draw(FIGURE_WIDTHS.narrow),
    zone: project.timeZone,
    units: organisation.units,
    uploadLimitBytes: config().uploadLimitBytes,
    mayEdit: may(organisation, "project.edit"),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, tenant, project } = await currentProject(context, params, "project.edit");
  const storm = await stormOf(tenant, project.id, params.storm);
  const storms = `/o/${params.organisation}/projects/${project.id}/storms`;
  const here = `${storms}/${storm.id}`;
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    switch (form.get("intent")) {
      case "rename":
        await renameStorm(tenant, storm, postedName(form));
        return redirect(here);
      case "window":
        await changeWindow(tenant, storm, postedWindow(form, project.timeZone), project.timeZone);
        return redirect(here);
      case "scenario": {
        const copy = await copyAsScenario(tenant, storm, {
          name: postedName(form, "scenarioName"),
          changes: postedScenario(form),
          requestedBy: actor.id,
        });
        return redirect(`${storms}/${copy.id}`);
      }
      case "constant":
        await addConstant(tenant, storm, {
          ...postedConstant(form),
          confirmedBy: actor.id,
          confirmedAt: new Date().toISOString(),
        });
        return redirect(here);
      case "remove-record":
        await removeRecord(tenant, storm, await recordOf(tenant, storm.id, String(form.get("record"))));
        return redirect(here);
      case "remove-storm":
        await removeStorm(tenant, storm);
        return redirect(storms);
      default: {
        const record = await startRecord(tenant, storm, await originalFrom(form), actor.id);
        return redirect(`${here}/records/${record.id}`);
      }
    }
  });
}

export default function ShowStorm({ loaderData, actionData }: Route.ComponentProps) {
  const { storm, scenario, home, figure, narrowFigure, wind, totals, records, window, mayEdit, estimates } = loaderData;
  const { track, boxes, box } = loaderData;
  const errors = actionData?.errors ?? {};
  const csv = `${home}/storms/${storm.id}/series.csv${box ? `?box=${box.id}` : ""}`;
  return (
    <>
      <title>{`${storm.name} · Galeprint`}</title>
      <PageTitle
        actions={
          window && (
            <>
              <Link to="quality" className="button">
                Quality
              </Link>
              <a href={csv} className="button" download>
                Series as CSV
              </a>
            </>
          )
        }
      >
        {storm.name}
      </PageTitle>
      {scenario && (
        <p className="mb-4 max-w-prose text-slate">
          A scenario of {scenario.of}: {scenario.words}. It keeps the records of that storm, which cannot be changed
          here; its window can.
        </p>
      )}
      {track && <TrackNote track={track} mayEdit={mayEdit} />}
      {track?.sentence && <BoxChoice boxes={boxes} box={box} />}
      {figure ? (
        <>
          <StormFacts {...loaderData} />
          <div className="mt-5">
            <SeriesFigure figure={figure} narrow={narrowFigure} csvHref={csv} />
          </div>
          {totals && (
            <>
              <SectionHeading>{totals.title}</SectionHeading>
              <SeriesFigure figure={totals} narrow={loaderData.narrowTotals} />
            </>
          )}
          {wind && <WindPart {...wind} narrowRose={loaderData.narrowRose} />}
        </>
      ) : (
        <EmptyState title="Nothing confirmed yet">
          {records.length === 0
            ? "Bring a record with wind below; its reading sheet comes next."
            : "Open the reading sheet of the record below, look it through and confirm it."}
        </EmptyState>
      )}
      <SectionHeading>Records</SectionHeading>
      {records.length === 0 && <p className="text-slate">None yet.</p>}
      <div className="grid gap-4 lg:grid-cols-2">
        {records.map((record) => (
          <RecordCard key={record.id} record={record} home={home} zone={loaderData.zone} mayEdit={mayEdit} />
        ))}
      </div>
      {mayEdit && (
        <>
          {scenario ? (
            <FormErrors errors={errors[WHOLE_FORM]} />
          ) : (
            <AddRecord
              key={records.length}
              errors={errors}
              uploadLimitBytes={loaderData.uploadLimitBytes}
              hasWindow={window !== null}
            />
          )}
          <StormSettings name={storm.name} clock={loaderData.clock} zone={loaderData.zone} errors={errors} />
          {window && !track && <ScenarioForm key={storm.id} errors={errors} />}
          <div className="mt-10 border-t border-hairline pt-4">
            <ConfirmButton label="Remove the storm" title={`Remove ${storm.name}?`} fields={{ intent: "remove-storm" }}>
              Its records and series go with it, their original files where no other storm uses them, and{" "}
              {estimates === 0 ? "no estimate" : estimates === 1 ? "one estimate" : `${estimates} estimates`}. Issued
              memos keep what they say. This cannot be taken back.
            </ConfirmButton>
          </div>
        </>
      )}
      <p className="mt-8">
        <Link to=".." relative="path" className="underline">
          All storms
        </Link>
      </p>
    </>
  );
}
