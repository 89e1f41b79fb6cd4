import { Link, redirect, useLocation } from "react-router";
import type { Route } from "./+types/quality";
import { FormErrors } from "~/components/field";
import { EmptyState, PageTitle } from "~/components/page-title";
import { ChannelPart } from "~/components/quality/channel-part";
import { FlagFilterForm } from "~/components/quality/flag-filter-form";
import { FlagsTable, Pages } from "~/components/quality/flags-table";
import { MissingPart } from "~/components/quality/missing-part";
import { OverrideList } from "~/components/quality/override-list";
import { SetFlagsForm } from "~/components/quality/set-flags-form";
import { SummaryTable } from "~/components/quality/summary-table";
import { SuspectPart } from "~/components/quality/suspect-part";
import { SectionHeading } from "~/components/section-heading";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { changeQuality } from "~/quality/change-quality.server";
import { readFilter } from "~/quality/flag-filter";
import { loadQuality } from "~/quality/load-quality.server";
import {
  presentActs,
  presentChannels,
  presentMissing,
  presentRules,
  presentTable,
} from "~/quality/present-quality.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { receiveForm } from "~/storms/receive-original.server";
import { WHOLE_FORM } from "~/storms/refusal";
import { stormOf } from "~/storms/stored-record.server";
import { formatPeriod } from "~/units/format-time";

export async function loader({ request, context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const storm = await stormOf(tenant, project.id, params.storm);
  const search = new URL(request.url).searchParams;
  const { timeZone: zone } = project;
  const { units } = organisation;
  const quality = await loadQuality(tenant, storm);
  const { window } = quality;
  const figureContext = { document: serverPlotDocument(), zone, units };
  return {
    home: `/o/${organisation.slug}/projects/${project.id}`,
    storm: { id: storm.id, name: storm.name, leaveOutSuspect: storm.leaveOutSuspect },
    zone,
    mayEdit: may(organisation, "project.edit"),
    written: { from: search.get("from") ?? "", to: search.get("to") ?? "" },
    shown: window && {
      period: formatPeriod(window.startsAt, window.endsAt, zone),
      channels: presentChannels(quality, window, storm.leaveOutSuspect, figureContext),
      table: await presentTable(quality, window, readFilter(search, zone), { units, zone }),
      acts: await presentActs(quality, zone),
      missing: presentMissing(quality, window, storm, zone),
      rules: presentRules(quality),
    },
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, tenant, project } = await currentProject(context, params, "project.edit");
  const storm = await stormOf(tenant, project.id, params.storm);
  const { pathname, searchParams: search, search: query } = new URL(request.url);
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    await changeQuality(tenant, storm, { form, search, actor, zone: project.timeZone });
    return redirect(`${pathname.replace(/\.data$/, "")}${query}`);
  });
}

const FORM = "set-flags";

export default function StormQuality({ loaderData, actionData }: Route.ComponentProps) {
  const { home, storm, shown, zone, mayEdit, written } = loaderData;
  const errors = actionData?.errors ?? {};
  const { search } = useLocation();
  const csv = `${home}/storms/${storm.id}/quality/flags.csv`;
  if (!shown) {
    return (
      <>
        <title>{`Quality of ${storm.name} · Galeprint`}</title>
        <PageTitle>Quality of {storm.name}</PageTitle>
        <EmptyState title="Nothing to test yet">
          Confirm a record of the <Link to={`${home}/storms/${storm.id}`}>storm</Link> first.
        </EmptyState>
      </>
    );
  }
  const { channels, table, acts, missing, rules, period } = shown;
  const suspect = channels.reduce((sum, { counts }) => sum + (counts.find(({ flag }) => flag === 3)?.count ?? 0), 0);
  const pageAddress = (page: number) => {
    const query = new URLSearchParams(search);
    query.set("page", String(page));
    return `?${query.toString()}`;
  };
  return (
    <>
      <title>{`Quality of ${storm.name} · Galeprint`}</title>
      <PageTitle
        actions={
          <a href={`${csv}?flag=all`} className="button" download>
            All values with flags as CSV
          </a>
        }
      >
        Quality of {storm.name}
      </PageTitle>
      <p className="max-w-prose text-slate">
        The open tests of QARTOD, on the storm’s window: {period}. A flag neither deletes nor changes a value: estimates
        leave out what is bad or missing and use the rest. Thresholds:{" "}
        <Link to={`${home}/thresholds`} className="underline">
          {rules.thresholdsVersion === 0 ? "the defaults" : `version ${rules.thresholdsVersion} of this project`}
        </Link>
        .
      </p>
      <FormErrors errors={errors[WHOLE_FORM]} />
      <div className="mt-5">
        <SummaryTable channels={channels} />
      </div>
      <div className="grid gap-x-10 lg:grid-cols-2">
        <div className="min-w-0">
          <MissingPart missing={missing} errors={errors} mayEdit={mayEdit} />
        </div>
        <div className="min-w-0">
          <SuspectPart leaveOutSuspect={storm.leaveOutSuspect} suspect={suspect} mayEdit={mayEdit} />
        </div>
      </div>
      <SectionHeading id="flags">Flags</SectionHeading>
      <FlagFilterForm
        key={search}
        filter={table.filter}
        channels={table.channels}
        written={written}
        problems={table.problems}
        zone={zone}
      />
      <p className="mb-2 mt-4 text-slate">
        {table.found === 0 ? "No sample is found." : `${table.found} ${table.found === 1 ? "sample" : "samples"}.`}{" "}
        {table.found > 0 && (
          <a href={`${csv}${search}`} className="underline" download>
            These as CSV
          </a>
        )}
      </p>
      {table.found > 0 && <FlagsTable rows={table.rows} zone={zone} formId={mayEdit ? FORM : null} />}
      <Pages page={table.page} pages={table.pages} to={pageAddress} />
      {mayEdit && table.found > 0 && <SetFlagsForm key={acts.length} id={FORM} found={table.found} errors={errors} />}
      <OverrideList acts={acts} mayEdit={mayEdit} />
      {channels.map(({ figure, narrowFigure, ...quality }) => (
        <ChannelPart key={quality.channel} quality={quality} figure={figure} narrow={narrowFigure} />
      ))}
      <SectionHeading id="undone">Tests that were not made</SectionHeading>
      <dl>
        {rules.undone.map(({ test, reason }) => (
          <div key={test} className="grid gap-x-4 border-b border-hairline py-1.5 sm:grid-cols-[18rem_minmax(0,1fr)]">
            <dt>{test}</dt>
            <dd className="text-slate">{reason}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 max-w-prose text-small text-slate">
        Timing, gaps and syntax are tested of every record: gaps stand with their channel, lines that could not be read
        on the record’s reading sheet.
      </p>
      <p className="mt-8">
        <Link to={`${home}/storms/${storm.id}`} className="underline">
          Back to the storm
        </Link>
      </p>
    </>
  );
}
