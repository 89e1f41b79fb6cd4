import { columnAtRest } from "~/ocean/column/column-state";
import { ColumnModel, type ColumnForcing } from "~/ocean/column/column-model";
import { equivalentDepth } from "~/ocean/column/equivalent-depth";
import { lightShares } from "~/ocean/column/light-shares";
import { linearDensity } from "~/ocean/column/linear-density";
import { complex } from "~/ocean/complex";
import { waterClarity, type WaterTypeId } from "~/ocean/heat/shortwave";
import { OceanError } from "~/ocean/errors";
import { requirePositive } from "~/ocean/guards";
import type { CaseInputs } from "./case-inputs";
import type { CheckMethods } from "../check-methods";
import { parseFormula } from "./expression";

interface ColumnRun {
  model: ColumnModel;
  /** Density before the run, kg/m³. */
  before: Float64Array;
  dt: number;
}

const MOST_CELLS = 100_000;

/** A column as the case describes it, at rest: linear density, and profiles from numbers, formulas or N². */
function columnOf(inputs: CaseInputs): ColumnRun {
  const density = linearDensity({
    rho0: inputs.number("rho0", 1025),
    alpha: inputs.number("alpha"),
    beta: inputs.number("beta"),
    T0: inputs.number("T0", 20),
    S0: inputs.number("S0", 35),
  });
  const cellSize = inputs.number("dz");
  requirePositive({ dz: cellSize, dt: inputs.number("dt") });
  const cells = inputs.has("n") ? inputs.number("n") : Math.round(inputs.number("depth") / cellSize);
  if (!(cells >= 2 && cells <= MOST_CELLS))
    throw new OceanError("INVALID_INPUT", `A column of ${cells} cells cannot be run.`);
  const centres = Array.from({ length: Math.round(cells) }, (_, k) => (k + 0.5) * cellSize);
  const state = columnAtRest(temperatureOf(inputs, centres), salinityOf(inputs, centres), cellSize, density);
  const clarity = inputs.has("jerlov") ? waterClarity(inputs.text("jerlov") as WaterTypeId) : null;
  const model = new ColumnModel(state, {
    f: inputs.number("f", 0),
    waterDensity: inputs.number("rho0", 1025),
    heatCapacity: inputs.number("cp", 3991.86795711963),
    gravity: inputs.number("g", 9.81),
    bulkRichardson: inputs.number("bulkRichardson", 0.65),
    gradientRichardson: inputs.number("gradientRichardson", 0.25),
    gradientMixing: inputs.flag("gradientMixing", true),
    dampingRate: inputs.number("r", 0),
    bottomDrag: inputs.number("bottomDrag", 0),
    lightShares: lightShares(clarity, cells, cellSize),
    referenceSalinity: inputs.number("Sref", state.S[0]),
  });
  return { model, before: state.rho.slice(), dt: inputs.number("dt") };
}

function temperatureOf(inputs: CaseInputs, centres: number[]): number[] {
  if (inputs.has("T")) return profileFrom(inputs.text("T"), centres, inputs);
  // N² = g α dT/dz gives the temperature that falls with depth; without one the column is uniform.
  const slope = inputs.has("N2") ? inputs.number("N2") / (inputs.number("g", 9.81) * inputs.number("alpha")) : 0;
  return centres.map((z) => inputs.number("T0", 20) - slope * z);
}

function salinityOf(inputs: CaseInputs, centres: number[]): number[] {
  return inputs.has("S") ? profileFrom(inputs.text("S"), centres, inputs) : centres.map(() => inputs.number("S0", 35));
}

const LINEAR = /^linear\s+(\S+?)\.\.(\S+)\s+over\s+n\s+cells$/;
const ASSIGNMENT = /^\s*([A-Za-z]\w*)\s*=\s*(\S+)\s*$/;

/** A profile told in words: `linear 34.5..35.5 over n cells`, or a formula in z with its constants after commas. */
function profileFrom(words: string, centres: number[], inputs: CaseInputs): number[] {
  const linear = LINEAR.exec(words);
  if (linear) {
    const [from, to] = [Number(linear[1]), Number(linear[2])];
    return centres.map((_, k) => from + ((to - from) * k) / Math.max(1, centres.length - 1));
  }
  const parts = words.split(",");
  const split = parts.findIndex((part) => ASSIGNMENT.test(part));
  const formula = parseFormula((split < 0 ? parts : parts.slice(0, split)).join(","));
  const constants = Object.fromEntries(
    (split < 0 ? [] : parts.slice(split)).map((part) => {
      const found = ASSIGNMENT.exec(part);
      if (!found) throw new OceanError("INVALID_INPUT", `"${part}" does not set a constant.`);
      return [found[1], complex(Number(found[2]))];
    }),
  );
  const known = ["g", "alpha", "beta", "T0", "S0", "rho0", "cp", "N2"].filter((name) => inputs.has(name));
  const given = Object.fromEntries(known.map((name) => [name, complex(inputs.number(name))]));
  return centres.map((z) => formula({ ...given, ...constants, z: complex(z) }).re);
}

/** Forcing by step, from a number or a formula in the step's index: `i`, or `idx` where i is the imaginary unit. */
function byStep(inputs: CaseInputs, name: string): (step: number) => { re: number; im: number } {
  if (!inputs.has(name)) return () => complex(0);
  let words: string;
  try {
    words = inputs.text(name);
  } catch {
    const value = inputs.number(name);
    return () => complex(value);
  }
  const formula = parseFormula(words.replace(/\s*complex\s*$/, ""));
  const indexed = /\bidx\b/.test(words);
  return (step) => formula(indexed ? { i: complex(0, 1), idx: complex(step) } : { i: complex(step) });
}

function steady(forcing: Partial<ColumnForcing>): ColumnForcing {
  return { tauX: 0, tauY: 0, nonSolarHeat: 0, shortwave: 0, freshWater: 0, ...forcing };
}

function stepsOf(inputs: CaseInputs): number {
  if (inputs.has("steps")) return inputs.number("steps");
  return Math.round((inputs.number("hours") * 3600) / inputs.number("dt"));
}

function run({ model, dt }: ColumnRun, steps: number, forcing: ColumnForcing): void {
  for (let step = 0; step < steps; step++) model.step(dt, forcing);
}

function equivalentOf({ model, before }: ColumnRun, inputs: CaseInputs): number {
  return equivalentDepth(before, model.state.rho, {
    cellSize: model.state.cellSize,
    N2: inputs.number("N2"),
    rho0: inputs.number("rho0", 1025),
    gravity: inputs.number("g", 9.81),
  });
}

function pushedBy(ustar: number, inputs: CaseInputs): ColumnForcing {
  return steady({ tauX: inputs.number("rho0", 1025) * ustar * ustar });
}

/** Depth of the water that convection has made uniform, m: there is no shear to blur its base. */
function uniformDepth({ state }: ColumnModel): number {
  let cells = 1;
  while (cells < state.cells && Math.abs(state.rho[cells] - state.rho[0]) <= 1e-4) cells++;
  return cells * state.cellSize;
}

export const columnMethods: CheckMethods = {
  "column.convectiveDeepening": (inputs) => {
    const column = columnOf(inputs);
    run(column, stepsOf(inputs), steady({ nonSolarHeat: inputs.number("Q") }));
    return { mld: uniformDepth(column.model) };
  },
  "column.katoPhillips": (inputs) => {
    const column = columnOf(inputs);
    run(column, stepsOf(inputs), pushedBy(inputs.number("ustar"), inputs));
    return { hEquivalent: equivalentOf(column, inputs) };
  },
  "column.prtHalfInertial": (inputs) => {
    const column = columnOf(inputs);
    run(column, stepsOf(inputs), pushedBy(inputs.number("ustar"), inputs));
    return { hEquivalent: equivalentOf(column, inputs) };
  },
  "column.trappingDepth": (inputs) => {
    const column = columnOf(inputs);
    const Q = inputs.number("Q");
    const heat = inputs.flag("penetrating", false) ? { shortwave: Q } : { nonSolarHeat: Q };
    const { T, u } = column.model.state;
    const start = T[0];
    run(column, stepsOf(inputs), steady({ ...heat, tauX: inputs.number("tau") }));
    return { dTsurface: T[0] - start, uSurface: u[0] };
  },
  "column.conservation": (inputs) => {
    const { model, dt } = columnOf(inputs);
    const { T, S, u, v, cellSize } = model.state;
    const perCell = inputs.number("rho0", 1025) * inputs.number("cp", 3991.86795711963) * cellSize;
    const [heat0, salt0] = [total(T), total(S)];
    const [heat, sun, stress] = [byStep(inputs, "Qnp"), byStep(inputs, "Qsw"), byStep(inputs, "tau")];
    const steps = stepsOf(inputs);
    for (let step = 0; step < steps; step++) {
      const tau = stress(step);
      model.step(dt, {
        tauX: tau.re,
        tauY: tau.im,
        nonSolarHeat: heat(step).re,
        shortwave: sun(step).re,
        freshWater: -inputs.number("EmP", 0),
      });
    }
    return {
      heatGain: perCell * (total(T) - heat0),
      saltGain: cellSize * (total(S) - salt0),
      Mx: cellSize * total(u),
      My: cellSize * total(v),
    };
  },
};

function total(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value, 0);
}
