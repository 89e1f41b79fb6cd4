import { airState } from "~/ocean/air/humidity";
import type { DragLawId } from "~/ocean/scenario";
import { dragCoefficient, dragLaw, type DragOptions } from "~/ocean/stress/drag-law";
import { coare35Neutral } from "~/ocean/stress/laws/coare35";
import { windStress } from "~/ocean/stress/wind-stress";
import { averagingFactor, convertAveraging } from "~/ocean/wind/averaging";
import { windComponents } from "~/ocean/wind/components";
import { directionTowards } from "~/ocean/wind/direction-to";
import { logLawWind10 } from "~/ocean/wind/log-law";
import { powerLawWind10 } from "~/ocean/wind/power-law";
import type { CaseInputs } from "./case-inputs";
import type { CheckMethods } from "../check-methods";

/** The engine refuses an unknown law itself. */
export const lawOf = (inputs: CaseInputs) => inputs.text("law") as DragLawId;

export function dragOptionsOf(inputs: CaseInputs): DragOptions {
  const coefficient = ["coefficient", "cd", "dragCoefficient"].find((name) => inputs.has(name));
  const cap = ["capU", "highWindCap", "cap"].find((name) => inputs.has(name));
  return {
    ...(coefficient && { coefficient: inputs.number(coefficient) }),
    ...(cap && { highWindCap: inputs.number(cap) }),
    ...(inputs.has("nu") && { viscosity: inputs.number("nu") }),
    ...(inputs.has("g") && { gravity: inputs.number("g") }),
  };
}

export const windMethods: CheckMethods = {
  "wind.components": (inputs) => windComponents(inputs.number("speed"), inputs.number("dirFrom")),
  "current.directionTo": (inputs) => ({ dirTo: directionTowards(inputs.number("u"), inputs.number("v")) }),
  "wind.powerLaw10m": (inputs) => ({ U10: powerLawWind10(inputs.number("U"), inputs.number("z")).wind10 }),
  "wind.logLaw10m": (inputs) => ({
    U10: logLawWind10(inputs.number("U"), inputs.number("z"), dragLaw(lawOf(inputs), dragOptionsOf(inputs))),
  }),
  "wind.averagingFactor": (inputs) => ({ ratioTo1h: averagingFactor(inputs.number("tSeconds")) }),
  "wind.convertAveraging": (inputs) => ({
    U: convertAveraging(inputs.number("U"), inputs.number("fromSeconds"), inputs.number("toSeconds")),
  }),
  "air.density": (inputs) => ({ rho: airState(inputs.number("t"), inputs.number("p"), inputs.number("rh")).rho }),
  "air.humidity": (inputs) => ({ ...airState(inputs.number("t"), inputs.number("p"), inputs.number("rh")) }),
  "drag.cd": (inputs) => ({ cd: dragCoefficient(lawOf(inputs), inputs.number("U10"), dragOptionsOf(inputs)) }),
  "drag.coare35Neutral": (inputs) => ({
    ...coare35Neutral(inputs.number("U10N"), inputs.number("nu", 1.5038453476800001e-5), inputs.number("g", 9.81)),
  }),
  "drag.stress": (inputs) => {
    const law = dragLaw(lawOf(inputs), dragOptionsOf(inputs));
    const { x, y } = windStress(inputs.number("u"), inputs.number("v"), law, inputs.number("rhoAir", 1.22));
    return { taux: x, tauy: y };
  },
};
