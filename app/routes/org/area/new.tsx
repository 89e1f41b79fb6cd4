import { data, Link, redirect } from "react-router";
import type { Route } from "./+types/new";
import { boxSchema } from "~/area/box-schema";
import { saveBox } from "~/area/save-box.server";
import { PageTitle } from "~/components/page-title";
import { StudyBoxForm } from "~/components/study-box-form";
import { currentProject } from "~/projects/current-project.server";
import { readForm } from "~/services/read-form.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  const boxes = await tenant.studyBoxes.list({ where: { projectId: project.id } });
  return { units: organisation.units, otherBoxes: boxes.map(({ name, polygon }) => ({ name, polygon })) };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  const submission = await readForm(request, boxSchema(organisation.units));
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await saveBox(tenant, project.id, null, submission.value);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(`/o/${organisation.slug}/projects/${project.id}/area`);
}

export default function NewBox({ actionData, loaderData }: Route.ComponentProps) {
  return (
    <>
      <PageTitle>New study box</PageTitle>
      <StudyBoxForm lastResult={actionData} units={loaderData.units} otherBoxes={loaderData.otherBoxes} ring={null}>
        <Link to=".." relative="path" className="button">
          Cancel
        </Link>
      </StudyBoxForm>
    </>
  );
}
