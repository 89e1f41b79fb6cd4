import type { MethodChoices } from "~/ocean/scenario";

/** What a new organisation starts with; everything not chosen here takes the engine's stated default. */
export const DEFAULT_METHOD_CHOICES: { name: string; choices: MethodChoices } = {
  name: "Slab, Large and Yeager",
  choices: { model: "slab", dragLaw: "largeYeager2009" },
};
