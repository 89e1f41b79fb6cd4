import { data, Link, redirect } from "react-router";
import type { Route } from "./+types/edit";
import { ConfirmButton } from "~/components/confirm-button";
import { PageTitle } from "~/components/page-title";
import { WaterForm } from "~/components/water/water-form";
import type { WaterColumn } from "~/db/models/water-column.server";
import { currentProject } from "~/projects/current-project.server";
import { readForm } from "~/services/read-form.server";
import { toDisplay } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";
import { saveColumn } from "~/water/save-column.server";
import { removeColumn } from "~/water/remove-column.server";
import { castBehind } from "~/water/stored-cast.server";
import { columnOf, estimatesOn } from "~/water/stored-column.server";
import { waterSchema } from "~/water/water-schema";
import { whatGetsOld, whatGoes } from "~/water/estimates-on";

/** As typed: ten digits are all that a conversion there and back leaves sure. */
function formValues(column: WaterColumn, units: UnitChoices) {
  const { name, source, temperature, salinity, salinityScale, layerDepth, belowTemperature, belowSalinity } = column;
  return {
    name,
    source,
    temperature,
    salinity,
    salinityScale,
    layerDepth: Number(toDisplay(layerDepth, "layerDepth", units).toPrecision(10)),
    belowTemperature: belowTemperature ?? undefined,
    belowSalinity: belowSalinity ?? undefined,
  };
}

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const column = await columnOf(tenant, project.id, params.column);
  const water = `/o/${organisation.slug}/projects/${project.id}/water`;
  const cast = await castBehind(tenant, column.id);
  if (cast) throw redirect(`${water}/casts/${cast.id}`);
  return {
    name: column.name,
    values: formValues(column, organisation.units),
    units: organisation.units,
    estimates: await estimatesOn(tenant, project.jobNumber, column.id),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.edit");
  const column = await columnOf(tenant, project.id, params.column);
  const water = `/o/${organisation.slug}/projects/${project.id}/water`;
  const form = await request
    .clone()
    .formData()
    .catch(() => null);
  if (form?.get("intent") === "delete") {
    await removeColumn(tenant, column.id);
    return redirect(water);
  }
  const cast = await castBehind(tenant, column.id);
  if (cast) return redirect(`${water}/casts/${cast.id}`);
  const submission = await readForm(request, waterSchema(organisation.units));
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const saved = await saveColumn(tenant, project.id, column.id, submission.value);
  if (saved.fieldErrors) return data(submission.reply({ fieldErrors: saved.fieldErrors }), { status: 400 });
  return redirect(water);
}

export default function EditColumn({ loaderData, actionData }: Route.ComponentProps) {
  const { name, values, units, estimates } = loaderData;
  return (
    <>
      <PageTitle>{name}</PageTitle>
      <WaterForm lastResult={actionData} units={units} values={values}>
        <Link to=".." relative="path" className="button">
          Cancel
        </Link>
      </WaterForm>
      {estimates.length > 0 && <p className="mt-3 text-small text-quiet">{whatGetsOld(estimates)}</p>}
      <div className="mt-10 border-t border-hairline pt-4">
        <ConfirmButton label="Delete the column" title={`Delete ${name}?`} fields={{ intent: "delete" }}>
          {whatGoes(estimates)}
        </ConfirmButton>
      </div>
    </>
  );
}
