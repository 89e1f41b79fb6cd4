/** The form of a method sheet: text as it is typed, checked by the engine's own rules. */
import { z } from "zod";
import { METHOD_KEYS, PARAMETERS, type MethodKey } from "./method-parameters";
import type { Ensemble, MethodChoices } from "~/ocean/scenario";
import { ensembleSchema, methodSchema } from "~/ocean/validation/scenario-schema";

/** The seed of a sheet that names none: any number will do, as long as it is kept. */
const DEFAULT_SEED = 1;

function readNumber(text: string | undefined): unknown {
  const typed = text?.trim() ?? "";
  if (typed === "") return undefined;
  const number = Number(typed.replace(",", "."));
  return Number.isNaN(number) ? typed : number;
}

/** What a field holds becomes what the engine takes; an open one is left to the default. */
function readField(key: MethodKey, text: string | undefined): unknown {
  if (PARAMETERS[key].kind === "number") return readNumber(text);
  const typed = text?.trim() ?? "";
  if (typed === "") return undefined;
  return typed === "true" ? true : typed === "false" ? false : typed;
}

const fields = Object.fromEntries(METHOD_KEYS.map((key) => [key, z.string().optional()])) as Record<
  MethodKey,
  z.ZodOptional<z.ZodString>
>;

export const methodSheetSchema = z
  .object({
    name: z.string("Name the sheet.").trim().min(1, "Name the sheet.").max(120, "Use at most 120 characters."),
    members: z.string().optional(),
    seed: z.string().optional(),
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
    const members = readNumber(form.members);
    const ensemble = ensembleSchema.safeParse({ members, seed: readNumber(form.seed) ?? DEFAULT_SEED });
    if (members !== undefined && !ensemble.success) {
      for (const { path, message } of ensemble.error.issues)
        context.addIssue({ code: "custom", path: [...path], message });
      return z.NEVER;
    }
    return {
      name: form.name,
      choices: checked.data satisfies MethodChoices,
      ensemble: members !== undefined && ensemble.success ? ensemble.data : null,
    };
  });

/** The fields of a form that shows a sheet. */
export function formValues(name: string, choices: MethodChoices, ensemble: Ensemble | null): Record<string, string> {
  const typed = Object.entries({ ...choices, ...ensemble }).map(([key, value]) => [key, String(value)]);
  return { name, ...(Object.fromEntries(typed) as Record<string, string>) };
}
