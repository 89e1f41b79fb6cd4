import { complex, modulus } from "~/ocean/complex";
import { coriolis, inertialPeriod } from "~/ocean/ekman/coriolis";
import { ekmanEmpirical } from "~/ocean/ekman/empirical";
import { coastalBalance } from "~/ocean/ekman/finite-depth-coast";
import { finiteDepthCurrent, finiteDepthTransport, type FiniteDepthSetting } from "~/ocean/ekman/finite-depth";
import { ekmanSpiral } from "~/ocean/ekman/spiral";
import { angleToTheRight, surfaceDeflection, surfaceDeflectionOfRatio } from "~/ocean/ekman/surface-deflection";
import { ekmanTransport } from "~/ocean/ekman/transport";
import { upwellingIndex } from "~/ocean/ekman/upwelling-index";
import { windEnergyFlux } from "~/ocean/slab/energy-flux";
import { SlabIntegrator } from "~/ocean/slab/slab-integrator";
import type { CaseInputs } from "./case-inputs";
import type { CheckMethods } from "../check-methods";

const stressOf = (inputs: CaseInputs) => ({ x: inputs.number("taux"), y: inputs.number("tauy") });
const waterDensityOf = (inputs: CaseInputs) => inputs.number("rhoWater", 1025);

function kinematicStressOf(inputs: CaseInputs) {
  const { x, y } = stressOf(inputs);
  return complex(x / waterDensityOf(inputs), y / waterDensityOf(inputs));
}

function settingOf(inputs: CaseInputs): FiniteDepthSetting {
  return { f: coriolis(inputs.number("lat")), eddyViscosity: inputs.number("Az"), depth: inputs.number("H") };
}

function slabOf(inputs: CaseInputs): SlabIntegrator {
  return new SlabIntegrator({
    f: inputs.number("f"),
    dampingRate: inputs.number("r", 0),
    layerDepth: inputs.number("H"),
    waterDensity: waterDensityOf(inputs),
  });
}

export const driftMethods: CheckMethods = {
  "ekman.coriolis": (inputs) => {
    const f = coriolis(inputs.number("lat"));
    const period = inertialPeriod(f);
    return { f, inertialPeriodHours: period === null ? null : period / 3600 };
  },
  "ekman.transport": (inputs) => {
    const M = ekmanTransport(stressOf(inputs), inputs.number("lat"), waterDensityOf(inputs));
    return { Mx: M.x, My: M.y, Ux50: M.x / 50, Uy50: M.y / 50 };
  },
  "ekman.spiralInfinite": (inputs) =>
    ekmanSpiral(
      stressOf(inputs),
      inputs.number("lat"),
      inputs.number("Az"),
      inputs.number("z"),
      waterDensityOf(inputs),
    ),
  "ekman.surfaceDeflection": (inputs) => ({
    angleRightDeg: inputs.has("HoverDE")
      ? surfaceDeflectionOfRatio(inputs.number("HoverDE"))
      : surfaceDeflection(settingOf(inputs)),
  }),
  "ekman.empirical": (inputs) => {
    const { V0, DE } = ekmanEmpirical(inputs.number("U10"), inputs.number("lat"));
    return { V0, DE };
  },
  "ekman.finiteDepth": (inputs) => {
    const T = kinematicStressOf(inputs);
    const setting = settingOf(inputs);
    const current = finiteDepthCurrent(T, setting, inputs.number("z"));
    const transport = finiteDepthTransport(T, setting);
    const surface = finiteDepthCurrent(T, setting, 0);
    return {
      u: current.re,
      v: current.im,
      Mx: transport.re,
      My: transport.im,
      surfaceAngleRightDeg: modulus(T) === 0 ? null : angleToTheRight(T, surface),
    };
  },
  "ekman.finiteDepthCoast": (inputs) => {
    const gravity = inputs.number("g", 9.81);
    const balance = coastalBalance(kinematicStressOf(inputs), settingOf(inputs), inputs.number("onshoreTo"), gravity);
    const current = balance.currentAt(inputs.number("z"));
    const { setupSlope, crossTransport, alongTransport } = balance;
    return { u: current.re, v: current.im, setupSlope, crossTransport, alongTransport };
  },
  "ekman.upwellingIndex": (inputs) => ({
    m3sPer100m: upwellingIndex(
      stressOf(inputs),
      inputs.number("lat"),
      inputs.number("offshoreTo"),
      waterDensityOf(inputs),
    ),
  }),
  "slab.constantWind": (inputs) => {
    const slab = slabOf(inputs);
    const { x: tx, y: ty } = stressOf(inputs);
    for (let step = 0; step < inputs.number("steps"); step++) slab.step(inputs.number("dt"), tx, ty, tx, ty);
    const { u, v, x, y } = slab;
    return { u, v, x, y };
  },
  "slab.step": (inputs) => {
    const slab = slabOf(inputs);
    slab.startFrom(inputs.number("u0"), inputs.number("v0"), inputs.number("x0", 0), inputs.number("y0", 0));
    slab.step(
      inputs.number("dt"),
      inputs.number("tau0x"),
      inputs.number("tau0y"),
      inputs.number("tau1x"),
      inputs.number("tau1y"),
    );
    const { u, v, x, y } = slab;
    return { u, v, x, y };
  },
  "slab.rotatingWind": (inputs) => {
    const slab = slabOf(inputs);
    const size = inputs.number("tau");
    const dt = inputs.number("dt");
    const angleAt = (step: number) => inputs.number("rotationRate") * step * dt;
    for (let step = 0; step < inputs.number("steps"); step++) {
      const [a, b] = [angleAt(step), angleAt(step + 1)];
      slab.step(dt, size * Math.cos(a), size * Math.sin(a), size * Math.cos(b), size * Math.sin(b));
    }
    return { speed: Math.hypot(slab.u, slab.v) };
  },
  "slab.energyFlux": (inputs) => ({
    W: windEnergyFlux(stressOf(inputs), { u: inputs.number("u"), v: inputs.number("v") }),
  }),
};
