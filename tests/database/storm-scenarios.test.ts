import { afterAll, beforeEach, describe, expect, it } from "vitest";
import type { Project } from "~/db/models/project.server";
import type { Storm } from "~/db/models/storm.server";
import type { TestOrganisation } from "../factories/project";
import { openOwnDatabase } from "../setup/own-database";

const database = openOwnDatabase();
const { makeOrganisation, makeProject } = await import("../factories/project");
const { startRecord, startStorm } = await import("~/storms/start-record.server");
const { readingSheet } = await import("~/storms/reading-sheet.server");
const { confirmRecord } = await import("~/storms/confirm-record.server");
const { copyAsScenario } = await import("~/storms/copy-as-scenario.server");
const { listStorms } = await import("~/storms/list-storms.server");
const { loadSeries } = await import("~/storms/load-series.server");
const { addConstant } = await import("~/storms/constant-record.server");
const { changeWindow } = await import("~/storms/set-window.server");
const { removeRecord, removeStorm } = await import("~/storms/remove-record.server");
const { CONSTANT_KINDS } = await import("~/storms/constant-kinds");

afterAll(() => database.remove());

const at = (hour: number) => Date.UTC(2026, 10, 4, hour) / 1000;
const CONFIRMED_AT = "2026-12-01T00:00:00.000Z";
const WIND = [
  "time (UTC),wind speed at 10 m (m/s),wind direction from (deg)",
  "2026-11-04T00:00Z,5,200",
  "2026-11-04T01:00Z,10,210",
  "2026-11-04T02:00Z,50,220",
  "2026-11-04T03:00Z,7,230",
].join("\n");
const original = (name: string, text: string) => ({
  name,
  bytes: new TextEncoder().encode(text),
  origin: "file" as const,
});
const changes = { windFactor: 1.2, rainFactor: 2, shiftHours: 24 };

let organisation: TestOrganisation;
let project: Project;
let storm: Storm;

async function again(stormId: string): Promise<Storm> {
  const found = await organisation.tenant.storms.find(stormId);
  if (!found) throw new Error("The storm has gone.");
  return found;
}

async function valuesOf(stormId: string, channel: "windSpeed" | "windFrom" | "rain"): Promise<number[]> {
  const [series] = await loadSeries(organisation.tenant, stormId, [channel]);
  return series ? [...series.values] : [];
}

const copy = (given: Partial<typeof changes> = {}, name = "") =>
  copyAsScenario(organisation.tenant, storm, {
    name,
    changes: { ...changes, ...given },
    requestedBy: organisation.userId,
  });

/** Wind from a file, and a constant rain of 3 mm/h. */
beforeEach(async () => {
  organisation = await makeOrganisation();
  project = await makeProject(organisation);
  const { tenant, userId } = organisation;
  const record = await startStorm(tenant, project, "Gale", original("wind.csv", WIND), userId);
  await confirmRecord(tenant, await again(record.stormId), record, {
    window: { startsAt: at(0), endsAt: at(3) },
    choices: {},
    confirmedBy: userId,
    confirmedAt: CONFIRMED_AT,
    zone: "UTC",
  });
  storm = await again(record.stormId);
  const [kind] = CONSTANT_KINDS;
  await addConstant(tenant, storm, { kind, value: 3, replace: false, confirmedBy: userId, confirmedAt: CONFIRMED_AT });
});

describe("a storm copied as a scenario", () => {
  it("has its wind and rain scaled and everything moved in time, and leaves the storm as it is", async () => {
    const scenario = await copy();
    expect(await valuesOf(scenario.id, "windSpeed")).toEqual([6, 12, 60, 8.4]);
    expect(await valuesOf(scenario.id, "windFrom")).toEqual([200, 210, 220, 230]);
    expect(await valuesOf(scenario.id, "rain")).toEqual([6, 6, 6, 6]);
    const [wind] = await loadSeries(organisation.tenant, scenario.id, ["windSpeed"]);
    expect(wind.time[0]).toBe(at(24));
    expect(scenario).toMatchObject({ startsAt: at(24), endsAt: at(27) });
    expect(scenario.name.replaceAll("\u00a0", " ")).toBe("Gale, wind × 1.2, rain × 2, 24 h later");
    expect(await valuesOf(storm.id, "windSpeed")).toEqual([5, 10, 50, 7]);
    const lines = await listStorms(organisation.tenant, project.id);
    expect(lines.map(({ scenarioOf }) => scenarioOf)).toEqual(["Gale", null]);
  });

  it("keeps the original when the storm that was copied goes", async () => {
    const scenario = await copy();
    await removeStorm(organisation.tenant, storm);
    const records = await organisation.tenant.records.list({ where: { stormId: scenario.id } });
    const sources = records.flatMap(({ sourceFileId }) => sourceFileId ?? []);
    expect(sources).toHaveLength(1);
    expect(await organisation.tenant.sourceFiles.find(sources[0])).not.toBeNull();
  });

  it("moves its window, and its constants with it, still scaled and still told as such", async () => {
    const scenario = await copy({ shiftHours: 0 });
    await changeWindow(organisation.tenant, scenario, { startsAt: at(1), endsAt: at(2) }, "UTC");
    expect(await valuesOf(scenario.id, "rain")).toEqual([6, 6]);
    const constants = await organisation.tenant.records.list({ where: { stormId: scenario.id, origin: "constant" } });
    expect(constants[0].provenance).toMatchObject({
      steps: [{ label: "rain rate × 2 for the scenario", channel: "rain" }],
      scenario: { of: "Gale", rainFactor: 2 },
    });
  });

  it("takes no records of its own, and lets none go or be read anew", async () => {
    const { tenant, userId } = organisation;
    const scenario = await copy();
    const [kind] = CONSTANT_KINDS;
    const request = { kind, value: 1, replace: true, confirmedBy: userId, confirmedAt: CONFIRMED_AT };
    await expect(addConstant(tenant, scenario, request)).rejects.toThrow(/keeps the records/);
    await expect(startRecord(tenant, scenario, original("more.csv", WIND), userId)).rejects.toThrow(
      /keeps the records/,
    );
    const records = await tenant.records.list({ where: { stormId: scenario.id }, order: [["createdAt", "ASC"]] });
    expect(records).toHaveLength(2);
    for (const record of records) {
      await expect(removeRecord(tenant, scenario, record)).rejects.toThrow(/keeps the records/);
      expect(await readingSheet(tenant, scenario, record)).toBeNull();
    }
    expect(await valuesOf(scenario.id, "windSpeed")).toEqual([6, 12, 60, 8.4]);
  });

  it("refuses a wind that no sea has met, beside the factor, and saves nothing", async () => {
    await expect(copy({ windFactor: 2.5 })).rejects.toMatchObject({
      field: "windFactor",
      messages: [expect.stringContaining("write 2.40 or less")],
    });
    await expect(copy({}, "Gale")).rejects.toMatchObject({ field: "scenarioName" });
    expect(await organisation.tenant.storms.count({ projectId: project.id })).toBe(1);
  });

  it("numbers a second copy, and can be copied itself", async () => {
    const first = await copy({ shiftHours: 0 });
    const second = await copy({ shiftHours: 0 });
    expect(second.name).toBe(`${first.name} (2)`);
    const third = await copyAsScenario(organisation.tenant, first, {
      name: "Half again",
      changes: { windFactor: 0.5, rainFactor: 1, shiftHours: 1 },
      requestedBy: organisation.userId,
    });
    expect(await valuesOf(third.id, "windSpeed")).toEqual([3, 6, 30, 4.2]);
  });
});
