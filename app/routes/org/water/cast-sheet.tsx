import { parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect, useNavigation } from "react-router";
import type { Route } from "./+types/cast-sheet";
import { ConfirmButton } from "~/components/confirm-button";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { ProblemList } from "~/components/storms/problem-list";
import { SeriesFigure } from "~/components/storms/series-figure";
import { UnderstoodLines } from "~/components/understood-lines";
import { CastColumnFields } from "~/components/water/cast-column-fields";
import { CastQuestions } from "~/components/water/cast-questions";
import { CastChannels, CastRows } from "~/components/water/cast-tables";
import { LayerSketch } from "~/components/water/layer-sketch";
import { canonicalJson } from "~/ocean/canonical-json";
import { currentProject } from "~/projects/current-project.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { receiveForm } from "~/storms/receive-original.server";
import type { FormErrorsByField } from "~/storms/refusal";
import { toDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import { readCastAnswers } from "~/water/cast-answers";
import { castColumnSchema } from "~/water/cast-column-schema";
import { castQuestions, castSheet, changeCastAnswers } from "~/water/cast-sheet.server";
import { confirmCast } from "~/water/confirm-cast.server";
import { whatGetsOld, whatGoes } from "~/water/estimates-on";
import { removeCast, removeColumn } from "~/water/remove-column.server";
import { castOf, originalFactsOf } from "~/water/stored-cast.server";
import { estimatesOn } from "~/water/stored-column.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const cast = await castOf(tenant, project.id, params.cast);
  const column = cast.waterColumnId === null ? null : await tenant.waterColumns.find(cast.waterColumnId);
  const { units } = organisation;
  const sheet = await castSheet(tenant, cast, { zone: project.timeZone, units });
  const chosen = cast.provenance?.layerDepth ?? null;
  return {
    ...sheet,
    name: cast.name,
    answers: cast.answers,
    column: column && { name: column.name, estimates: await estimatesOn(tenant, project.jobNumber, column.id) },
    values: {
      name: column?.name ?? "",
      source: column?.source ?? sheet.proposedSource,
      layerDepth: chosen === null ? "" : String(Number(toDisplay(chosen, "layerDepth", units).toPrecision(10))),
    },
    original: await originalFactsOf(tenant, cast),
    home: `/o/${organisation.slug}/projects/${project.id}`,
    lengthUnit: displayUnit("layerDepth", units).unit,
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const cast = await castOf(tenant, project.id, params.cast);
  const water = `/o/${organisation.slug}/projects/${project.id}/water`;
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    if (form.get("intent") === "remove") {
      await (cast.waterColumnId === null ? removeCast(tenant, cast) : removeColumn(tenant, cast.waterColumnId));
      return redirect(water);
    }
    const read = readCastAnswers(form, await castQuestions(tenant, cast));
    if ("errors" in read) return data({ errors: read.errors }, { status: 400 });
    if (canonicalJson(read.answers) !== canonicalJson(cast.answers)) {
      await changeCastAnswers(tenant, cast, read.answers);
      return { readAgain: true };
    }
    if (form.get("intent") !== "confirm") return { readAgain: true };
    const submission = parseWithZod(form, { schema: castColumnSchema(organisation.units) });
    if (submission.status !== "success") {
      const wrong = Object.entries(submission.error ?? {}).flatMap(([field, messages]) =>
        messages ? [[field, messages]] : [],
      );
      return data({ errors: Object.fromEntries(wrong) }, { status: 400 });
    }
    const { name, source, layerDepth } = submission.value;
    await confirmCast(tenant, project.id, cast, {
      name,
      source,
      layerDepth: layerDepth ?? null,
      confirmedBy: actor.id,
      confirmedAt: new Date().toISOString(),
    });
    return redirect(water);
  });
}

export default function CastSheet({ loaderData, actionData }: Route.ComponentProps) {
  const { cast, figures, ready, name, column, original, home, answers } = loaderData;
  const busy = useNavigation().state !== "idle";
  const open = cast.questions.filter(({ needed }) => needed);
  const settled = cast.questions.filter(({ needed }) => !needed);
  const errors: FormErrorsByField = actionData && "errors" in actionData ? actionData.errors : {};
  return (
    <>
      <PageTitle actions={<RemoveButton name={column?.name ?? name} estimates={column?.estimates ?? null} />}>
        Cast: {name}
      </PageTitle>
      <p className="max-w-prose text-slate">
        Read as {cast.formatLabel}.{" "}
        {column
          ? `It stands behind the water column ${column.name}; a change here counts once it is confirmed again.`
          : "Nothing of it counts before it is confirmed."}
      </p>
      {column && column.estimates.length > 0 && (
        <p className="mt-1 text-small text-quiet">{whatGetsOld(column.estimates)}</p>
      )}
      {original && (
        <p className="mt-1 break-all text-small text-quiet">
          <a href={`${home}/files/${original.id}`} download className="text-slate underline">
            Original
          </a>{" "}
          · {original.size} bytes · SHA-256 {original.sha256}
        </p>
      )}
      {actionData && "readAgain" in actionData && (
        <p role="status" className="mt-4 border-l-4 border-ink py-1 pl-3">
          Read again with these answers.
        </p>
      )}
      <Form method="post" className="mt-4">
        <FormErrors errors={Object.values(errors).flatMap((messages) => messages ?? [])} />
        {open.length > 0 && (
          <section aria-label="Open questions" className="border-2 border-ink p-4">
            <h3 className="font-bold">
              {open.length === 1 ? "One question is open" : `${open.length} questions are open`}
            </h3>
            <CastQuestions questions={open} answers={answers} errors={errors} />
          </section>
        )}
        <ProblemList problems={cast.problems} dropped={[]} />
        <div className="grid items-start gap-x-10 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
          <div className="min-w-0">
            <SectionHeading>The profile</SectionHeading>
            {figures ? (
              <SeriesFigure figure={figures.wide} narrow={figures.narrow} />
            ) : (
              <p>Fewer than two levels can be used, so there is nothing to draw.</p>
            )}
          </div>
          <div className="min-w-0">
            <SectionHeading>The layer</SectionHeading>
            {cast.layers.map((sentence) => (
              <p key={sentence}>{sentence}</p>
            ))}
            {cast.inversion && <p className="mt-2 border-l-4 border-ink py-1 pl-3">{cast.inversion}</p>}
            <div className="mt-3">
              <LayerSketch column={cast.column} />
            </div>
          </div>
        </div>
        <SectionHeading>What was understood</SectionHeading>
        <UnderstoodLines lines={cast.facts} />
        {settled.length > 0 && <CastQuestions questions={settled} answers={answers} errors={errors} />}
        <SectionHeading>Channels</SectionHeading>
        <CastChannels cast={cast} />
        <SectionHeading>First and last levels, as they are taken over</SectionHeading>
        <CastRows cast={cast} />
        <SectionHeading id="confirm">Confirm</SectionHeading>
        <CastColumnFields values={loaderData.values} lengthUnit={loaderData.lengthUnit} errors={errors} />
        <div className="mt-5 flex flex-wrap gap-2">
          <button
            type="submit"
            name="intent"
            value="confirm"
            disabled={busy || !ready}
            className="button button-primary"
          >
            {column ? "Confirm again" : "Confirm and save the column"}
          </button>
          <Link to="../.." relative="path" className="button">
            Back to the water columns
          </Link>
        </div>
        {!ready && <p className="mt-1 text-small text-quiet">Settle the problems and questions above first.</p>}
      </Form>
    </>
  );
}

interface RemoveButtonProps {
  name: string;
  /** Those on the column; null where the cast was not confirmed. */
  estimates: string[] | null;
}

function RemoveButton({ name, estimates }: RemoveButtonProps) {
  return (
    <ConfirmButton
      label={estimates ? "Delete the column" : "Remove the cast"}
      title={`${estimates ? "Delete" : "Remove"} ${name}?`}
      fields={{ intent: "remove" }}
    >
      {estimates
        ? `The cast goes with it. ${whatGoes(estimates)}`
        : "No water column stands on it. Its original goes where nothing else uses it."}
    </ConfirmButton>
  );
}
