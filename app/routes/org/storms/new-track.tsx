import { useId } from "react";
import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/new-track";
import { Field, FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { FixTable } from "~/components/storms/fix-table";
import { SubmitButton } from "~/components/submit-button";
import { currentProject } from "~/projects/current-project.server";
import { config } from "~/services/config.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { postedRows, readFixes, type FixRow } from "~/storms/posted-track";
import { originalFrom, receiveForm } from "~/storms/receive-original.server";
import { WHOLE_FORM, type FormErrorsByField } from "~/storms/refusal";
import { postedName, STORM_NAME_LENGTH } from "~/storms/storm-name";
import { startTrackStorm, typeTrackStorm } from "~/storms/track-storm.server";

const BLANK_ROWS: FixRow[] = Array.from({ length: 3 }, () => ({
  time: "",
  latitude: "",
  longitude: "",
  centralPressure: "",
  maxWind: "",
  radiusOfMaximumWind: "",
}));

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation } = await currentProject(context, params, "project.edit");
  return { uploadLimitMb: config().uploadLimitBytes / (1024 * 1024), units: organisation.units };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { actor, organisation, tenant, project } = await currentProject(context, params, "project.edit");
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    const name = postedName(form);
    const saved = { by: actor.id, at: new Date().toISOString() };
    const track = (storm: { id: string }) =>
      redirect(`/o/${params.organisation}/projects/${project.id}/storms/${storm.id}/track`);
    if (form.get("intent") !== "typed") {
      return track(await startTrackStorm(tenant, project.id, { name, original: await originalFrom(form), saved }));
    }
    const read = readFixes(postedRows(form), organisation.units, []);
    if ("errors" in read) return data(read, { status: 400 });
    return track(await typeTrackStorm(tenant, project.id, { name, fixes: read.fixes, saved }));
  });
}

export default function NewTrack({ loaderData, actionData }: Route.ComponentProps) {
  const errors: FormErrorsByField = actionData?.errors ?? {};
  const id = useId();
  return (
    <>
      <PageTitle>New storm from a track</PageTitle>
      <p className="mb-5 max-w-prose text-slate">
        A tropical cyclone&rsquo;s best track gives wind, air pressure and rain at each study box by published formulas.
        Such wind is parametric: good for screening, no replacement for a record at the site.
      </p>
      <FormErrors errors={errors[WHOLE_FORM]} />
      <SectionHeading>From a file</SectionHeading>
      <Form method="post" encType="multipart/form-data" className="grid max-w-2xl gap-4">
        <Field
          id={`${id}-file`}
          label="Best track"
          errors={errors.file}
          hint={`Deck text, the hurricane database's text, or the archive's CSV, up to ${loaderData.uploadLimitMb} MB. It is kept as it is, byte for byte.`}
        >
          {(described) => (
            <input
              {...described}
              type="file"
              name="file"
              className="block w-full min-w-0 file:mr-3 file:border file:border-ink file:bg-transparent file:px-3 file:py-1.5 file:text-ink"
            />
          )}
        </Field>
        <NameField id={`${id}-file-name`} errors={errors.name} />
        <div>
          <SubmitButton busy="Reading…" name="intent" value="file">
            Read the track
          </SubmitButton>
        </div>
      </Form>
      <SectionHeading>Or typed</SectionHeading>
      <p className="mb-3 max-w-prose text-slate">
        South and west are negative. Leave a cell empty where nothing is known; at least one fix needs a central
        pressure. The maximum wind is taken as a 1-minute mean, which can be changed on the next page.
      </p>
      <Form method="post" className="grid gap-4">
        <FixTable rows={BLANK_ROWS} units={loaderData.units} errors={errors} />
        <div className="max-w-2xl">
          <NameField id={`${id}-typed-name`} errors={errors.name} />
        </div>
        <div>
          <SubmitButton busy="Saving…" name="intent" value="typed" primary={false}>
            Use these fixes
          </SubmitButton>
        </div>
      </Form>
      <p className="mt-8">
        <Link to="../../new" relative="path" className="underline">
          A storm from records instead
        </Link>
      </p>
    </>
  );
}

function NameField({ id, errors }: { id: string; errors?: string[] }) {
  return (
    <Field id={id} label="Name of the storm" optional hint="Without one: the cyclone's." errors={errors}>
      {(described) => (
        <input {...described} name="name" maxLength={STORM_NAME_LENGTH} autoComplete="off" className="input" />
      )}
    </Field>
  );
}
