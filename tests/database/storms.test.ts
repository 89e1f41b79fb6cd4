import { readFileSync } from "node:fs";
import { afterAll, beforeEach, describe, expect, it } from "vitest";
import type { Project } from "~/db/models/project.server";
import type { StormRecord } from "~/db/models/record.server";
import type { Storm } from "~/db/models/storm.server";
import type { TestOrganisation } from "../factories/project";
import { openOwnDatabase } from "../setup/own-database";

const database = openOwnDatabase();
const { makeOrganisation, makeProject } = await import("../factories/project");
const { startRecord, startStorm } = await import("~/storms/start-record.server");
const { changeAnswers, readingSheet } = await import("~/storms/reading-sheet.server");
const { confirmRecord } = await import("~/storms/confirm-record.server");
const { loadSeries } = await import("~/storms/load-series.server");
const { addConstant } = await import("~/storms/constant-record.server");
const { changeWindow } = await import("~/storms/set-window.server");
const { removeRecord, removeStorm } = await import("~/storms/remove-record.server");
const { renameStorm } = await import("~/storms/rename-storm.server");
const { CONSTANT_KINDS } = await import("~/storms/constant-kinds");

afterAll(() => database.remove());

const HOUR = 3600;
const BUOY = readFileSync(new URL("../factories/files/invented-storm-buoy.txt", import.meta.url));
const BUOY_START = Date.UTC(2024, 8, 11, 0, 50) / 1000;

const WIND = [
  "time (UTC),wind speed at 10 m (m/s),wind direction from (deg)",
  "2026-11-04T00:00Z,5,200",
  "2026-11-04T01:00Z,9,210",
  "2026-11-04T02:00Z,,220",
  "2026-11-04T03:00Z,12,230",
  "2026-11-04T04:00Z,7,240",
].join("\n");
const OTHER_WIND = WIND.replace(",12,230", ",30,230");
const RAIN = "time (UTC),rain (mm/h)\n2026-11-04T00:00Z,1\n2026-11-04T02:00Z,3\n2026-11-04T04:00Z,0\n";

function file(name: string, content: string | Uint8Array) {
  const bytes = typeof content === "string" ? new TextEncoder().encode(content) : new Uint8Array(content);
  return { name, bytes, origin: "file" as const };
}

let organisation: TestOrganisation;
let project: Project;

beforeEach(async () => {
  organisation = await makeOrganisation();
  project = await makeProject(organisation);
});

const confirmation = (window: { startsAt: number; endsAt: number }, choices = {}) => ({
  window,
  choices,
  confirmedBy: organisation.userId,
  confirmedAt: "2026-12-01T00:00:00.000Z",
  zone: "UTC",
});

const at = (hour: number) => Date.UTC(2026, 10, 4, hour) / 1000;
const DAY_START = { startsAt: at(0), endsAt: at(4) };

async function begin(name: string, content: string | Uint8Array): Promise<{ storm: Storm; record: StormRecord }> {
  const record = await startStorm(organisation.tenant, project, "", file(name, content), organisation.userId);
  return { record, storm: await again(record.stormId) };
}

async function again(stormId: string): Promise<Storm> {
  const storm = await organisation.tenant.storms.find(stormId);
  if (!storm) throw new Error("The storm has gone.");
  return storm;
}

/** A storm with the wind file confirmed. */
async function windy(): Promise<{ storm: Storm; record: StormRecord }> {
  const { storm, record } = await begin("wind.csv", WIND);
  await confirmRecord(organisation.tenant, storm, record, confirmation(DAY_START));
  return { storm: await again(storm.id), record };
}

async function valuesOf(stormId: string, channel: "windSpeed" | "rain"): Promise<number[]> {
  const [series] = await loadSeries(organisation.tenant, stormId, [channel]);
  return series ? Array.from(series.values) : [];
}

describe("bringing a file", () => {
  it("keeps the original byte for byte with its hash, and a record that waits for its reading sheet", async () => {
    const { storm, record } = await begin("invented-storm-buoy.txt", BUOY);
    const source = await organisation.tenant.sourceFiles.find(record.sourceFileId ?? "");
    expect(source?.bytes.equals(BUOY)).toBe(true);
    expect(source?.size).toBe(BUOY.length);
    // sha256sum of the file in the tree.
    const { createHash } = await import("node:crypto");
    expect(source?.sha256).toBe(createHash("sha256").update(BUOY).digest("hex"));
    expect(record).toMatchObject({ state: "reading", origin: "file", answers: {}, provenance: null });
    expect(storm).toMatchObject({ name: "Storm of 2024-09-14", startsAt: null, endsAt: null });
    expect(await loadSeries(organisation.tenant, storm.id)).toEqual([]);
  });

  it("notices the same file a second time and keeps it once", async () => {
    const first = await begin("wind.csv", WIND);
    const second = await begin("copy of wind.csv", WIND);
    expect(second.record.sourceFileId).toBe(first.record.sourceFileId);
    expect(await organisation.tenant.sourceFiles.count({ projectId: project.id })).toBe(1);
    const sheet = await readingSheet(organisation.tenant, second.storm, second.record);
    expect(sheet?.alsoIn).toEqual([`${first.storm.name} (as wind.csv)`]);
    expect(second.storm.name).toBe(`${first.storm.name} (2)`);
  });

  it("saves nothing of a file that cannot be read", async () => {
    await expect(begin("photo.csv", new Uint8Array([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0]))).rejects.toThrow(
      "nothing was saved",
    );
    expect(await organisation.tenant.storms.count({ projectId: project.id })).toBe(0);
    expect(await organisation.tenant.sourceFiles.count({ projectId: project.id })).toBe(0);
  });

  it("saves nothing under a name that is taken", async () => {
    const named = (bytes: string) =>
      startStorm(organisation.tenant, project, "Gale", file("a.csv", bytes), organisation.userId);
    await named(WIND);
    await expect(named(OTHER_WIND)).rejects.toMatchObject({ field: "name" });
    expect(await organisation.tenant.storms.count({ projectId: project.id })).toBe(1);
    expect(await organisation.tenant.sourceFiles.count({ projectId: project.id })).toBe(1);
  });
});

describe("answers", () => {
  it("are kept with the record and read again from it", async () => {
    const { storm, record } = await begin("invented-storm-buoy.txt", BUOY);
    await changeAnswers(organisation.tenant, record, { windHeight: 4.1, averagingMinutes: 8 });
    const kept = await organisation.tenant.records.find(record.id);
    expect(kept?.answers).toEqual({ windHeight: 4.1, averagingMinutes: 8 });
    expect(kept && (await readingSheet(organisation.tenant, storm, kept))?.reading.windHeight).toBe(4.1);
  });

  it("that leave no time axis are kept with a reading that says so and cannot be confirmed", async () => {
    const { storm, record } = await begin("wind.csv", WIND);
    const answers = { columns: { 0: { role: "leftOut" as const } } };
    const reading = await changeAnswers(organisation.tenant, record, answers);
    expect(reading?.problems).toContainEqual(
      expect.objectContaining({ severity: "error", message: expect.stringContaining("time") }),
    );
    const kept = (await organisation.tenant.records.find(record.id))!;
    expect(kept.answers).toEqual(answers);
    await expect(confirmRecord(organisation.tenant, storm, kept, confirmation(DAY_START))).rejects.toThrow(
      "Questions are open",
    );
  });
});

describe("confirming", () => {
  it("is refused while a needed question is open, and writes nothing", async () => {
    const { storm, record } = await begin("invented-storm-buoy.txt", BUOY);
    const window = { startsAt: BUOY_START, endsAt: BUOY_START + 24 * HOUR };
    await expect(confirmRecord(organisation.tenant, storm, record, confirmation(window))).rejects.toThrow(
      "Questions are open",
    );
    expect(await loadSeries(organisation.tenant, storm.id)).toEqual([]);
    expect((await organisation.tenant.records.find(record.id))?.state).toBe("reading");
  });

  it("is refused while a row with an error is neither mended nor left out", async () => {
    const { storm, record } = await begin("gust.csv", WIND.replace(",12,230", ",400,230"));
    await expect(confirmRecord(organisation.tenant, storm, record, confirmation(DAY_START))).rejects.toThrow(
      "Questions are open",
    );
    await changeAnswers(organisation.tenant, record, { leaveOutBadRows: true });
    const answered = (await organisation.tenant.records.find(record.id))!;
    await confirmRecord(organisation.tenant, storm, answered, confirmation(DAY_START));
    expect(await valuesOf(storm.id, "windSpeed")).toEqual([5, 9, 7]);
    const { provenance } = (await organisation.tenant.records.find(record.id))!;
    expect(provenance?.dropped.reduce((sum, { count }) => sum + count, 0)).toBe(1);
  });

  it("stores each channel without its missing samples, the window, and how it was read by whom", async () => {
    const { storm, record } = await windy();
    const [speed, from] = await loadSeries(organisation.tenant, storm.id);
    expect(Array.from(speed.time, (seconds) => (seconds - at(0)) / HOUR)).toEqual([0, 1, 3, 4]);
    expect(Array.from(speed.values)).toEqual([5, 9, 12, 7]);
    expect(from.channel).toBe("windFrom");
    expect(Array.from(from.values)).toEqual([200, 210, 220, 230, 240]);
    expect(storm).toMatchObject(DAY_START);
    const kept = await organisation.tenant.records.find(record.id);
    expect(kept).toMatchObject({ state: "confirmed" });
    expect(kept?.provenance).toMatchObject({
      rows: 5,
      first: "2026-11-04T00:00:00Z",
      last: "2026-11-04T04:00:00Z",
      windHeight: 10,
      confirmedBy: organisation.userId,
      confirmedAt: "2026-12-01T00:00:00.000Z",
    });
    expect(kept?.provenance?.channels).toContainEqual(
      expect.objectContaining({ channel: "windSpeed", unit: "m/s", count: 4, missing: 1 }),
    );
  });

  it("refuses a window that the wind does not reach, beside the field, and writes nothing", async () => {
    const { storm, record } = await begin("wind.csv", WIND);
    const window = { startsAt: at(0), endsAt: at(9) };
    await expect(confirmRecord(organisation.tenant, storm, record, confirmation(window))).rejects.toMatchObject({
      field: "endsAt",
    });
    expect(await loadSeries(organisation.tenant, storm.id)).toEqual([]);
    expect((await again(storm.id)).startsAt).toBeNull();
  });

  it("may be done again with other answers without doubling anything", async () => {
    const { storm, record } = await windy();
    await changeAnswers(organisation.tenant, record, { columns: { 1: { role: "windSpeed", unit: "kn" } } });
    const answered = (await organisation.tenant.records.find(record.id))!;
    await confirmRecord(organisation.tenant, storm, answered, confirmation(DAY_START));
    expect((await valuesOf(storm.id, "windSpeed"))[0]).toBeCloseTo(5 * (1852 / 3600), 12);
    expect(await organisation.tenant.series.count({ stormId: storm.id })).toBe(2);
  });
});

describe("a second record", () => {
  async function bring(storm: Storm, name: string, content: string): Promise<StormRecord> {
    return startRecord(organisation.tenant, storm, file(name, content), organisation.userId);
  }

  it("adds the channels that the storm lacks", async () => {
    const { storm } = await windy();
    const record = await bring(storm, "gauge.csv", RAIN);
    await confirmRecord(organisation.tenant, storm, record, confirmation(DAY_START));
    expect(await valuesOf(storm.id, "rain")).toEqual([1, 3, 0]);
    expect(await valuesOf(storm.id, "windSpeed")).toEqual([5, 9, 12, 7]);
  });

  it("asks before it takes the place of a channel, and keeps the old one where told so", async () => {
    const { storm } = await windy();
    const record = await bring(storm, "other.csv", OTHER_WIND);
    const sheet = await readingSheet(organisation.tenant, storm, record);
    expect(sheet?.conflicts).toEqual([{ group: "wind", label: "wind", heldBy: "wind.csv" }]);
    await expect(confirmRecord(organisation.tenant, storm, record, confirmation(DAY_START))).rejects.toMatchObject({
      field: "choice-wind",
    });
    await expect(
      confirmRecord(organisation.tenant, storm, record, confirmation(DAY_START, { wind: "keep" })),
    ).rejects.toThrow("keeps every channel");
    expect(await valuesOf(storm.id, "windSpeed")).toEqual([5, 9, 12, 7]);
  });

  it("takes the place where told so, and when it is removed the former one is used again", async () => {
    const { storm, record: first } = await windy();
    const second = await bring(storm, "other.csv", OTHER_WIND);
    await confirmRecord(organisation.tenant, storm, second, confirmation(DAY_START, { wind: "replace" }));
    expect(await valuesOf(storm.id, "windSpeed")).toEqual([5, 9, 30, 7]);
    expect(await organisation.tenant.series.count({ stormId: storm.id, recordId: first.id })).toBe(0);

    await removeRecord(organisation.tenant, await again(storm.id), second);
    expect(await valuesOf(storm.id, "windSpeed")).toEqual([5, 9, 12, 7]);
    expect(await organisation.tenant.sourceFiles.find(second.sourceFileId ?? "")).toBeNull();
    expect(await organisation.tenant.sourceFiles.find(first.sourceFileId ?? "")).not.toBeNull();
    expect(await again(storm.id)).toMatchObject(DAY_START);
  });
});

describe("a constant", () => {
  const rain = CONSTANT_KINDS.find(({ id }) => id === "rain-in")!;
  const request = (value: number, replace = false) => ({
    kind: rain,
    value,
    replace,
    confirmedBy: organisation.userId,
    confirmedAt: "2026-12-01T00:00:00.000Z",
  });

  it("stands over the window in the channel's unit and follows it", async () => {
    const { storm } = await windy();
    await addConstant(organisation.tenant, storm, request(0.1));
    expect(await valuesOf(storm.id, "rain")).toEqual(Array(5).fill(2.54));
    await changeWindow(organisation.tenant, await again(storm.id), { startsAt: at(1), endsAt: at(3) }, "UTC");
    const [series] = await loadSeries(organisation.tenant, storm.id, ["rain"]);
    expect(Array.from(series.time, (seconds) => (seconds - at(0)) / HOUR)).toEqual([1, 2, 3]);
  });

  it("does not bound the window that it follows", async () => {
    const { storm } = await windy();
    await addConstant(organisation.tenant, storm, request(0.1));
    await changeWindow(organisation.tenant, storm, { startsAt: at(1), endsAt: at(2) }, "UTC");
    await changeWindow(organisation.tenant, await again(storm.id), DAY_START, "UTC");
    expect(await again(storm.id)).toMatchObject(DAY_START);
  });

  it("takes the place of a record's channel only when told so", async () => {
    const { storm } = await windy();
    const gauge = await startRecord(organisation.tenant, storm, file("gauge.csv", RAIN), organisation.userId);
    await confirmRecord(organisation.tenant, storm, gauge, confirmation(DAY_START));
    await expect(addConstant(organisation.tenant, storm, request(1))).rejects.toMatchObject({ field: "replace" });
    expect(await valuesOf(storm.id, "rain")).toEqual([1, 3, 0]);
    await addConstant(organisation.tenant, storm, request(1, true));
    expect(await valuesOf(storm.id, "rain")).toEqual(Array(5).fill(25.4));
  });

  it("waits for a window", async () => {
    const { storm } = await begin("wind.csv", WIND);
    await expect(addConstant(organisation.tenant, storm, request(1))).rejects.toThrow("no window yet");
  });
});

describe("removing", () => {
  it("the only record leaves a storm without a window", async () => {
    const { storm, record } = await windy();
    await removeRecord(organisation.tenant, storm, record);
    expect(await again(storm.id)).toMatchObject({ startsAt: null, endsAt: null });
    expect(await loadSeries(organisation.tenant, storm.id)).toEqual([]);
  });

  it("a storm keeps an original that another storm uses", async () => {
    const { storm, record } = await windy();
    const other = await begin("again.csv", WIND);
    await removeStorm(organisation.tenant, storm);
    expect(await organisation.tenant.sourceFiles.find(record.sourceFileId ?? "")).not.toBeNull();
    await removeStorm(organisation.tenant, other.storm);
    expect(await organisation.tenant.sourceFiles.find(record.sourceFileId ?? "")).toBeNull();
    expect(await organisation.tenant.records.count({ stormId: storm.id })).toBe(0);
  });
});

describe("names", () => {
  it("are free to be changed, but not to another storm's", async () => {
    const { storm } = await begin("a.csv", WIND);
    const other = await begin("b.csv", OTHER_WIND);
    await renameStorm(organisation.tenant, storm, "November gale");
    await expect(renameStorm(organisation.tenant, other.storm, "November gale")).rejects.toMatchObject({
      field: "name",
    });
    await expect(renameStorm(organisation.tenant, other.storm, "")).rejects.toMatchObject({ field: "name" });
    expect((await again(storm.id)).name).toBe("November gale");
  });
});

describe("another organisation", () => {
  it("finds neither storm, record, series nor original", async () => {
    const { storm, record } = await windy();
    const { tenant } = await makeOrganisation();
    expect(await tenant.storms.find(storm.id)).toBeNull();
    expect(await tenant.records.find(record.id)).toBeNull();
    expect(await tenant.sourceFiles.find(record.sourceFileId ?? "")).toBeNull();
    expect(await loadSeries(tenant, storm.id)).toEqual([]);
  });
});
