import { data, Link, redirect } from "react-router";
import type { Route } from "./+types/new";
import { PageTitle } from "~/components/page-title";
import { WaterForm } from "~/components/water/water-form";
import { currentProject } from "~/projects/current-project.server";
import { readForm } from "~/services/read-form.server";
import { saveColumn } from "~/water/save-column.server";
import { waterSchema } from "~/water/water-schema";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation } = await currentProject(context, params, "project.edit");
  return { units: organisation.units };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const submission = await readForm(request, waterSchema(organisation.units));
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await saveColumn(tenant, project.id, null, submission.value);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(`/o/${organisation.slug}/projects/${project.id}/water`);
}

export default function NewColumn({ loaderData, actionData }: Route.ComponentProps) {
  const { units } = loaderData;
  const salinityScale = units.salinity === "PSS-78" ? "practical" : "absolute";
  return (
    <>
      <PageTitle>New water column</PageTitle>
      <WaterForm lastResult={actionData} units={units} values={{ salinityScale }}>
        <Link to=".." relative="path" className="button">
          Cancel
        </Link>
      </WaterForm>
    </>
  );
}
