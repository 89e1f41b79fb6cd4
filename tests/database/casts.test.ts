import { afterAll, beforeEach, describe, expect, it } from "vitest";
import type { Project } from "~/db/models/project.server";
import type { TestOrganisation } from "../factories/project";
import { openOwnDatabase } from "../setup/own-database";

const database = openOwnDatabase();
const { makeOrganisation, makeProject, makeWater } = await import("../factories/project");
const { startCast, levelsOf, castBehind } = await import("~/water/stored-cast.server");
const { castSheet, changeCastAnswers } = await import("~/water/cast-sheet.server");
const { confirmCast } = await import("~/water/confirm-cast.server");
const { removeCast, removeColumn } = await import("~/water/remove-column.server");
const { readWater } = await import("~/estimates/read-water.server");
const { DEFAULT_UNITS } = await import("~/units/unit-choices");

afterAll(() => database.remove());

/** Mixed to 20 m, then colder by a degree each 5 m. */
const LEVELS = Array.from({ length: 21 }, (_, k) => ({ depth: 5 * k, temperature: 20 - Math.max(0, k - 4) }));
const DOWN = LEVELS.map(({ depth, temperature }) => `${depth},${temperature},35`);
const CAST = ["depth (m),temperature (°C),salinity (PSS-78)", ...DOWN].join("\n");
const UP = LEVELS.slice(0, -1)
  .reverse()
  .map(({ depth, temperature }) => `${depth},${temperature + 1},35`);

let organisation: TestOrganisation;
let project: Project;

beforeEach(async () => {
  organisation = await makeOrganisation();
  project = await makeProject(organisation);
});

const original = (text: string, name = "cast.csv") => ({
  name,
  bytes: new TextEncoder().encode(text),
  origin: "file" as const,
});
const begin = (text = CAST) => startCast(organisation.tenant, project.id, original(text), organisation.userId);
const confirmation = (values: { name?: string; layerDepth?: number | null } = {}) => ({
  name: "Outer bay",
  source: "Cast of the survey",
  layerDepth: null,
  confirmedBy: organisation.userId,
  confirmedAt: "2026-12-01T00:00:00.000Z",
  ...values,
});
const shared = { zone: "UTC", units: DEFAULT_UNITS };

async function confirmed(text = CAST, values = {}) {
  const cast = await begin(text);
  const columnId = await confirmCast(organisation.tenant, project.id, cast, confirmation(values));
  return (await organisation.tenant.waterColumns.find(columnId))!;
}

describe("a cast that is begun", () => {
  it("saves nothing where nothing can be read", async () => {
    await expect(begin("time,wind\n2031-01-01,5\n")).rejects.toMatchObject({ field: "file" });
    expect(await organisation.tenant.sourceFiles.count()).toBe(0);
    expect(await organisation.tenant.casts.count()).toBe(0);
  });

  it("counts for nothing before it is confirmed, and goes with its original", async () => {
    const cast = await begin();
    expect(await organisation.tenant.waterColumns.count({ projectId: project.id })).toBe(0);
    const sheet = await castSheet(organisation.tenant, cast, shared);
    expect(sheet.ready).toBe(true);
    expect(sheet.cast.first).toHaveLength(3);
    expect(sheet.cast.last.at(-1)?.depth).toBe("100.00");
    await removeCast(organisation.tenant, cast);
    expect(await organisation.tenant.sourceFiles.count()).toBe(0);
  });

  it("is not found by another organisation", async () => {
    const cast = await begin();
    const { tenant } = await makeOrganisation();
    expect(await tenant.casts.find(cast.id)).toBeNull();
  });
});

describe("a confirmed cast", () => {
  it("is a water column with its levels, its layer and how it was read", async () => {
    const column = await confirmed();
    expect(column).toMatchObject({ name: "Outer bay", salinityScale: "practical", salinity: 35 });
    expect(column.temperature).toBeCloseTo(20, 2);
    // 0.03 kg/m³ is a tenth of a degree at 20 °C, so just beneath the last mixed level.
    expect(column.layerDepth).toBeGreaterThan(20);
    expect(column.layerDepth).toBeLessThan(21);
    const { id } = (await castBehind(organisation.tenant, column.id))!;
    const cast = (await organisation.tenant.casts.find(id))!;
    expect(Array.from(levelsOf(cast, "practical").depth)).toEqual(LEVELS.map(({ depth }) => depth));
    expect(cast.provenance).toMatchObject({ rows: 21, half: "down", shallowest: 0, deepest: 100, layerDepth: null });
  });

  it("is what an estimate is asked with, level by level, on its own scale", async () => {
    const { scenarioWater, registered } = await readWater(organisation.tenant, await confirmed());
    expect(scenarioWater).toEqual({ cast: LEVELS.map((level) => ({ ...level, practicalSalinity: 35 })) });
    expect(registered.cast).toMatchObject({ levels: 21, fileName: "cast.csv" });
    expect(registered.cast?.sha256).toMatch(/^[0-9a-f]{64}$/);
  });

  it("keeps a depth of the layer that was set by hand", async () => {
    const column = await confirmed(CAST, { layerDepth: 12 });
    expect(column.layerDepth).toBe(12);
    expect((await readWater(organisation.tenant, column)).scenarioWater).toMatchObject({ layerDepth: 12 });
  });

  it("may be confirmed again with other answers, which make its water another", async () => {
    const column = await confirmed([CAST, ...UP].join("\n"));
    const before = await readWater(organisation.tenant, column);
    const cast = (await castBehind(organisation.tenant, column.id))!;
    await changeCastAnswers(organisation.tenant, cast, { half: "up" });
    expect((await readWater(organisation.tenant, column)).scenarioWater).toEqual(before.scenarioWater);
    const answered = (await organisation.tenant.casts.find(cast.id))!;
    expect(await confirmCast(organisation.tenant, project.id, answered, confirmation())).toBe(column.id);
    const after = await readWater(organisation.tenant, (await organisation.tenant.waterColumns.find(column.id))!);
    expect(after.hash).not.toBe(before.hash);
    expect(await organisation.tenant.waterColumns.count({ projectId: project.id })).toBe(1);
  });

  it("is refused beside the name where another column has it, and nothing is written", async () => {
    await makeWater(organisation.tenant, project.id, { name: "Outer bay" });
    const cast = await begin();
    await expect(confirmCast(organisation.tenant, project.id, cast, confirmation())).rejects.toMatchObject({
      field: "name",
    });
    expect((await organisation.tenant.casts.find(cast.id))?.waterColumnId).toBeNull();
  });

  it("is refused without salinity", async () => {
    const cast = await begin("depth (m),temperature (°C)\n0,20\n10,18\n");
    await expect(confirmCast(organisation.tenant, project.id, cast, confirmation())).rejects.toThrow(
      "Questions are open",
    );
  });

  it("goes with its column, and the original with the last that uses it", async () => {
    const first = await confirmed();
    const second = await confirmed(CAST, { name: "The same again" });
    await removeColumn(organisation.tenant, first.id);
    expect(await organisation.tenant.casts.count()).toBe(1);
    expect(await organisation.tenant.sourceFiles.count()).toBe(1);
    await removeColumn(organisation.tenant, second.id);
    expect(await organisation.tenant.casts.count()).toBe(0);
    expect(await organisation.tenant.sourceFiles.count()).toBe(0);
  });
});

it("a column that was typed has no cast behind it", async () => {
  const column = await makeWater(organisation.tenant, project.id);
  expect(await castBehind(organisation.tenant, column.id)).toBeNull();
  expect((await readWater(organisation.tenant, column)).scenarioWater).toMatchObject({ layerDepth: 14 });
});
