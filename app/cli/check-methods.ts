import type { CaseInputs } from "./checks/case-inputs";
import { columnMethods } from "./checks/column-methods";
import { cycloneMethods } from "./checks/cyclone-methods";
import { driftMethods } from "./checks/drift-methods";
import { heatAndWaterMethods } from "./checks/heat-and-water-methods";
import { seawaterMethods } from "./checks/seawater-methods";
import { statisticsMethods } from "./checks/statistics-methods";
import { stormMethods } from "./checks/storm-methods";
import { windMethods } from "./checks/wind-methods";

/** What a method answers: figures by name; null where the engine has none. */
export type CheckAnswer = Record<string, number | null | readonly number[] | readonly (readonly number[])[]>;

/** A case's inputs in, the engine's public functions called, figures out. Refusals are thrown as OceanError. */
export type CheckMethod = (inputs: CaseInputs) => CheckAnswer;
export type CheckMethods = Record<string, CheckMethod>;

/** Every method that check files may name. */
export const CHECK_METHODS: CheckMethods = {
  ...seawaterMethods,
  ...windMethods,
  ...driftMethods,
  ...heatAndWaterMethods,
  ...columnMethods,
  ...cycloneMethods,
  ...statisticsMethods,
  ...stormMethods,
};
