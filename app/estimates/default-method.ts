import type { Ensemble, MethodChoices } from "~/ocean/scenario";

/** What a new organisation starts with; everything not chosen here takes the engine's stated default. */
export const DEFAULT_METHOD_SHEET: { name: string; choices: MethodChoices; ensemble: Ensemble } = {
  name: "Slab with its range",
  // The law is left to the engine, so that members draw from all of them: nothing adds more to the spread in high wind.
  choices: { model: "slab" },
  ensemble: { members: 200, seed: 1 },
};
