import { getFormProps, useForm } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/new";
import { FormErrors } from "~/components/field";
import { NumberField, SelectField, TextField } from "~/components/form-fields";
import { PageTitle } from "~/components/page-title";
import { SubmitButton } from "~/components/submit-button";
import { METHOD_KEYS, PARAMETERS, type MethodKey } from "~/estimates/method-parameters";
import { formValues, methodSheetSchema } from "~/estimates/method-sheet-schema";
import { saveMethodSheet } from "~/estimates/save-method-sheet.server";
import { currentTenant } from "~/organisations/current-tenant.server";
import { readForm } from "~/services/read-form.server";

/** What most sheets settle; everything else stands below, folded. */
const FIRST: MethodKey[] = ["model", "dragLaw", "highWindCap", "dampingRate"];
const REST = METHOD_KEYS.filter((key) => !FIRST.includes(key));

export async function loader({ request, context }: Route.LoaderArgs) {
  const { tenant } = currentTenant(context, "project.edit");
  const from = new URL(request.url).searchParams.get("from");
  const sheet = from ? await tenant.methodSheets.find(from) : null;
  return {
    values: sheet && formValues(sheet.name, sheet.choices, sheet.ensemble),
    next: sheet ? sheet.version + 1 : null,
  };
}

export async function action({ request, context }: Route.ActionArgs) {
  const { organisation, tenant } = currentTenant(context, "project.edit");
  const submission = await readForm(request, methodSheetSchema);
  if (submission.status !== "success") return data(submission.reply(), { status: 400 });
  const { name, choices, ensemble } = submission.value;
  const saved = await saveMethodSheet(tenant, name, choices, ensemble);
  if (!saved.changed) {
    const message = `Version ${saved.version} of this sheet says the same already: change something, or give another name.`;
    return data(submission.reply({ fieldErrors: { name: [message] } }), { status: 400 });
  }
  return redirect(`/o/${organisation.slug}/method-sheets`);
}

export default function NewMethodSheet({ actionData, loaderData }: Route.ComponentProps) {
  const [form, fields] = useForm<Record<"name" | "members" | "seed" | MethodKey, string>>({
    lastResult: actionData,
    defaultValue: loaderData.values ?? undefined,
    onValidate: ({ formData }) => parseWithZod(formData, { schema: methodSheetSchema }) as never,
    shouldRevalidate: "onInput",
  });
  const field = (key: MethodKey) => {
    const parameter = PARAMETERS[key];
    const texts = { field: fields[key], label: parameter.label, hint: parameter.hint, optional: true };
    if (parameter.kind === "number") return <NumberField key={key} {...texts} unit={parameter.unit} />;
    const options = Object.entries(parameter.options).map(([value, label]) => ({ value, label }));
    return <SelectField key={key} {...texts} options={[{ value: "", label: "default" }, ...options]} />;
  };
  const wrongBelow = REST.some((key) => fields[key].errors?.length);
  return (
    <>
      <title>New method sheet · Galeprint</title>
      <PageTitle first>{loaderData.next ? `Method sheet, version ${loaderData.next}` : "New method sheet"}</PageTitle>
      <Form method="post" {...getFormProps(form)} className="grid max-w-4xl gap-5">
        <FormErrors errors={form.errors} id={form.errorId} />
        <TextField
          field={fields.name}
          label="Name"
          hint="The same name as an existing sheet makes its next version."
          className="max-w-md"
        />
        <div className="grid items-start gap-5 sm:grid-cols-2">{FIRST.map(field)}</div>
        <fieldset className="border-t border-hairline py-3">
          <legend className="float-left w-full font-bold">Range of the answer</legend>
          <p className="clear-left max-w-prose text-small text-slate">
            Each estimate is run again for every member of an ensemble, with wind speed and direction, drag law, layer
            depth, the step below, the start, rain, heat and what else is uncertain drawn from{" "}
            <Link to="/methods#ensemble">stated ranges</Link>. A law or parameter that is chosen above is not drawn.
          </p>
          <div className="mt-4 grid items-start gap-5 sm:grid-cols-2">
            <TextField
              field={fields.members}
              label="Members"
              hint="At least 200 for layer models, 64 for the column; up to 5000. Leave it open for no range."
              inputMode="numeric"
              list="usual-members"
              optional
            />
            <datalist id="usual-members">
              {[64, 200, 500, 1000].map((count) => (
                <option key={count} value={count} />
              ))}
            </datalist>
            <TextField
              field={fields.seed}
              label="Seed"
              hint="The same seed draws the same members, so that a number can be computed again. 1 if left open."
              inputMode="numeric"
              optional
            />
          </div>
        </fieldset>
        <details open={wrongBelow || undefined} className="border-y border-hairline py-3">
          <summary className="font-bold">All other parameters</summary>
          <div className="mt-4 grid items-start gap-5 sm:grid-cols-2">{REST.map(field)}</div>
        </details>
        <div className="flex gap-2">
          <SubmitButton busy="Saving…">Save</SubmitButton>
          <Link to=".." relative="path" className="button">
            Cancel
          </Link>
        </div>
      </Form>
    </>
  );
}
