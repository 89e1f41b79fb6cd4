import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/track";
import { FormErrors } from "~/components/field";
import { StudyAreaMap } from "~/components/map/study-area-map";
import { EmptyState, PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { BoxChoice } from "~/components/storms/box-choice";
import { FixTable } from "~/components/storms/fix-table";
import { SeriesFigure } from "~/components/storms/series-figure";
import { TrackParametersFields } from "~/components/storms/track-parameters-fields";
import { TrackQuestions } from "~/components/storms/track-questions";
import { SubmitButton } from "~/components/submit-button";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { currentProject } from "~/projects/current-project.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { postedParameters, postedRows, readFixes } from "~/storms/posted-track";
import { drawTrack, fixRows, parameterValues, radiiWords } from "~/storms/present-track";
import { receiveForm } from "~/storms/receive-original.server";
import { StormRefusal, WHOLE_FORM, type FormErrorsByField } from "~/storms/refusal";
import { stormFigure } from "~/storms/storm-figure";
import { parametricAt } from "~/storms/storm-track";
import { stormOf } from "~/storms/stored-record.server";
import { trackPlace } from "~/storms/track-place.server";
import { trackSeries } from "~/storms/track-series";
import { answerTrack, openTrackQuestions, saveTrack } from "~/storms/track-storm.server";

export async function loader({ request, context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const storm = await stormOf(tenant, project.id, params.storm);
  const { track } = storm;
  const { units } = organisation;
  const { boxes, box, place } = await trackPlace(tenant, project.id, request);
  const series = track && place ? trackSeries(track, place) : [];
  const draw = (width: number) =>
    stormFigure(
      series,
      { id: "track-wind", title: storm.name, windHeight: 10, mostTableRows: 0, told: parametricAt(box?.name ?? "") },
      { document: serverPlotDocument(), zone: project.timeZone, units, width },
    );
  return {
    name: storm.name,
    savedAt: storm.updatedAt.toISOString(),
    questions: await openTrackQuestions(tenant, storm),
    track: track && {
      rows: fixRows(track.fixes, units),
      radii: track.fixes.map((fix) => radiiWords(fix, units)),
      source: track.source,
      cyclone: track.cyclone,
      edited: track.edited,
      profile: track.parameters.profile,
      rain: track.parameters.rain,
      values: parameterValues(track.parameters),
      drawing: drawTrack(track.fixes, track.parameters),
    },
    boxes,
    box,
    figure: draw(FIGURE_WIDTHS.wide),
    narrowFigure: draw(FIGURE_WIDTHS.narrow),
    units,
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const storm = await stormOf(tenant, project.id, params.storm);
  const { pathname, search } = new URL(request.url);
  const here = `${pathname.replace(/\.data$/, "")}${search}`;
  const saved = { by: actor.id, at: new Date().toISOString() };
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    const answer = (key: string) => {
      const value = form.get(key);
      return typeof value === "string" && value !== "" ? { [key]: value } : {};
    };
    if (form.get("intent") === "answer") {
      await answerTrack(tenant, storm, { ...answer("storm"), ...answer("agency") }, saved);
      return redirect(here);
    }
    const { track } = storm;
    if (!track) throw new StormRefusal("This storm stands on records: it has no track to change.");
    const fixes = readFixes(postedRows(form), organisation.units, track.fixes);
    const parameters = postedParameters(form);
    if ("errors" in fixes || "errors" in parameters) {
      const errors: FormErrorsByField = {
        ...("errors" in fixes && fixes.errors),
        ...("errors" in parameters && parameters.errors),
      };
      return data({ errors }, { status: 400 });
    }
    const changed =
      JSON.stringify(fixRows(fixes.fixes, organisation.units)) !==
      JSON.stringify(fixRows(track.fixes, organisation.units));
    await saveTrack(tenant, storm, {
      ...track,
      parameters: parameters.parameters,
      // What the table shows rounded stays as it was read where nobody changed it.
      fixes: changed ? fixes.fixes : track.fixes,
      edited: track.edited || (changed && track.source !== null),
      savedBy: saved.by,
      savedAt: saved.at,
    });
    return redirect(here);
  });
}

export default function StormTrackPage({ loaderData, actionData }: Route.ComponentProps) {
  const { name, track, questions, boxes, box, figure, narrowFigure, units } = loaderData;
  const errors: FormErrorsByField = actionData?.errors ?? {};
  return (
    <>
      <title>{`Track of ${name} · Galeprint`}</title>
      <PageTitle>Track of {name}</PageTitle>
      <FormErrors errors={errors[WHOLE_FORM]} />
      {!track && questions.length === 0 && (
        <EmptyState title="No track">
          This storm stands on records. To see what a track gives, begin a storm from it.
        </EmptyState>
      )}
      {!track && questions.length > 0 && <TrackQuestions questions={questions} errors={errors} />}
      {track && (
        <>
          <p className="mb-4 max-w-prose text-slate">
            Parametric wind: computed from the fixes below by published formulas, at each study box&rsquo;s middle.{" "}
            {track.source
              ? `Read from ${track.source.fileName} (${track.source.formatLabel})${track.edited ? ", then changed by hand" : ""}.`
              : "The fixes were typed."}
          </p>
          <StudyAreaMap
            boxes={boxes}
            units={units}
            tracks={[{ name: track.cyclone || name, line: track.drawing.line, dayMarks: track.drawing.dayMarks }]}
            rings={track.drawing.rings}
            label={`Map of the track of ${name}`}
            className="h-80"
          />
          <p className="mt-1 max-w-prose text-small text-slate">
            Rings: the weakest wind whose radii the track tells, else the radius of maximum wind. The same is in the
            table of fixes.
          </p>
          <SectionHeading>Wind at a box</SectionHeading>
          <BoxChoice boxes={boxes} box={box} />
          {figure && <SeriesFigure figure={figure} narrow={narrowFigure} />}
          <Form method="post" key={loaderData.savedAt} className="grid gap-2">
            <SectionHeading>Fixes</SectionHeading>
            <FixTable rows={track.rows} radii={track.radii} units={units} errors={errors} />
            <SectionHeading>Parameters</SectionHeading>
            <TrackParametersFields profile={track.profile} values={track.values} rain={track.rain} errors={errors} />
            <div className="mt-3">
              <SubmitButton busy="Computing…" name="intent" value="save">
                Save and compute
              </SubmitButton>
              <p className="mt-1 text-small text-quiet">Estimates of the storm become out of date.</p>
            </div>
          </Form>
        </>
      )}
      <p className="mt-8">
        <Link to=".." relative="path" className="underline">
          The storm
        </Link>
      </p>
    </>
  );
}
