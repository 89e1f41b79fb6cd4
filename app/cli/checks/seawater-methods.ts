import { absoluteSalinity } from "~/ocean/seawater/absolute-salinity";
import { adiabaticLapse80 } from "~/ocean/seawater/adiabatic-lapse80";
import { seawaterComposition } from "~/ocean/seawater/composition";
import { conservativeFromPotential } from "~/ocean/seawater/conservative-temperature";
import { seawaterDensity } from "~/ocean/seawater/density";
import { eos80Density, t68FromT90 } from "~/ocean/seawater/eos80-density";
import { freezing80 } from "~/ocean/seawater/freezing80";
import { freezingTemperature } from "~/ocean/seawater/freezing";
import { gravityAt } from "~/ocean/seawater/gravity";
import { hydrostaticPressure } from "~/ocean/seawater/hydrostatic-pressure";
import { potentialFromInSitu } from "~/ocean/seawater/potential-temperature";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";
import { buoyancyFrequencySquared, turnerAngle, type WaterSample } from "~/ocean/seawater/stability";
import { theta80 } from "~/ocean/seawater/theta80";
import { OceanError } from "~/ocean/errors";
import type { CaseInputs } from "./case-inputs";
import type { CheckMethods } from "../check-methods";

const t68Of = (inputs: CaseInputs) => (inputs.has("t68") ? inputs.number("t68") : t68FromT90(inputs.number("t90")));

const sampleOf = (inputs: CaseInputs, name: string): WaterSample => {
  const group = inputs.group(name);
  return { SA: group.number("SA"), CT: group.number("CT"), p: group.number("p") };
};

export const seawaterMethods: CheckMethods = {
  "seawater.density": (inputs) => {
    const { rho, alpha, beta, sigma0 } = seawaterDensity(inputs.number("SA"), inputs.number("CT"), inputs.number("p"));
    return { rho, alpha, beta, sigma0 };
  },
  "seawater.eos80Density": (inputs) => ({ rho: eos80Density(inputs.number("S"), t68Of(inputs), inputs.number("p")) }),
  "seawater.theta80": (inputs) => ({
    theta68: theta80(inputs.number("S"), t68Of(inputs), inputs.number("p"), inputs.number("pr", 0)),
  }),
  "seawater.adiabaticLapse80": (inputs) => ({
    gamma: adiabaticLapse80(inputs.number("S"), t68Of(inputs), inputs.number("p")),
  }),
  "seawater.freezing80": (inputs) => ({ tf68: freezing80(inputs.number("S"), inputs.number("p")) }),
  "seawater.ctFromPt": (inputs) => ({ CT: conservativeFromPotential(inputs.number("SA"), inputs.number("pt")) }),
  "seawater.ctFromT": (inputs) => {
    const SA = inputs.number("SA");
    const pt0 = potentialFromInSitu(SA, inputs.number("t"), inputs.number("p"));
    return { CT: conservativeFromPotential(SA, pt0), pt0 };
  },
  "seawater.saFromSp": (inputs) => {
    const region = inputs.text("region", "ocean");
    if (region !== "ocean" && region !== "baltic") throw new OceanError("INVALID_INPUT", `Unknown region "${region}".`);
    return { SA: absoluteSalinity(inputs.number("SP"), region) };
  },
  "seawater.ctFreezing": (inputs) => ({
    CT: freezingTemperature(inputs.number("SA"), inputs.number("p"), inputs.number("saturation", 1)),
  }),
  "seawater.gravity": (inputs) => ({ g: gravityAt(inputs.number("lat")) }),
  "seawater.pressureFromDepth": (inputs) => ({ p: pressureFromDepth(inputs.number("depth"), inputs.number("lat")) }),
  "seawater.n2": (inputs) => ({
    N2: buoyancyFrequencySquared(sampleOf(inputs, "upper"), sampleOf(inputs, "lower"), inputs.number("g", 9.81)),
  }),
  "seawater.turner": (inputs) => turnerAngle(sampleOf(inputs, "upper"), sampleOf(inputs, "lower")),
  "seawater.composition": (inputs) => seawaterComposition(inputs.number("SA")),
  "seawater.hydrostaticPressure": (inputs) => ({
    p: hydrostaticPressure(inputs.numbers("depth"), inputs.numbers("rho"), inputs.number("g", 9.81)),
  }),
};
