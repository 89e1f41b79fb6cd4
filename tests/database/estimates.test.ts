import { copyFileSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, beforeEach, describe, expect, inject, it } from "vitest";
import type { Project } from "~/db/models/project.server";
import type { StudyBox } from "~/db/models/study-box.server";
import type { Storm } from "~/db/models/storm.server";
import type { WaterColumn } from "~/db/models/water-column.server";
import type { TestOrganisation } from "../factories/project";

const folder = mkdtempSync(path.join(tmpdir(), "galeprint-estimates-"));

/** The database layer reads its file from the environment once, so everything that touches it is imported after. */
async function rooms() {
  process.env.DATABASE_FILE = path.join(folder, "galeprint.sqlite");
  process.env.DATA_DIRECTORY = folder;
  process.env.LOG_LEVEL = "silent";
  copyFileSync(inject("migratedDatabase"), process.env.DATABASE_FILE);
  return {
    ...(await import("../factories/project")),
    ...(await import("~/db/connection.server")),
    ...(await import("~/estimates/count-states.server")),
    ...(await import("~/estimates/estimate-state")),
    ...(await import("~/estimates/load-ledger.server")),
    ...(await import("~/estimates/load-response.server")),
    ...(await import("~/estimates/pool.server")),
    ...(await import("~/estimates/result-store.server")),
    ...(await import("~/estimates/run-queue.server")),
    ...(await import("~/estimates/save-method-sheet.server")),
    ...(await import("~/estimates/start-estimates.server")),
    ...(await import("~/ocean/estimate")),
    ...(await import("~/services/shutdown.server")),
  };
}

let use: Awaited<ReturnType<typeof rooms>>;
let organisation: TestOrganisation;
let project: Project;
let box: StudyBox;
let storm: Storm;
let water: WaterColumn;

beforeAll(async () => {
  use = await rooms();
});

afterAll(async () => {
  await use.closeEverything();
  await use.closeDatabase();
  rmSync(folder, { recursive: true, force: true });
});

beforeEach(async () => {
  organisation = await use.makeOrganisation();
  project = await use.makeProject(organisation);
  box = await use.makeBox(organisation.tenant, project.id);
  storm = await use.makeStorm(organisation, project.id);
  water = await use.makeWater(organisation.tenant, project.id);
});

async function run(choice = {}): Promise<string> {
  const cell = { studyBoxId: box.id, stormId: storm.id };
  const [id] = await use.startEstimates(organisation.tenant, project.id, organisation.userId, [cell], choice);
  await use.queueIsEmpty();
  return id;
}

async function load(id: string) {
  const loaded = await use.loadResponse(organisation.tenant, project, id);
  if (!loaded) throw new Error("The estimate is gone.");
  return loaded;
}

const sentence = async (id: string) => use.stateSentence((await load(id)).state);

describe("an estimate", () => {
  it("runs in a worker thread and is stored as the engine gave it", async () => {
    const id = await run();
    const { response, state, register, forcing } = await load(id);
    expect(state).toEqual({ kind: "current" });
    const { gatherScenario } = await import("~/estimates/gather-scenario.server");
    const estimate = await organisation.tenant.estimates.find(id);
    const gathered = estimate && (await gatherScenario(organisation.tenant, estimate, "UTC"));
    if (!gathered?.scenario) throw new Error("Nothing was gathered.");
    expect(response).toEqual(use.estimate(gathered.scenario));
    expect(response?.inputs).toBe(gathered.hash);
    expect(estimate?.number).toBe(1);
    expect(forcing?.time).toHaveLength(121);
    expect(register.storm.records[0]).toMatchObject({ sha256: expect.stringMatching(/^[0-9a-f]{64}$/) as string });
  });

  it("keeps a column's profiles whole", async () => {
    await use.saveMethodSheet(
      organisation.tenant,
      "Column",
      { model: "column", timeStep: 900, gradientMixing: false },
      null,
    );
    const sheet = await organisation.tenant.methodSheets.first({ where: { name: "Column" } });
    const { response } = await load(await run({ methodSheetId: sheet?.id }));
    if (!response?.column) throw new Error("No column came back.");
    const { depth, time, temperature } = response.column;
    expect(temperature).toHaveLength(time.length);
    expect(temperature.every((profile) => profile.length === depth.length)).toBe(true);
    const stored = await organisation.tenant.results.first({ where: { inputHash: response.inputs } });
    expect(stored?.response).not.toHaveProperty("column");
  });

  it("goes out of date by an edit, says which input changed, and is current again when the edit is taken back", async () => {
    const id = await run();
    const { tenant } = organisation;
    const finished = (await load(id)).estimate.finishedAt;

    await tenant.waterColumns.update(water.id, { salinity: 33.1 });
    expect(await sentence(id)).toBe("out of date: water column changed");
    expect((await load(id)).register.water.salinity).toBe(33.6);
    await tenant.studyBoxes.update(box.id, { waterDepth: 30 });
    expect(await sentence(id)).toBe("out of date: study box and water column changed");
    await tenant.waterColumns.update(water.id, { salinity: 33.6 });
    await tenant.studyBoxes.update(box.id, { triggerLevels: [], waterDepth: 22 });
    expect(await sentence(id)).toBe("out of date: trigger levels changed");
    await tenant.studyBoxes.update(box.id, { triggerLevels: box.triggerLevels });
    expect(await sentence(id)).toBe("current");

    await tenant.storms.update(storm.id, { endsAt: (storm.endsAt ?? 0) - 3600 });
    const shortened = await load(id);
    expect(use.stateSentence(shortened.state)).toBe("out of date: storm changed");
    expect(shortened.forcing).toBeNull();
    await tenant.storms.update(storm.id, { endsAt: storm.endsAt });
    const again = await load(id);
    expect(again.state).toEqual({ kind: "current" });
    expect(again.estimate.finishedAt).toEqual(finished);
  });

  it("finds its earlier response without a run after another was run in between", async () => {
    const id = await run();
    const first = (await load(id)).response?.inputs;
    await organisation.tenant.waterColumns.update(water.id, { salinity: 33.1 });
    await run();
    expect((await load(id)).response?.inputs).not.toBe(first);
    await organisation.tenant.waterColumns.update(water.id, { salinity: 33.6 });
    const back = await load(id);
    expect(back.state).toEqual({ kind: "current" });
    expect(back.response?.inputs).toBe(first);
  });

  it("is not touched by a new name of its box, storm or column", async () => {
    const id = await run();
    await organisation.tenant.studyBoxes.update(box.id, { name: "Renamed" });
    await organisation.tenant.waterColumns.update(water.id, { name: "Renamed" });
    const { state, register } = await load(id);
    expect(state).toEqual({ kind: "current" });
    expect(register.box.name).toBe("Renamed");
  });

  it("fails in words where the storm pauses too long, and says when that changed", async () => {
    const { tenant } = organisation;
    const wind = await tenant.series.first({ where: { stormId: storm.id, channel: "windSpeed" } });
    if (!wind) throw new Error("No wind.");
    await tenant.storms.update(storm.id, { endsAt: (storm.endsAt ?? 0) + 9 * 3600 });
    const id = await run();
    const { state } = await load(id);
    expect(state).toMatchObject({ kind: "failed", problems: [{ code: "GAP", path: "storm.windSpeed" }] });
    expect(use.needsRun(state)).toBe(false);
    expect((await load(id)).response).toBeNull();
    await tenant.storms.update(storm.id, { endsAt: storm.endsAt });
    expect(await sentence(id)).toBe("failed; since then storm changed");
    expect(use.needsRun((await load(id)).state)).toBe(true);
  });

  it("passes on what the engine refuses", async () => {
    await use.saveMethodSheet(organisation.tenant, "Coast", { model: "coastal" }, null);
    const sheet = await organisation.tenant.methodSheets.first({ where: { name: "Coast" } });
    await organisation.tenant.studyBoxes.update(box.id, { shoreNormal: null });
    const { state } = await load(await run({ methodSheetId: sheet?.id }));
    expect(state).toMatchObject({ kind: "failed", problems: [{ path: "box.shoreNormal", code: "INVALID_INPUT" }] });
  });

  it("remembers its column and sheet for the next run", async () => {
    const other = await use.makeWater(organisation.tenant, project.id, { salinity: 34 });
    const id = await run({ waterColumnId: other.id });
    await run();
    expect((await load(id)).estimate.waterColumnId).toBe(other.id);
  });
});

describe("a window beyond the wind record", () => {
  it("takes currency from an estimate that was run before it was widened", async () => {
    const id = await run();
    await organisation.tenant.storms.update(storm.id, { endsAt: (storm.endsAt ?? 0) + 9 * 3600 });
    expect(await sentence(id)).toBe("out of date: storm changed");
    expect((await load(id)).response).not.toBeNull();
  });
});

describe("starting", () => {
  it("the same cell twice at once runs it once", async () => {
    const cell = { studyBoxId: box.id, stormId: storm.id };
    const start = () => use.startEstimates(organisation.tenant, project.id, organisation.userId, [cell]);
    const ids = (await Promise.all([start(), start(), start()])).flat();
    await use.queueIsEmpty();
    expect(new Set(ids).size).toBe(1);
    expect(await organisation.tenant.results.count()).toBe(1);
  });

  it("numbers the estimates of a project one after another", async () => {
    const second = await use.makeStorm(organisation, project.id, { peakWind: 12 });
    const cells = [storm, second].map(({ id }) => ({ studyBoxId: box.id, stormId: id }));
    await use.startEstimates(organisation.tenant, project.id, organisation.userId, cells);
    await use.queueIsEmpty();
    const numbers = (await organisation.tenant.estimates.list()).map(({ number }) => number).sort();
    expect(numbers).toEqual([1, 2]);
    expect(await use.countStates(organisation.tenant, project.id)).toBe("2 current");
  });

  it("refuses another organisation's box, and leaves nothing behind", async () => {
    const other = await use.makeOrganisation();
    const foreign = await use.makeBox(other.tenant, (await use.makeProject(other)).id);
    const cells = [
      { studyBoxId: box.id, stormId: storm.id },
      { studyBoxId: foreign.id, stormId: storm.id },
    ];
    const start = use.startEstimates(organisation.tenant, project.id, organisation.userId, cells);
    await expect(start).rejects.toBeInstanceOf(use.CannotStart);
    expect(await organisation.tenant.estimates.count()).toBe(0);
  });

  it("says what must come first", async () => {
    await organisation.tenant.waterColumns.remove({ id: water.id });
    await expect(run()).rejects.toThrow("Describe the water first");
  });
});

describe("after a stop", () => {
  it("what was queued or running is run again", async () => {
    const id = await run();
    const { tenant } = organisation;
    await tenant.waterColumns.update(water.id, { salinity: 33.2 });
    await tenant.estimates.update(id, { state: "running" });
    expect(await sentence(id)).toBe("running");
    await use.resumeEstimates();
    await use.queueIsEmpty();
    expect(await sentence(id)).toBe("current");
  });
});

describe("another organisation", () => {
  it("sees neither the estimate nor its stored response", async () => {
    const id = await run();
    const { response } = await load(id);
    const other = await use.makeOrganisation();
    expect(await use.loadResponse(other.tenant, project, id)).toBeNull();
    const key = { inputHash: response?.inputs ?? "", engineVersion: response?.engine ?? "" };
    expect(await use.resultIsStored(organisation.tenant, key)).toBe(true);
    expect(await use.resultIsStored(other.tenant, key)).toBe(false);
    expect(await use.readResponse(other.tenant, key)).toBeNull();
  });
});

describe("the ledger", () => {
  it("shows every pair that was run with its state, and nothing of other projects", async () => {
    await run();
    const elsewhere = await use.makeProject(organisation);
    await use.makeBox(organisation.tenant, elsewhere.id);
    const ledger = await use.loadLedger(organisation.tenant, project);
    expect(ledger.boxes.map(({ id }) => id)).toEqual([box.id]);
    expect(ledger.cells).toHaveLength(1);
    expect(ledger.cells[0].state).toEqual({ kind: "current" });
    expect(ledger.cells[0].response).not.toHaveProperty("series");
  });
});

describe("method sheets", () => {
  it("begin a next version under the same name, unless they say the same", async () => {
    const { tenant } = organisation;
    const save = (choices: object, ensemble: { members: number; seed: number } | null = null) =>
      use.saveMethodSheet(tenant, "Gentle", choices, ensemble);
    expect(await save({ model: "slab" })).toEqual({ version: 1, changed: true });
    expect(await save({ model: "slab" })).toEqual({ version: 1, changed: false });
    expect(await save({ model: "budget" })).toEqual({ version: 2, changed: true });
    expect(await save({ model: "budget" }, { members: 64, seed: 1 })).toEqual({ version: 3, changed: true });
    expect(await save({ model: "budget" }, { members: 64, seed: 1 })).toEqual({ version: 3, changed: false });
  });
});
