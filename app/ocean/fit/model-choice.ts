import type { Indicator } from "./fit-context";
import { recommendModel } from "./recommend-model";

/** Another model than the recommended one may be chosen, but not without a word. Value and threshold are what decided. */
export const modelChoice: Indicator = (context) => {
  const chosen = context.method.model;
  const { model, reason, value, threshold, source, alsoFit } = recommendModel(context);
  if (chosen === model) return null;
  const enough = alsoFit.includes(chosen);
  const remedy = enough
    ? `Model ${chosen} follows that too, so the choice stands.`
    : `Compare with model ${model}, or say in the memo why ${chosen} was chosen.`;
  const message = `Model ${chosen} was chosen where model ${model} is recommended. ${reason} ${remedy}`;
  return { code: "MODEL_CHOICE", severity: enough ? "ok" : "caution", message, value, threshold, source };
};
