import { describe, expect, it } from "vitest";
import { fitMethod, fitPlace, plainFitContext } from "../../../tests/factories/fit-context";
import { plainScenario } from "../../../tests/factories/scenario-arbitrary";
import { coriolis } from "../ekman/coriolis";
import { DRAG_LAWS } from "../scenario";
import { LAW_RANGES } from "../stress/drag-law";
import { boxExtent } from "./box-extent";
import { boxRossby } from "./box-rossby";
import { boxStormSize } from "./box-storm-size";
import { coastDistance } from "./coast-distance";
import { dragCoefficient } from "./drag-coefficient";
import { duration } from "./duration";
import { equatorial } from "./equatorial";
import type { FitContext, Indicator } from "./fit-context";
import { layerRichardson } from "./layer-richardson";
import { layerStability } from "./layer-stability";
import { samplingGap } from "./sampling-gap";
import { shortwaveAtBase } from "./shortwave-at-base";
import { stormSpeed } from "./storm-speed";
import { upwellingUnderStorm } from "./upwelling-under-storm";
import { waterDepth } from "./water-depth";
import { windFetch } from "./wind-fetch";
import { windHeight } from "./wind-height";
import { windRange } from "./wind-range";

// The thresholds themselves are conventions of this engine unless the note's source says otherwise.

/** A hair below and above a threshold. */
const BELOW = 1 - 1e-9;
const ABOVE = 1 + 1e-9;

const F45 = coriolis(45);
const latitude = (value: number) => ({ place: fitPlace({ latitude: value, f: coriolis(value) }) });
const shore = (radii: number) => ({ internalSpeed: 2, place: fitPlace({ distanceToShore: (radii * 2) / F45 }) });
const depth = (ekmanDepths: number) => ({ ekmanDepth: 80, place: fitPlace({ waterDepth: 80 * ekmanDepths }) });
const periods = (count: number) => ({ inertialPeriod: 60_000, duration: 60_000 * count });
const box = (metres: number) => ({ place: fitPlace({ size: metres }) });
const rossby = (value: number) => ({ peakDrift: value * F45 * 10_000, place: fitPlace({ size: 10_000 }) });
const model = (id: FitContext["method"]["model"]) => ({ method: fitMethod({ model: id }) });
/** Density step that gives the layer this bulk Richardson number. */
const richardson = (value: number) => {
  const { method, water } = plainFitContext();
  return { peakDrift: 0.5, densityStep: (value * method.waterDensity * 0.25) / (method.gravity * water.layerDepth) };
};
const underCyclone = (translationSpeed: number, radiusOfMaximumWind = 40_000): Pick<FitContext, "scenario"> => {
  const { storm, ...rest } = plainScenario();
  return { scenario: { ...rest, storm: { ...storm, cyclone: { translationSpeed, radiusOfMaximumWind } } } };
};
/** Translation that gives a storm of 40 km this speed number at 45°. */
const speedNumber = (value: number) => underCyclone((value * 4 * F45 * 40_000) / Math.PI);
const offLand = (metres: number) => ({ place: fitPlace({ distanceToShore: metres, shoreNormal: 90 }) });
const windAt = (windHeight: number) => {
  const scenario = plainScenario();
  return { scenario: { ...scenario, storm: { ...scenario.storm, windHeight } } };
};
const sampled = (seconds: number) => ({
  forcing: { ...plainFitContext().forcing, seconds: Float64Array.from([0, seconds, seconds + 60]) },
});
/** Depth at which this share of the light is left in Jerlov water IB: R e^(-d/z1) + (1 - R) e^(-d/z2), by bisection. */
const lit = (share: number) => {
  let [low, high] = [0, 200];
  for (let step = 0; step < 200; step++) {
    const middle = (low + high) / 2;
    if (0.67 * Math.exp(-middle) + 0.33 * Math.exp(-middle / 17) > share) low = middle;
    else high = middle;
  }
  const { forcing, water } = plainFitContext();
  return { forcing: { ...forcing, shortwave: Float64Array.of(300) }, water: { ...water, layerDepth: low } };
};

type Row = [name: string, indicator: Indicator, change: Partial<FitContext>, severity: string, threshold: number];

const ROWS: Row[] = [
  ["latitude above 5°", equatorial, latitude(5), "ok", 5],
  ["latitude below 5°", equatorial, latitude(-5 * BELOW), "caution", 5],
  ["latitude above 2°", equatorial, latitude(2), "caution", 5],
  ["latitude below 2°", equatorial, latitude(2 * BELOW), "caution", 2],
  ["shore beyond three radii", coastDistance, shore(3 * ABOVE), "ok", 3],
  ["shore within three radii", coastDistance, shore(3 * BELOW), "caution", 3],
  ["shore beyond one radius", coastDistance, shore(ABOVE), "caution", 3],
  ["shore within one radius", coastDistance, shore(BELOW), "doNotUse", 1],
  ["shore within one radius, coastal", coastDistance, { ...shore(BELOW), ...model("coastal") }, "caution", 1],
  ["water of 1.25 Ekman depths", waterDepth, depth(1.25 * ABOVE), "ok", 1.25],
  ["water below 1.25 Ekman depths", waterDepth, depth(1.25 * BELOW), "caution", 1.25],
  ["water of half an Ekman depth", waterDepth, depth(0.5 * ABOVE), "caution", 1.25],
  ["water below half an Ekman depth", waterDepth, depth(0.5 * BELOW), "doNotUse", 0.5],
  ["the same in the column", waterDepth, { ...depth(0.5 * BELOW), ...model("column") }, "ok", 0.5],
  ["two inertial periods", duration, { ...periods(2), ...model("budget") }, "ok", 2],
  ["less than two inertial periods", duration, { ...periods(2 * BELOW), ...model("budget") }, "caution", 2],
  ["the same in the slab", duration, { ...periods(2 * BELOW), ...model("slab") }, "ok", 2],
  ["a quarter inertial period", duration, { ...periods(0.25), ...model("coastal") }, "caution", 2],
  ["less than a quarter", duration, { ...periods(0.25 * BELOW), ...model("coastal") }, "doNotUse", 0.25],
  ["the same in the column", duration, { ...periods(0.25 * BELOW), ...model("column") }, "caution", 0.25],
  ["storm speed number below 0.5", stormSpeed, speedNumber(0.5 * BELOW), "caution", 0.5],
  ["storm speed number above 0.5", stormSpeed, speedNumber(0.5 * ABOVE), "ok", 2],
  ["storm speed number above 2", stormSpeed, speedNumber(2 * ABOVE), "ok", 2],
  ["a storm above 4 m/s", upwellingUnderStorm, underCyclone(4 * ABOVE), "ok", 4],
  ["a storm of 4 m/s", upwellingUnderStorm, underCyclone(4), "caution", 4],
  ["a storm above internal waves", upwellingUnderStorm, { ...underCyclone(3), internalSpeed: 2.9 }, "caution", 4],
  ["a storm below internal waves", upwellingUnderStorm, { ...underCyclone(2.9), internalSpeed: 2.9 }, "doNotUse", 2.9],
  ["a fetch of 8 km", windFetch, offLand(8000 * ABOVE), "ok", 8],
  ["a fetch below 8 km", windFetch, offLand(8000 * BELOW), "caution", 8],
  ["a constant coefficient of 2.5e-3", dragCoefficient, constant(2.5e-3), "ok", 2.5e-3],
  ["a higher one", dragCoefficient, constant(2.5e-3 * ABOVE), "caution", 2.5e-3],
  ["Richardson number above 0.65", layerRichardson, richardson(0.65 * ABOVE), "ok", 0.65],
  ["Richardson number below 0.65", layerRichardson, richardson(0.65 * BELOW), "caution", 0.65],
  ["Richardson number above 0.25", layerRichardson, richardson(0.25 * ABOVE), "caution", 0.65],
  ["Richardson number below 0.25", layerRichardson, richardson(0.25 * BELOW), "doNotUse", 0.25],
  ["water beneath no denser", layerStability, { densityStep: 0 }, "doNotUse", 0],
  ["5 % of the light", shortwaveAtBase, lit(0.05 * BELOW), "ok", 0.05],
  ["more than 5 % of the light", shortwaveAtBase, lit(0.05 * ABOVE), "caution", 0.05],
  ["20 % of the light", shortwaveAtBase, lit(0.2 * BELOW), "caution", 0.05],
  ["more than 20 % of the light", shortwaveAtBase, lit(0.2 * ABOVE), "caution", 0.2],
  ["half the radius of maximum wind", boxStormSize, { ...underCyclone(6), ...box(20_000) }, "ok", 0.5],
  ["more than half of it", boxStormSize, { ...underCyclone(6), ...box(20_000 * ABOVE) }, "caution", 0.5],
  ["the radius of maximum wind", boxStormSize, { ...underCyclone(6), ...box(40_000) }, "caution", 0.5],
  ["more than it", boxStormSize, { ...underCyclone(6), ...box(40_000 * ABOVE) }, "doNotUse", 1],
  ["Rossby number of 0.1", boxRossby, rossby(0.1 * BELOW), "ok", 0.1],
  ["Rossby number above 0.1", boxRossby, rossby(0.1 * ABOVE), "caution", 0.1],
  ["Rossby number of 0.5", boxRossby, rossby(0.5 * BELOW), "caution", 0.1],
  ["Rossby number above 0.5", boxRossby, rossby(0.5 * ABOVE), "caution", 0.5],
  ["a box of 500 km", boxExtent, box(500_000), "ok", 500],
  ["a wider box", boxExtent, box(500_000 * ABOVE), "caution", 500],
  ["samples an hour apart", samplingGap, sampled(3600), "ok", 1],
  ["samples farther apart", samplingGap, sampled(3600 * ABOVE), "caution", 1],
  ["wind measured at 1 m", windHeight, windAt(1), "ok", 50],
  ["wind measured lower", windHeight, windAt(BELOW), "caution", 1],
  ["wind measured at 50 m", windHeight, windAt(50), "ok", 50],
  ["wind measured higher", windHeight, windAt(50 * ABOVE), "caution", 50],
];

function constant(coefficient: number): Partial<FitContext> {
  return { method: fitMethod({ dragLaw: "constant", dragCoefficient: coefficient }) };
}

describe("thresholds of the fit notes", () => {
  it.each(ROWS)("%s", (_, indicator, change, severity, threshold) => {
    const note = indicator(plainFitContext(change));
    expect(note).toMatchObject({ severity, threshold });
    expect(note?.message).toMatch(/^[A-Z0-9].*\.$/);
    expect(note?.message).not.toMatch(/NaN|Infinity|undefined/);
    // A memo quotes the first sentence, where it has no more than 40 words.
    expect(note?.message.split(/(?<=\.)\s/)[0].split(/\s+/).length).toBeLessThanOrEqual(40);
  });

  it.each(DRAG_LAWS)("hold the wind to both ends of the range of law %s", (dragLaw) => {
    const [low, high] = LAW_RANGES[dragLaw];
    const at = (peakWind: number) => windRange(plainFitContext({ peakWind, method: fitMethod({ dragLaw }) }));
    expect(at(high)).toMatchObject({ code: "WIND_RANGE", severity: "ok", threshold: high });
    expect(at(high * ABOVE)).toMatchObject({ code: "OUT_OF_RANGE", severity: "caution", threshold: high });
    expect(at(0)).toMatchObject({ code: "WIND_RANGE", severity: "ok" });
    if (low === 0) return;
    expect(at(low)).toMatchObject({ code: "WIND_RANGE", severity: "ok" });
    expect(at(low * BELOW)).toMatchObject({ code: "OUT_OF_RANGE", severity: "caution", threshold: low });
  });
});
