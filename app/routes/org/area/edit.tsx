import { data, Link, redirect } from "react-router";
import type { Route } from "./+types/edit";
import { boxFormValues } from "~/area/box-form-values";
import { boxSchema } from "~/area/box-schema";
import { saveBox } from "~/area/save-box.server";
import { ConfirmButton } from "~/components/confirm-button";
import { PageTitle } from "~/components/page-title";
import { StudyBoxForm } from "~/components/study-box-form";
import { currentProject } from "~/projects/current-project.server";
import { notFound } from "~/services/guard.server";
import { readForm } from "~/services/read-form.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  const boxes = await tenant.studyBoxes.list({ where: { projectId: project.id } });
  const box = boxes.find(({ id }) => id === params.box);
  if (!box) notFound();
  return {
    units: organisation.units,
    name: box.name,
    ring: box.polygon,
    values: boxFormValues(box, organisation.units),
    otherBoxes: boxes.filter(({ id }) => id !== box.id).map(({ name, polygon }) => ({ name, polygon })),
    estimates: await tenant.estimates.count({ studyBoxId: box.id }),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  const box = await tenant.studyBoxes.find(params.box, { where: { projectId: project.id } });
  if (!box) notFound();
  const area = `/o/${organisation.slug}/projects/${project.id}/area`;
  const intent = (await request.clone().formData()).get("intent");
  if (intent === "delete") {
    await tenant.studyBoxes.remove({ id: box.id });
    return redirect(area);
  }
  const submission = await readForm(request, boxSchema(organisation.units));
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await saveBox(tenant, project.id, box.id, submission.value);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(area);
}

export default function EditBox({ actionData, loaderData }: Route.ComponentProps) {
  const { estimates, name, units, otherBoxes, ring, values } = loaderData;
  return (
    <>
      <PageTitle
        actions={
          <ConfirmButton label="Delete the box" title={`Delete ${name}?`} fields={{ intent: "delete" }}>
            {estimates === 0
              ? "Nothing was estimated for it yet."
              : `Its ${estimates} ${estimates === 1 ? "estimate goes" : "estimates go"} with it. Issued memos keep their numbers.`}
          </ConfirmButton>
        }
      >
        {name}
      </PageTitle>
      <StudyBoxForm lastResult={actionData} units={units} otherBoxes={otherBoxes} ring={ring} values={values}>
        <Link to=".." relative="path" className="button">
          Cancel
        </Link>
      </StudyBoxForm>
    </>
  );
}
