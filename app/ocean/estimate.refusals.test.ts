import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { everyNumber } from "../../tests/factories/every-number";
import { plainScenario, scenarioArbitrary } from "../../tests/factories/scenario-arbitrary";
import { estimate } from "./estimate";
import { OCEAN_ERROR_CODES } from "./errors";
import type { Scenario } from "./scenario";
import { ScenarioInvalid } from "./scenario-invalid";
import { validateScenario } from "./validate-scenario";

type Path = (string | number)[];
type Change = (value: unknown) => unknown;

/** Every place of a scenario, whole parts and lists too, with its path. */
function places(value: unknown, path: Path = []): Path[] {
  const here = path.length > 0 ? [path] : [];
  if (Array.isArray(value)) return [...here, ...value.flatMap((item, k) => places(item, [...path, k]))];
  if (typeof value !== "object" || value === null) return here;
  return [...here, ...Object.entries(value).flatMap(([key, item]) => places(item, [...path, key]))];
}

const GONE = Symbol("gone");

/** The scenario with one place changed: a value put there, or the place taken out. */
function changed(value: unknown, [key, ...rest]: Path, change: Change): unknown {
  if (key === undefined) return change(value);
  if (Array.isArray(value)) {
    return value.map((item, k) => (k === key ? changed(item, rest, change) : item)).filter((item) => item !== GONE);
  }
  const entries = Object.entries(value ?? {}).map(([name, item]) => [
    name,
    name === key ? changed(item, rest, change) : item,
  ]);
  return Object.fromEntries(entries.filter(([, item]) => item !== GONE));
}

const JUNK = [
  NaN,
  Infinity,
  -Infinity,
  -1,
  0,
  1e300,
  1e-300,
  null,
  undefined,
  "much",
  "",
  [],
  {},
  true,
  [NaN],
  { a: 1 },
];

const CHANGES: Record<string, Change> = {
  "take it away": () => GONE,
  "turn its sign": (value) => (typeof value === "number" ? -value : [value]),
  "read it in the wrong unit": (value) => (typeof value === "number" ? value * 1000 : []),
  "turn it round": (value) => (Array.isArray(value) ? [...value].reverse() : null),
  "repeat its last": (value) => (Array.isArray(value) ? [...value, value.at(-1)] : NaN),
  "drop its last": (value) => (Array.isArray(value) ? value.slice(0, -1) : ""),
  "misspell it": (value) => (typeof value === "string" ? `${value}x` : { value }),
  "write its date without a zone": () => "2026-11-04T00:00:00",
};

/** `storm.windSpeed[3]` */
const written = (path: Path) =>
  path
    .map((key) => (typeof key === "number" ? `[${key}]` : `.${key}`))
    .join("")
    .slice(1);

const within = (inner: string, outer: string) =>
  inner === outer || inner.startsWith(`${outer}.`) || inner.startsWith(`${outer}[`);

/** Rules between two places may be told of the other one: what was changed, and where its problem may then be. */
const KIN: [changed: RegExp, told: RegExp][] = [
  // A series is as long as the times; a time lies after the one before it.
  [/^storm\.time$/, /^storm\.(windSpeed|windFrom|rain|evaporation|heat\.\w+)$/],
  [/^storm\.time\[\d+\]$/, /^storm\.(time(\[\d+\])?|windSpeed|windFrom|rain|evaporation|heat\.\w+)$/],
  [/^water\.cast\[\d+\](\.depth)?$/, /^water\.cast(\[\d+\]\.depth)?$/],
  // One of two ways to say it: with one gone, the other is missing.
  [/^water(\.below|\.cast\[\d+\])?\.(practicalSalinity|salinity)$/, /^water(\.below|\.cast\[\d+\])?\.salinity$/],
  [/^water\.cast$/, /^water\.(temperature|salinity|layerDepth)$/],
  [/^box\.polygon$/, /^box\.latitude$/],
  // A model asks for what it needs.
  [/^method\.(model|ekman)$/, /^(box\.(latitude|polygon|waterDepth|shoreNormal)|water\.below)$/],
  [/^method$/, /^box\.(latitude|polygon)$/],
  [/^(method\.\w+|storm\.time(\[\d+\])?|storm)$/, /^method\.timeStep$/],
];

function explains(told: string, place: string): boolean {
  if (within(told, place) || within(place, told)) return true;
  return KIN.some(([changedPlace, toldPlace]) => changedPlace.test(place) && toldPlace.test(told));
}

const mutants = scenarioArbitrary(["budget", "slab", "column", "coastal"]).chain((scenario) =>
  fc.record({
    scenario: fc.constant(scenario),
    path: fc.constantFrom(...places(scenario)),
    change: fc.oneof(
      fc.constantFrom(...Object.keys(CHANGES)).map((name) => ({ name, apply: CHANGES[name] })),
      fc.constantFrom(...JUNK).map((junk) => ({ name: `put ${String(JSON.stringify(junk))}`, apply: () => junk })),
    ),
  }),
);

describe("a valid scenario changed in one place", () => {
  it("is computed with finite numbers, or refused by a typed error whose every problem names the place", () => {
    const seen = { valid: 0, invalid: 0 };
    fc.assert(
      fc.property(mutants, ({ scenario, path, change }) => {
        const mutant = changed(scenario, path, change.apply) as Scenario;
        const problems = validateScenario(mutant);
        seen[problems.length === 0 ? "valid" : "invalid"]++;
        if (problems.length === 0) {
          const response = computed(mutant);
          if (response) expect(everyNumber(response).filter(([, value]) => !Number.isFinite(value))).toEqual([]);
          return;
        }
        const place = written(path);
        for (const { path: told, code, message } of problems) {
          expect(explains(told, place), `${change.name} at ${place}: told of ${told}: ${message}`).toBe(true);
          expect(OCEAN_ERROR_CODES).toContain(code);
          expect(message).toMatch(/\S.*\.$/);
        }
        expect(() => estimate(mutant)).toThrow(ScenarioInvalid);
      }),
      { numRuns: 1500 },
    );
    // About one in ten mutants stays valid: both kinds must have been tried, whatever the seed.
    expect(Math.min(seen.valid, seen.invalid)).toBeGreaterThan(75);
  });
});

/** What is valid may still be water that cannot bear the storm; that, too, is refused by name. */
function computed(scenario: Scenario) {
  try {
    return estimate(scenario);
  } catch (error) {
    if (!(error instanceof ScenarioInvalid)) throw error;
    for (const { path } of error.problems) expect(path).toMatch(/^(water|method)\.\w+$/);
    return null;
  }
}

const plain = plainScenario({ hours: 6 });

describe("water that cannot bear its storm", () => {
  it.each<[string, Partial<Scenario>, Record<string, number>, string, RegExp]>([
    ["salt water dries up", thin(0.05), { evaporation: 10 }, "water.layerDepth", /past 60 g\/kg/],
    ["fresh water dries up", thin(0.05, 0), { evaporation: 10 }, "water.layerDepth", /use up the whole layer/],
    ["a film of water boils", thin(0.001), { net: 800 }, "water.layerDepth", /too thin/],
    [
      "a cast's layer boils",
      { water: { cast: [level(0, 20), level(1, 10)] } },
      { net: 5000 },
      "water.cast",
      /too thin/,
    ],
    [
      "a cell floods",
      { water: { ...thin(5).water, below: { temperature: 9, salinity: 35 } }, method: { model: "column" } },
      { rain: 90_000 },
      "method.cellSize",
      /cannot hold its rain/,
    ],
  ])("is refused by name where %s", (_, change, flux, path, message) => {
    const { net, ...rates } = flux;
    const steady = (value: number) => plain.storm.time.map(() => value);
    const storm = {
      ...plain.storm,
      ...Object.fromEntries(Object.entries(rates).map(([name, value]) => [name, steady(value)])),
      ...(net !== undefined && { heat: { net: steady(net) } }),
    };
    const refused = () => estimate({ ...plain, ...change, storm });
    expect(refused).toThrow(ScenarioInvalid);
    expect(refused).toThrow(message);
    expect(refused).toThrow(`${path}: `);
  });
});

function thin(layerDepth: number, salinity = 35) {
  return { water: { temperature: 18, salinity, layerDepth } };
}

function level(depth: number, temperature: number) {
  return { depth, temperature, salinity: 35 };
}
