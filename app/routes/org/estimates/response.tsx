import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/response";
import { FormErrors } from "~/components/field";
import { FigureView } from "~/components/figure-view";
import { RunChoices } from "~/components/ledger/run-choices";
import { StudyAreaMap } from "~/components/map/study-area-map";
import { PageTitle } from "~/components/page-title";
import { FitNoteList } from "~/components/response/fit-note-list";
import { HeadlineTable } from "~/components/response/headline-table";
import { InputsPart } from "~/components/response/inputs-part";
import { BudgetTable, EquationList, MethodTable } from "~/components/response/method-part";
import { StateBanner } from "~/components/response/state-banner";
import { TriggerList } from "~/components/response/trigger-list";
import { UncertaintyPart } from "~/components/response/uncertainty-part";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";
import { TitleBlock } from "~/components/title-block";
import { usePoll } from "~/components/use-poll";
import { estimateCode, sheetLabel } from "~/estimates/estimate-code";
import { isUnderWay, stateSentence } from "~/estimates/estimate-state";
import { layerTrack } from "~/estimates/layer-track";
import { loadResponse } from "~/estimates/load-response.server";
import { presentInputs } from "~/estimates/present-inputs";
import { presentMethod } from "~/estimates/present-methods";
import { presentResponse } from "~/estimates/present-response";
import { presentUncertainty } from "~/estimates/present-uncertainty";
import { responseFigures } from "~/estimates/response-figures.server";
import { choiceOf, KEEP, runSchema } from "~/estimates/run-request";
import { CannotStart, startEstimates } from "~/estimates/start-estimates.server";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { notFound } from "~/services/guard.server";
import { methodSources } from "~/ocean/sources";
import { readForm } from "~/services/read-form.server";
import { mathMarkup } from "~/services/typeset.server";
import { formatTime } from "~/units/format-time";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const loaded = await loadResponse(tenant, project, params.estimate, { profiles: false });
  if (!loaded) notFound();
  const { estimate, state, response, register, assumptions, forcing } = loaded;
  const { units } = organisation;
  const { timeZone: zone, jobNumber } = project;
  const code = estimateCode(jobNumber, estimate.number);
  const [columns, sheets] = await Promise.all([
    tenant.waterColumns.list({ where: { projectId: project.id } }),
    tenant.methodSheets.list(),
  ]);
  const shown = response && {
    view: presentResponse(response, { units, zone, shore: register.box.shoreNormal !== null }),
    uncertainty: response.uncertainty
      ? presentUncertainty(response.uncertainty, register.box.shoreNormal !== null)
      : null,
    figures: responseFigures({ response, register, forcing, zone, units, estimateCode: code }),
    methods: methodSources(response).map((source) => presentMethod(source, mathMarkup)),
    track: layerTrack(register.box, response.series),
    inputs: response.inputs,
    engine: response.engine,
  };
  return {
    home: `/o/${organisation.slug}/projects/${project.id}`,
    id: estimate.id,
    project: { name: project.name, jobNumber },
    title: `${register.box.name} in ${register.storm.name}`,
    code,
    state,
    shown,
    box: { id: estimate.studyBoxId, name: register.box.name, polygon: register.box.polygon },
    inputs: presentInputs(register, zone, units),
    assumptions,
    units,
    run: {
      by: loaded.requestedBy,
      at: formatTime(estimate.finishedAt, zone),
    },
    columns: columns.map(({ id, name }) => ({ id, name })),
    sheets: sheets.map((sheet) => ({ id: sheet.id, label: sheetLabel(sheet) })),
    sheet: sheetLabel(register.method),
    mayRun: may(organisation, "estimate.run"),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, organisation, tenant, project } = await currentProject(context, params, "estimate.run");
  const estimate = await tenant.estimates.find(params.estimate, { where: { projectId: project.id } });
  if (!estimate) notFound();
  const submission = await readForm(request, runSchema.partial({ run: true }));
  const asked = submission.status === "success" ? submission.value : { waterColumnId: KEEP, methodSheetId: KEEP };
  try {
    await startEstimates(tenant, project.id, actor.id, [estimate], choiceOf({ run: "", ...asked }));
  } catch (error) {
    if (!(error instanceof CannotStart)) throw error;
    return data({ error: error.message }, { status: 400 });
  }
  return redirect(`/o/${organisation.slug}/projects/${project.id}/estimates/${estimate.id}`);
}

export default function ResponsePage({ loaderData, actionData }: Route.ComponentProps) {
  const { home, id, project, title, code, state, shown, box, units, mayRun, run } = loaderData;
  const underWay = isUnderWay(state);
  usePoll(underWay);
  const here = `${home}/estimates`;
  const files = shown && (
    <>
      <a href={`${here}/${id}/response.json`} download className="button">
        response.json
      </a>
      <a href={`${here}/${id}/series.csv`} download className="button">
        series.csv
      </a>
    </>
  );
  return (
    <>
      <title>{`${title} · ${code} · Galeprint`}</title>
      <PageTitle actions={files}>{title}</PageTitle>
      <p className="-mt-2 text-small text-slate">
        Estimate {code} · {stateSentence(state)}
        {" · "}
        <Link to={here}>all estimates</Link>
      </p>
      <FormErrors errors={actionData ? [actionData.error] : null} />
      <StateBanner
        state={state}
        sentence={stateSentence(state)}
        hasResponse={shown !== null}
        mayRun={mayRun}
        home={home}
      />
      {shown && (
        <div className="mt-5 grid gap-x-10 lg:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
          <div className="min-w-0">
            <section aria-label="The answer">
              <HeadlineTable rows={shown.view.headline} />
            </section>
            <section aria-labelledby="triggers">
              <SectionHeading id="triggers">Trigger levels</SectionHeading>
              <TriggerList triggers={shown.view.triggers} />
            </section>
            <section aria-labelledby="drove">
              <SectionHeading id="drove">What drove it</SectionHeading>
              {shown.figures.forcing ? (
                <FigureView figure={shown.figures.forcing.wide} narrow={shown.figures.forcing.narrow} />
              ) : (
                <p className="text-slate">
                  The storm’s series changed since this run, so they are not drawn beside its response. Run it again to
                  see them together.
                </p>
              )}
            </section>
            <section aria-labelledby="did">
              <SectionHeading id="did">What the layer did</SectionHeading>
              <div className="grid gap-6">
                <FigureView figure={shown.figures.stressAndDrift.wide} narrow={shown.figures.stressAndDrift.narrow} />
                <FigureView figure={shown.figures.layer.wide} narrow={shown.figures.layer.narrow} />
              </div>
            </section>
          </div>
          <div className="min-w-0">
            <section aria-labelledby="went" className="lg:[&>h3]:mt-0">
              <SectionHeading id="went">Where the layer went</SectionHeading>
              <StudyAreaMap
                boxes={[box]}
                selectedId={box.id}
                tracks={[shown.track]}
                units={units}
                label="Path of the layer on the map"
                className="mb-4 h-72"
              />
              <div className="grid gap-6">
                <FigureView figure={shown.figures.track.wide} narrow={shown.figures.track.narrow} />
                <FigureView figure={shown.figures.hodograph.wide} narrow={shown.figures.hodograph.narrow} />
              </div>
            </section>
            {shown.uncertainty && (
              <section aria-labelledby="spread">
                <SectionHeading id="spread">What the answer depends on</SectionHeading>
                <UncertaintyPart view={shown.uncertainty} tornadoes={shown.figures.tornadoes} />
              </section>
            )}
            <section aria-labelledby="fit">
              <SectionHeading id="fit">Fit notes</SectionHeading>
              <FitNoteList notes={shown.view.fitNotes} recommendation={shown.view.recommendation} />
            </section>
          </div>
        </div>
      )}
      {shown && (
        <section aria-labelledby="method">
          <PageTitle>
            <span id="method">Method</span>
          </PageTitle>
          <div className="grid gap-x-10 lg:grid-cols-2">
            <div className="min-w-0">
              <SectionHeading>Laws and parameters</SectionHeading>
              <MethodTable rows={shown.view.method.filter(({ inUse }) => inUse)} />
              <details className="py-3">
                <summary>Parameters that this model leaves aside</summary>
                <MethodTable rows={shown.view.method.filter(({ inUse }) => !inUse)} />
              </details>
            </div>
            <div className="min-w-0">
              <SectionHeading>Equations and sources</SectionHeading>
              <EquationList methods={shown.methods} />
              <SectionHeading>Budgets</SectionHeading>
              <BudgetTable rows={shown.view.budgets} />
            </div>
          </div>
        </section>
      )}
      <section aria-labelledby="inputs">
        <PageTitle
          actions={
            <Link to="without-suspect" className="button">
              With and without suspect values
            </Link>
          }
        >
          <span id="inputs">Inputs</span>
        </PageTitle>
        <InputsPart inputs={loaderData.inputs} assumptions={loaderData.assumptions} home={home} />
      </section>
      {mayRun && !underWay && loaderData.columns.length > 0 && (
        <section aria-labelledby="with">
          <SectionHeading id="with">Run with another column or sheet</SectionHeading>
          <Form method="post" className="flex flex-wrap items-end gap-x-4 gap-y-3">
            <RunChoices columns={loaderData.columns} sheets={loaderData.sheets} defaultSheet={loaderData.sheet} />
            <SubmitButton busy="Starting…">Run</SubmitButton>
          </Form>
        </section>
      )}
      {shown && <p className="mt-12 max-w-prose text-slate">{shown.view.caution}</p>}
      <TitleBlock
        entries={[
          { label: "Project", value: `${project.name} · job ${project.jobNumber}` },
          { label: "Sheet", value: `Response ${code}` },
          { label: "Run by", value: run.by },
          { label: "Finished", value: run.at },
          { label: "Engine", value: shown?.engine ?? "" },
          { label: "Inputs, SHA-256", value: shown ? `${shown.inputs.slice(0, 12)}…` : "" },
        ]}
      />
    </>
  );
}
