import { data, Form, Link, redirect, useNavigation } from "react-router";
import type { Route } from "./+types/reading-sheet";
import { ConfirmButton } from "~/components/confirm-button";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { ChannelsRead } from "~/components/storms/channels-read";
import { ColumnsTable } from "~/components/storms/columns-table";
import { ConflictFields } from "~/components/storms/conflict-fields";
import { DifferenceTable } from "~/components/storms/difference-table";
import { ProblemList } from "~/components/storms/problem-list";
import { QuestionField } from "~/components/storms/question-field";
import { RowsPreview } from "~/components/storms/rows-preview";
import { SeriesFigure } from "~/components/storms/series-figure";
import { UnderstoodTable } from "~/components/storms/understood-table";
import { WindowFields } from "~/components/storms/window-fields";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { currentProject } from "~/projects/current-project.server";
import { TIME_ZONES } from "~/projects/project-schema";
import { notFound } from "~/services/guard.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { readAnswers, sameAnswers } from "~/storms/answers-form";
import { confirmRecord, type Choice } from "~/storms/confirm-record.server";
import { mayConfirm, openMatters } from "~/storms/open-matters";
import { postedWindow } from "~/storms/posted-window";
import { presentReading } from "~/storms/present-reading";
import { readingDifference } from "~/storms/reading-difference";
import { changeAnswers, readingSheet, sampleDirection } from "~/storms/reading-sheet.server";
import { readRecord } from "~/storms/read-record.server";
import { receiveForm } from "~/storms/receive-original.server";
import type { FormErrorsByField } from "~/storms/refusal";
import { removeRecord } from "~/storms/remove-record.server";
import { recordOf, stormOf } from "~/storms/stored-record.server";
import { settledQuestions, suggestPlace } from "~/storms/sheet-questions";
import { stormFigure } from "~/storms/storm-figure";
import { wallClock } from "~/storms/storm-window";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const storm = await stormOf(tenant, project.id, params.storm);
  const record = await recordOf(tenant, storm.id, params.record);
  const sheet = (await readingSheet(tenant, storm, record)) ?? notFound();
  const { reading, window } = sheet;
  const open = openMatters(reading);
  const draw = (width: number) =>
    stormFigure(
      sheet.series,
      { id: "record-as-read", title: "As read", windHeight: reading.windHeight, window, mostTableRows: 0 },
      { document: serverPlotDocument(), zone: project.timeZone, units: organisation.units, width },
    );
  return {
    storm: { id: storm.id, name: storm.name },
    record: { name: record.name, origin: record.origin, state: record.state, answers: record.answers },
    reading: presentReading(reading),
    open: { ...open, questions: suggestPlace(open.questions, sheet.boxCentre) },
    settled: suggestPlace(settledQuestions(reading, record.answers), sheet.boxCentre),
    sampleDirection: sampleDirection(reading),
    window: window && {
      startsAt: wallClock(window.startsAt, project.timeZone),
      endsAt: wallClock(window.endsAt, project.timeZone),
      proposed: sheet.proposed,
    },
    conflicts: sheet.conflicts,
    alsoIn: sheet.alsoIn,
    figure: draw(FIGURE_WIDTHS.wide),
    narrowFigure: draw(FIGURE_WIDTHS.narrow),
    zone: project.timeZone,
    zones: TIME_ZONES,
    units: organisation.units,
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, tenant, project } = await currentProject(context, params, "project.edit");
  const storm = await stormOf(tenant, project.id, params.storm);
  const record = await recordOf(tenant, storm.id, params.record);
  const before = (await readRecord(tenant, record)) ?? notFound();
  const form = await receiveForm(request);
  const here = `/o/${params.organisation}/projects/${project.id}/storms`;
  if (form.get("intent") === "remove") {
    await removeRecord(tenant, storm, record);
    return redirect(`${here}/${storm.id}`);
  }
  return answerRefusal(async () => {
    const questions = [...before.questions, ...settledQuestions(before, record.answers)];
    const { answers, errors } = readAnswers(form, { columns: before.columns, questions });
    if (Object.keys(errors).length > 0) {
      return data(
        { errors: Object.fromEntries(Object.entries(errors).map(([field, text]) => [field, [text]])) },
        { status: 400 },
      );
    }
    if (!sameAnswers(answers, record.answers)) {
      const after = await changeAnswers(tenant, record, answers);
      return { differences: after ? readingDifference(before, after) : [] };
    }
    if (form.get("intent") !== "confirm") return { differences: [] };
    await confirmRecord(tenant, storm, record, {
      window: postedWindow(form, project.timeZone),
      choices: postedChoices(form),
      confirmedBy: actor.id,
      confirmedAt: new Date().toISOString(),
      zone: project.timeZone,
    });
    return redirect(`${here}/${storm.id}`);
  });
}

/** Fields `choice-<group>`. */
function postedChoices(form: FormData): Record<string, Choice> {
  const choices: Record<string, Choice> = {};
  for (const [name, value] of form) {
    const group = /^choice-(.+)$/.exec(name)?.[1];
    if (group && (value === "replace" || value === "keep")) choices[group] = value;
  }
  return choices;
}

export default function ReadingSheet({ loaderData, actionData }: Route.ComponentProps) {
  const { storm, record, reading, open, settled, window, conflicts, alsoIn, figure, zone } = loaderData;
  const busy = useNavigation().state !== "idle";
  const errors: FormErrorsByField = actionData && "errors" in actionData ? actionData.errors : {};
  const differences = actionData && "differences" in actionData ? actionData.differences : null;
  const ready = mayConfirm(open);
  return (
    <>
      <PageTitle
        actions={
          <ConfirmButton label="Remove the record" title={`Remove ${record.name}?`} fields={{ intent: "remove" }}>
            What it brought to the storm goes with it, and its original where no other record uses it. Channels that it
            had replaced are used again.
          </ConfirmButton>
        }
      >
        Reading sheet: {record.name}
      </PageTitle>
      <p className="max-w-prose text-slate">
        Read as {reading.formatLabel} for{" "}
        <Link to="../.." relative="path" className="underline">
          {storm.name}
        </Link>
        .{" "}
        {record.state === "confirmed"
          ? "It is confirmed; a change here counts once it is confirmed again."
          : "Nothing of it counts before it is confirmed."}
        {alsoIn.length > 0 && ` The same file is already in use in ${alsoIn.join("; ")}.`}
      </p>
      {differences && <DifferenceTable differences={differences} />}
      <Form
        method="post"
        // Made anew after each reading, so that the fields show what is kept.
        key={JSON.stringify(record.answers)}
        className="mt-4"
      >
        {/* All of them: the field that one belongs to may be far down the sheet. */}
        <FormErrors errors={Object.values(errors).flatMap((messages) => messages ?? [])} />
        <OpenQuestions loaderData={loaderData} errors={errors} />
        <ProblemList problems={reading.problems} dropped={reading.dropped} />
        <SectionHeading>What was understood</SectionHeading>
        <UnderstoodTable reading={reading} />
        {settled.length > 0 && (
          <div className="mt-4 grid items-start gap-x-8 gap-y-5 md:grid-cols-2">
            {settled.map((question) => (
              <QuestionField
                key={`${question.key}-${question.column ?? ""}`}
                question={question}
                sheet={loaderData}
                errors={errors}
              />
            ))}
          </div>
        )}
        <SectionHeading>Columns</SectionHeading>
        <ColumnsTable reading={reading} answers={record.answers} errors={errors} />
        <SectionHeading>First and last rows, as written and as read</SectionHeading>
        <RowsPreview reading={reading} />
        <div className="mt-5">
          <button type="submit" name="intent" value="read" formNoValidate disabled={busy} className="button">
            Read again with these answers
          </button>
        </div>
        <SectionHeading>Channels</SectionHeading>
        <ChannelsRead reading={reading} units={loaderData.units} zone={zone} />
        {figure && (
          <div className="mt-5">
            <SeriesFigure figure={figure} narrow={loaderData.narrowFigure} />
          </div>
        )}
        <SectionHeading id="confirm">Confirm</SectionHeading>
        {window ? (
          <div className="grid max-w-2xl gap-5">
            <WindowFields
              {...window}
              zone={zone}
              errors={errors}
              hint={
                window.proposed
                  ? "Proposed: the whole record up to 15 days, else from 3 days before the strongest wind to 2 days after it."
                  : "The storm's window as it stands."
              }
            />
            <ConflictFields conflicts={conflicts} recordName={record.name} errors={errors} />
            <div>
              <button
                type="submit"
                name="intent"
                value="confirm"
                disabled={busy || !ready}
                className="button button-primary"
              >
                {record.state === "confirmed" ? "Confirm again" : "Confirm and plot"}
              </button>
              {!ready && <p className="mt-1 text-small text-quiet">Settle the open questions at the top first.</p>}
            </div>
          </div>
        ) : (
          <p>There are no values to take over yet: answer the open questions, or say above what each column is.</p>
        )}
      </Form>
    </>
  );
}

function OpenQuestions({
  loaderData,
  errors,
}: Pick<Route.ComponentProps, "loaderData"> & { errors: FormErrorsByField }) {
  const { open } = loaderData;
  if (mayConfirm(open))
    return (
      <p className="border-l-4 border-ink py-1 pl-3">
        Nothing is open: look it through and{" "}
        <a href="#confirm" className="underline">
          confirm it
        </a>
        .
      </p>
    );
  const toMend = open.errors.length;
  return (
    <section aria-label="Open questions" className="border-2 border-ink p-4">
      <h3 className="font-bold">
        {open.questions.length === 0
          ? "Not ready to confirm"
          : open.questions.length === 1
            ? "One question is open"
            : `${open.questions.length} questions are open`}
      </h3>
      {toMend > 0 && open.questions.every(({ key }) => key !== "leaveOutBadRows") && (
        <p className="mt-1 text-slate">
          {toMend === 1 ? "A problem has" : `${toMend} problems have`} to be mended first; see the list below.
        </p>
      )}
      {open.empty && <p className="mt-1 text-slate">No column was taken for wind, rain, heat or temperature.</p>}
      <div className="mt-3 grid items-start gap-x-8 gap-y-5 md:grid-cols-2">
        {open.questions.map((question) => (
          <QuestionField
            key={`${question.key}-${question.column ?? ""}`}
            question={question}
            sheet={loaderData}
            errors={errors}
          />
        ))}
      </div>
      {open.questions.length > 0 && (
        <button type="submit" name="intent" value="read" formNoValidate className="button button-primary mt-4">
          Answer and read again
        </button>
      )}
    </section>
  );
}
