/** The form of a method sheet: text as it is typed, checked by the engine's own rules. */
import { z } from "zod";
import { METHOD_KEYS, PARAMETERS, type MethodKey } from "./method-parameters";
import type { MethodChoices } from "~/ocean/scenario";
import { methodSchema } from "~/ocean/validation/scenario-schema";

/** What a field holds becomes what the engine takes; an open one is left to the default. */
function readField(key: MethodKey, text: string | undefined): unknown {
  const typed = text?.trim() ?? "";
  if (typed === "") return undefined;
  if (PARAMETERS[key].kind === "number") {
    const number = Number(typed.replace(",", "."));
    return Number.isNaN(number) ? typed : number;
  }
  return typed === "true" ? true : typed === "false" ? false : typed;
}

const fields = Object.fromEntries(METHOD_KEYS.map((key) => [key, z.string().optional()])) as Record<
  MethodKey,
  z.ZodOptional<z.ZodString>
>;

export const methodSheetSchema = z
  .object({
    name: z.string("Name the sheet.").trim().min(1, "Name the sheet.").max(120, "Use at most 120 characters."),
    ...fields,
  })
  .transform((form, context) => {
    const choices = Object.fromEntries(
      METHOD_KEYS.flatMap((key) => {
        const value = readField(key, form[key]);
        return value === undefined ? [] : [[key, value]];
      }),
    );
    const checked = methodSchema.safeParse(choices);
    if (!checked.success) {
      for (const { path, message } of checked.error.issues) {
        context.addIssue({ code: "custom", path: [...path], message });
      }
      return z.NEVER;
    }
    return { name: form.name, choices: checked.data satisfies MethodChoices };
  });

/** The fields of a form that shows a sheet. */
export function formValues(name: string, choices: MethodChoices): Record<string, string> {
  const typed = Object.entries(choices).map(([key, value]) => [key, String(value)]);
  return { name, ...(Object.fromEntries(typed) as Record<string, string>) };
}
