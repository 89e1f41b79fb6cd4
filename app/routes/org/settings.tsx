import { getFormProps, useForm } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { data, Form } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/settings";
import { FormErrors } from "~/components/field";
import { SelectField, TextField } from "~/components/form-fields";
import { Notice } from "~/components/notice";
import { PageTitle } from "~/components/page-title";
import { SubmitButton } from "~/components/submit-button";
import { saveSettings } from "~/organisations/save-settings.server";
import { organisationSettingsSchema, PAPER_SIZES, type OrganisationSettings } from "~/organisations/settings-schema";
import { allowed } from "~/services/guard.server";
import { readForm } from "~/services/read-form.server";
import { UNIT_OPTIONS } from "~/units/unit-choices";

export function loader({ context }: Route.LoaderArgs) {
  const { name, paperSize, units } = allowed(context, "organisation.manage").organisation;
  const { speed, rain, length, distance, salinity } = units;
  return { name, paperSize, speed, rain, length, distance, salinity };
}

export async function action({ request, context }: Route.ActionArgs) {
  const { organisation } = allowed(context, "organisation.manage");
  const submission = await readForm(request, organisationSettingsSchema);
  if (submission.status !== "success") {
    return data({ result: submission.reply(), saved: false }, { status: 400 });
  }
  await saveSettings(organisation.id, submission.value);
  return data({ result: submission.reply(), saved: true });
}

export default function Settings({ loaderData, actionData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof organisationSettingsSchema>, OrganisationSettings, string[]>({
    lastResult: actionData?.result,
    defaultValue: loaderData,
    onValidate: ({ formData }) => parseWithZod(formData, { schema: organisationSettingsSchema }),
    shouldRevalidate: "onInput",
  });
  const choices = [
    { field: fields.speed, label: "Wind and drift speed", options: UNIT_OPTIONS.speed },
    { field: fields.rain, label: "Rain", options: UNIT_OPTIONS.rain },
    { field: fields.length, label: "Depths and heights", options: UNIT_OPTIONS.length },
    { field: fields.distance, label: "Distances", options: UNIT_OPTIONS.distance },
    { field: fields.salinity, label: "Salinity", options: UNIT_OPTIONS.salinity },
    { field: fields.paperSize, label: "Paper of memos", options: PAPER_SIZES },
  ];
  return (
    <div className="max-w-2xl">
      <title>Settings · Galeprint</title>
      <PageTitle first>Settings of the organisation</PageTitle>
      {actionData?.saved && <Notice>Saved. Screens follow from now on; issued memos stay as they are.</Notice>}
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <TextField field={fields.name} label="Name" hint="It heads every memo." autoComplete="organization" />
        <div className="grid gap-4 sm:grid-cols-2">
          {choices.map(({ field, label, options }) => (
            <SelectField key={field.id} field={field} label={label} options={options} />
          ))}
        </div>
        <div>
          <SubmitButton busy="Saving…">Save</SubmitButton>
        </div>
      </Form>
    </div>
  );
}
