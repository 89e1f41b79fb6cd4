import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/thresholds";
import { ConfirmButton } from "~/components/confirm-button";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { ChannelExtras } from "~/components/quality/channel-extras";
import { ThresholdFields } from "~/components/quality/threshold-fields";
import { SubmitButton } from "~/components/submit-button";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { presentThresholds } from "~/quality/present-thresholds.server";
import { saveThresholds } from "~/quality/save-thresholds.server";
import { THRESHOLD_PARTS, ThresholdsRefused, type ThresholdPart } from "~/quality/thresholds-form";
import { receiveForm } from "~/storms/receive-original.server";
import { StormRefusal, WHOLE_FORM, type FormErrorsByField } from "~/storms/refusal";

/** The part that the address names; the first for what is none. */
function partOf(url: string): ThresholdPart {
  const named = new URL(url).searchParams.get("of");
  return THRESHOLD_PARTS.find((part) => part === named) ?? "windSpeed";
}

export async function loader({ request, context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  return {
    ...(await presentThresholds(tenant, project, partOf(request.url))),
    mayEdit: may(organisation, "project.edit"),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, tenant, project } = await currentProject(context, params, "project.edit");
  const part = partOf(request.url);
  const form = await receiveForm(request);
  const reset = form.get("intent") === "reset";
  try {
    await saveThresholds(tenant, project.id, {
      part,
      form: reset ? null : form,
      seen: Number(form.get("version")),
      by: actor.id,
    });
  } catch (error) {
    if (!(error instanceof StormRefusal)) throw error;
    const errors: FormErrorsByField =
      error instanceof ThresholdsRefused ? error.errors : { [WHOLE_FORM]: error.messages };
    // Whoever saves again after this has been told of the version that came between.
    return data(
      { errors, version: await tenant.thresholdSheets.max("version", { projectId: project.id }) },
      { status: 400 },
    );
  }
  return redirect(`/o/${params.organisation}/projects/${project.id}/thresholds?of=${part}`);
}

export default function Thresholds({ loaderData, actionData }: Route.ComponentProps) {
  const { part, label, parts, groups, extras, version, saved, chosen, mayEdit } = loaderData;
  const errors = actionData?.errors ?? {};
  const seen = actionData?.version ?? version;
  return (
    <>
      <title>{`Thresholds, ${label} · Galeprint`}</title>
      <PageTitle>Thresholds of the quality tests</PageTitle>
      <p className="max-w-prose text-slate">
        They hold for every storm of this project, in the units that channels are kept in. Choose them for the place:
        the defaults are examples. An open field leaves its test out. {saved}
      </p>
      <nav aria-label="Channels" className="mt-4 flex flex-wrap gap-x-4 gap-y-1 border-y border-hairline py-2">
        {parts.map((each) => (
          <Link
            key={each.part}
            to={`?of=${each.part}`}
            aria-current={each.part === part ? "page" : undefined}
            className="underline aria-[current=page]:font-bold aria-[current=page]:no-underline"
          >
            {each.label}
            {each.chosen && " (changed)"}
          </Link>
        ))}
      </nav>
      <Form method="post" key={`${part} ${version}`} className="mt-5 grid gap-5">
        <FormErrors errors={errors[WHOLE_FORM]} />
        <input type="hidden" name="version" value={seen} />
        <ThresholdFields groups={groups} errors={errors} disabled={!mayEdit} />
        {extras && <ChannelExtras {...extras} errors={errors} disabled={!mayEdit} />}
        {mayEdit && (
          <div>
            <SubmitButton busy="Saving…" name="intent" value="save">
              Save the thresholds
            </SubmitButton>
          </div>
        )}
      </Form>
      {mayEdit && chosen && (
        <div className="mt-8 border-t border-hairline pt-4">
          <ConfirmButton
            label="Back to the defaults"
            title={`Back to the defaults of ${label}?`}
            fields={{ intent: "reset", version: String(seen) }}
          >
            Flags of every storm of the project follow, and estimates become out of date where it changes what they use.
            Earlier versions are kept with the runs that were made by them.
          </ConfirmButton>
        </div>
      )}
    </>
  );
}
