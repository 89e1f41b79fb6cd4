import { holland1980, hollandB, cyclostrophicMaximum, type Cyclone } from "~/ocean/cyclone/holland-1980";
import { holland2008 } from "~/ocean/cyclone/holland-2008";
import { holland2010 } from "~/ocean/cyclone/holland-2010";
import { cycloneRain } from "~/ocean/cyclone/rain-climatology";
import { cycloneSurfaceWind } from "~/ocean/cyclone/surface-wind";
import type { CaseInputs } from "./case-inputs";
import type { CheckMethods } from "../check-methods";

const PASCAL_PER_HPA = 100;

function cycloneOf(inputs: CaseInputs): Cyclone {
  return {
    centralPressure: inputs.number("pcHpa") * PASCAL_PER_HPA,
    ambientPressure: inputs.number("pnHpa") * PASCAL_PER_HPA,
    radiusOfMaximumWind: inputs.number("Rm"),
    B: inputs.number("B"),
    latitude: inputs.number("lat"),
    airDensity: inputs.number("rhoAir", 1.15),
  };
}

export const cycloneMethods: CheckMethods = {
  "cyclone.holland1980": (inputs) => {
    const { v, p } = holland1980(cycloneOf(inputs), inputs.number("r"));
    return { v, p: p / PASCAL_PER_HPA };
  },
  "cyclone.hollandVmaxCyclostrophic": (inputs) => ({
    v: cyclostrophicMaximum(inputs.number("B"), inputs.number("dpHpa") * PASCAL_PER_HPA, inputs.number("rhoAir", 1.15)),
  }),
  "cyclone.hollandB": (inputs) => ({
    B: hollandB(
      inputs.number("vmax"),
      (inputs.number("pnHpa") - inputs.number("pcHpa")) * PASCAL_PER_HPA,
      inputs.number("rhoAir", 1.15),
    ),
  }),
  "cyclone.holland2008": (inputs) =>
    holland2008({
      pressureDeficitHpa: inputs.number("dpHpa"),
      deepeningHpaPerHour: inputs.number("dpdtHpaH"),
      latitude: inputs.number("lat"),
      translationSpeed: inputs.number("vt"),
      airDensity: inputs.number("rhoS", 1.15),
    }),
  "cyclone.holland2010": (inputs) => ({
    v: holland2010(
      {
        vms: inputs.number("vms"),
        radiusOfMaximumWind: inputs.number("Rm"),
        bs: inputs.number("bs"),
        xn: inputs.number("xn", 0.5),
        rn: inputs.numberOrNull("rn"),
      },
      inputs.number("r"),
    ),
  }),
  "cyclone.surfaceWind": (inputs) =>
    cycloneSurfaceWind(
      cycloneOf(inputs),
      {
        translationSpeed: inputs.number("vt"),
        translationTo: inputs.number("vtDirTo"),
        reduction: inputs.number("reduction", 0.9),
      },
      inputs.number("dx"),
      inputs.number("dy"),
    ),
  "cyclone.rcliper": (inputs) => ({ mmPerHour: cycloneRain(inputs.number("rKm"), inputs.number("vmaxKt")) }),
};
