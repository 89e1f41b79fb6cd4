import type { MethodSource } from "./method-source";
import type { Response } from "./response";
import { SEAWATER } from "./sources/seawater";
import { WIND_AND_AIR } from "./sources/wind-and-air";
import { STRESS } from "./sources/stress";
import { STEADY_DRIFT } from "./sources/steady-drift";
import { SLAB } from "./sources/slab";
import { HEAT } from "./sources/heat";
import { FRESH_WATER } from "./sources/fresh-water";
import { COLUMN } from "./sources/column";
import { CYCLONE } from "./sources/cyclone";
import { UNCERTAINTY } from "./sources/uncertainty";
import { FIT } from "./sources/fit";

export type { MethodSource, MethodSymbol, Provenance } from "./method-source";

/** Every method of the engine, in the order of the work. */
export const SOURCES: readonly MethodSource[] = [
  ...SEAWATER,
  ...WIND_AND_AIR,
  ...STRESS,
  ...STEADY_DRIFT,
  ...SLAB,
  ...HEAT,
  ...FRESH_WATER,
  ...COLUMN,
  ...CYCLONE,
  ...UNCERTAINTY,
  ...FIT,
];

/** The entry of an id. @throws Error for an id that does not exist: a fault of the engine, not of the user */
export function sourceOf(id: string): MethodSource {
  const source = SOURCES.find((entry) => entry.id === id);
  if (!source) throw new Error(`No source is listed under "${id}".`);
  return source;
}

/** What a response stands on, in the order of the work: for its method page and a memo's references. */
export function methodSources({ method, uncertainty }: Pick<Response, "method" | "uncertainty">): MethodSource[] {
  const model = method.model?.value;
  const used = new Set([
    "density",
    "absolute-salinity",
    "conservative-temperature",
    "potential-temperature",
    "freezing",
    "pressure",
    "wind-components",
    "wind-height",
    "stress",
    "high-wind-cap",
    "coriolis",
  ]);
  used.add(`drag-${String(method.dragLaw?.value)}`);
  if (model === "budget") used.add(method.ekman?.value === "finiteDepth" ? "ekman-finite-depth" : "ekman-transport");
  if (model === "coastal") used.add("ekman-coast").add("ekman-finite-depth");
  if (model === "slab") used.add("slab");
  if (model === "column") used.add("column").add("stability").add("mixed-layer");
  if (model !== "column") used.add("layer-heat").add("rain-dilution");
  if (model !== "slab" && method.eddyViscosity?.origin === "default" && method.ekman?.value === "finiteDepth")
    used.add("ekman-empirical");
  if (method.penetratingShortwave?.value === true) used.add("shortwave");
  if (method.rainHeat?.value === true) used.add("rain-heat").add("air");
  used.add("evaporation");
  if (uncertainty) used.add("ensemble").add("quantile").add("one-at-a-time").add("correlation-ratio");
  return SOURCES.filter(({ id }) => used.has(id));
}
