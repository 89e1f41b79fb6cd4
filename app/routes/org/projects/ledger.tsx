import { data, Form, Link, redirect, useSubmit } from "react-router";
import type { Route } from "./+types/ledger";
import { FormErrors } from "~/components/field";
import { LedgerTable } from "~/components/ledger/ledger-table";
import { NextSteps } from "~/components/ledger/next-steps";
import { RunChoices } from "~/components/ledger/run-choices";
import { SubmitButton } from "~/components/submit-button";
import { TitleBlock } from "~/components/title-block";
import { usePoll } from "~/components/use-poll";
import { sheetLabel } from "~/estimates/estimate-code";
import { FIGURE_IDS, FIGURE_LABELS, type FigureId } from "~/estimates/headline-figures";
import { loadLedger } from "~/estimates/load-ledger.server";
import { presentLedger } from "~/estimates/present-ledger";
import { choiceOf, requestedCells, runSchema } from "~/estimates/run-request";
import { CannotStart, defaultMethodSheet, startEstimates } from "~/estimates/start-estimates.server";
import { ENGINE_VERSION } from "~/ocean/version";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { readForm } from "~/services/read-form.server";

function figureShown(url: URL): FigureId {
  return FIGURE_IDS.find((id) => id === url.searchParams.get("show")) ?? "surfaceSalinity";
}

export async function loader({ request, context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const figure = figureShown(new URL(request.url));
  const [ledger, sheet] = await Promise.all([loadLedger(tenant, project), defaultMethodSheet(tenant)]);
  const { timeZone: zone, jobNumber } = project;
  return {
    home: `/o/${organisation.slug}/projects/${project.id}`,
    project: { name: project.name, jobNumber, client: project.client, zone },
    figure,
    ledger: presentLedger(ledger, { figure, units: organisation.units, zone, jobNumber }),
    columns: ledger.columns.map(({ id, name }) => ({ id, name })),
    sheets: ledger.sheets.map((entry) => ({ id: entry.id, label: sheetLabel(entry) })),
    defaultSheet: sheet ? sheetLabel(sheet) : "",
    mayRun: may(organisation, "estimate.run"),
    mayEdit: may(organisation, "project.edit"),
    engine: ENGINE_VERSION,
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, organisation, tenant, project } = await currentProject(context, params, "estimate.run");
  const submission = await readForm(request, runSchema);
  if (submission.status !== "success") return data({ error: "Choose what to run." }, { status: 400 });
  const { units } = organisation;
  const { timeZone: zone, jobNumber } = project;
  const figure = figureShown(new URL(request.url));
  const ledger = presentLedger(await loadLedger(tenant, project), { figure, units, zone, jobNumber });
  const cells = requestedCells(submission.value.run, ledger);
  try {
    await startEstimates(tenant, project.id, actor.id, cells, choiceOf(submission.value));
  } catch (error) {
    if (!(error instanceof CannotStart)) throw error;
    return data({ error: error.message }, { status: 400 });
  }
  return redirect(`/o/${organisation.slug}/projects/${project.id}?show=${figure}`);
}

export default function LedgerPage({ loaderData, actionData }: Route.ComponentProps) {
  const { home, project, figure, ledger, columns, sheets, defaultSheet, mayRun, mayEdit, engine } = loaderData;
  usePoll(ledger.underWay);
  const submit = useSubmit();
  const hasTable = ledger.boxes.length > 0 && ledger.storms.length > 0;
  const ready = hasTable && columns.length > 0;
  const canRun = mayRun && ready;
  return (
    <>
      <title>{`Ledger · ${project.name} · Galeprint`}</title>
      <h2 className="sr-only">Ledger</h2>
      {!ready && (
        <NextSteps
          home={home}
          boxes={ledger.boxes.length}
          storms={ledger.storms.length}
          columns={columns.length}
          mayEdit={mayEdit}
        />
      )}
      {hasTable && (
        <>
          <div className="mt-6 flex flex-wrap items-end gap-x-4 gap-y-3">
            <Form method="get" onChange={(event) => void submit(event.currentTarget, { replace: true })}>
              <label htmlFor="show" className="mb-1 block text-small font-bold text-slate">
                Show
              </label>
              <select key={figure} id="show" name="show" defaultValue={figure} className="input w-auto">
                {FIGURE_IDS.map((id) => (
                  <option key={id} value={id}>
                    {FIGURE_LABELS[id]}
                  </option>
                ))}
              </select>
              <noscript>
                <button type="submit" className="button">
                  Show
                </button>
              </noscript>
            </Form>
            <p className="grow self-end pb-2 text-small text-slate">
              {ledger.fullCircle && `arrow: net displacement of the layer, north up, full circle ${ledger.fullCircle}`}
            </p>
            <Link to={`${home}/ledger.csv`} reloadDocument className="button">
              CSV
            </Link>
          </div>
          <Form method="post" className="mt-4" aria-label="Run estimates">
            <FormErrors errors={actionData ? [actionData.error] : null} />
            {canRun && (
              <div className="mb-4 flex flex-wrap items-end gap-x-4 gap-y-3 border-t border-hairline pt-3">
                <RunChoices columns={columns} sheets={sheets} defaultSheet={defaultSheet} />
                <span className="grow" />
                <SubmitButton busy="Starting…" primary={ledger.toRun === 0} name="run" value="all">
                  Run all
                </SubmitButton>
                <SubmitButton busy="Starting…" name="run" value="outOfDate" disabled={ledger.toRun === 0}>
                  Run what is out of date ({ledger.toRun})
                </SubmitButton>
              </div>
            )}
            <LedgerTable ledger={ledger} home={home} mayRun={canRun} />
          </Form>
          <p role="status" className="sr-only">
            {ledger.underWay ? "Estimates are running." : "No estimate is running."}
          </p>
        </>
      )}
      <TitleBlock
        entries={[
          { label: "Project", value: `${project.name} · job ${project.jobNumber}` },
          { label: "Sheet", value: "Ledger" },
          { label: "Client", value: project.client },
          { label: "Times", value: project.zone },
          { label: "Engine", value: engine },
        ]}
      />
    </>
  );
}
