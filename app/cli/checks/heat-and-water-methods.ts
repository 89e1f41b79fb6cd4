import { coare35Fluxes } from "~/ocean/air/bulk-coare35";
import { largeYeagerFluxes } from "~/ocean/air/bulk-large-yeager";
import { buoyancyFlux } from "~/ocean/freshwater/buoyancy-flux";
import { moninObukhovLength } from "~/ocean/freshwater/monin-obukhov";
import { rainDilution } from "~/ocean/freshwater/rain-dilution";
import { stableLayerWindLimit } from "~/ocean/freshwater/wind-limit";
import { evaporationRate, latentHeatOfVaporisation } from "~/ocean/heat/evaporation";
import { layerWarming } from "~/ocean/heat/layer-warming";
import { netLongwaveLoss, type LongwaveKind } from "~/ocean/heat/net-longwave";
import { rainHeatLoss } from "~/ocean/heat/rain-heat";
import { reedInsolation } from "~/ocean/heat/reed-insolation";
import { shortwaveFraction, waterClarity, type WaterTypeId } from "~/ocean/heat/shortwave";
import { HEAT_CAPACITY } from "~/ocean/constants";
import { dragLaw } from "~/ocean/stress/drag-law";
import type { CheckMethods } from "../check-methods";
import { dragOptionsOf, lawOf } from "./wind-methods";

const SECONDS_PER_DAY = 86400;

export const heatAndWaterMethods: CheckMethods = {
  "heat.layerWarming": (inputs) => ({
    dT: layerWarming(
      inputs.number("Q"),
      inputs.number("dt"),
      inputs.number("D"),
      inputs.number("rhoWater", 1025),
      inputs.number("cp", HEAT_CAPACITY),
    ),
  }),
  "heat.shortwaveFraction": (inputs) => {
    const own = inputs.has("R") && { R: inputs.number("R"), z1: inputs.number("z1"), z2: inputs.number("z2") };
    return { fraction: shortwaveFraction(own || waterClarity(inputs.text("type") as WaterTypeId), inputs.number("z")) };
  },
  "heat.evaporation": (inputs) => {
    const rate = evaporationRate(inputs.number("QL"), inputs.number("ts"), inputs.number("rhoFresh", 1000));
    return { Lv: latentHeatOfVaporisation(inputs.number("ts")), mmPerDay: rate * 1000 * SECONDS_PER_DAY };
  },
  "heat.coare35": (inputs) => {
    const fluxes = coare35Fluxes({
      windSpeed: inputs.number("u"),
      airTemperature: inputs.number("ta"),
      relativeHumidity: inputs.number("rh"),
      pressure: inputs.number("p"),
      seaTemperature: inputs.number("ts"),
      shortwaveDown: inputs.number("Rs"),
      longwaveDown: inputs.number("Rl"),
      height: inputs.number("z"),
      latitude: inputs.number("lat"),
      boundaryLayer: inputs.number("zi", 600),
      rainRateMmPerHour: inputs.number("rainMmH", 0),
      coolSkin: inputs.flag("jcool", true),
    });
    return {
      ustar: fluxes.ustar,
      tau: fluxes.tau,
      Hs: fluxes.sensibleLoss,
      Hl: fluxes.latentLoss,
      dter: fluxes.coolSkin,
      L: fluxes.obukhovLength,
      rainHeat: fluxes.rainHeatLoss,
    };
  },
  "heat.largeYeager2009": (inputs) => {
    const { CD, CH, CE, tau, sensibleLoss, latentLoss } = largeYeagerFluxes({
      windSpeed: inputs.number("U"),
      airTemperature: inputs.number("theta"),
      q: inputs.number("q"),
      seaTemperature: inputs.number("ts"),
      qsea: inputs.number("qs"),
      height: inputs.number("z", 10),
      airDensity: inputs.number("rhoAir", 1.22),
      iterations: inputs.number("iterations", 5),
      airHeatCapacity: inputs.number("cpAir", 1000.5),
      latentHeat: inputs.number("Lv", 2.5e6),
    });
    return { CD, CH, CE, tau, QS: sensibleLoss, QL: latentLoss };
  },
  "heat.netLongwave": (inputs) => ({
    Qup: netLongwaveLoss({
      kind: inputs.text("kind", "berliand") as LongwaveKind,
      seaTemperature: inputs.number("ts"),
      airTemperature: inputs.number("ta"),
      vapourPressure: inputs.number("e"),
      cloud: inputs.number("cloud"),
      cloudCoefficient: inputs.number("cloudCoef", 0.8),
      cloudExponent: inputs.number("cloudExp", 1),
      emissivity: inputs.number("eps", 0.97),
    }),
  }),
  "heat.reedInsolation": (inputs) => ({
    Q: reedInsolation(inputs.number("Q0"), inputs.number("cloud"), inputs.number("noonAltitude")),
  }),
  "heat.rainHeatGosnell": (inputs) => ({
    Q: rainHeatLoss({
      rainRateMmPerHour: inputs.number("rainMmH"),
      airTemperature: inputs.number("ta"),
      seaTemperature: inputs.number("ts"),
      q: inputs.number("q"),
      qsea: inputs.number("qs"),
      airDensity: inputs.number("rhoAir"),
      coolSkin: inputs.number("dter", 0),
      coolSkinHumidity: inputs.number("dqer", 0),
    }),
  }),
  "fresh.rainDilution": (inputs) => ({ dS: rainDilution(inputs.number("S"), inputs.number("D"), inputs.number("d")) }),
  "fresh.buoyancyFlux": (inputs) => ({
    B: buoyancyFlux(
      {
        heatFlux: inputs.number("Q"),
        evaporationMinusRain: inputs.number("EmP"),
        SA: inputs.number("SA"),
        CT: inputs.number("CT"),
      },
      inputs.number("g", 9.81),
      inputs.number("rhoWater", 1025),
      inputs.number("cp", HEAT_CAPACITY),
    ),
  }),
  "fresh.moninObukhov": (inputs) => ({ L: moninObukhovLength(inputs.number("ustar"), inputs.number("B")) }),
  "fresh.windLimit": (inputs) => ({
    U10: stableLayerWindLimit(
      inputs.number("h"),
      inputs.number("B"),
      dragLaw(lawOf(inputs), dragOptionsOf(inputs)),
      inputs.number("rhoAir", 1.22),
      inputs.number("rhoWater", 1025),
    ),
  }),
};
