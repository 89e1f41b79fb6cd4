import { afterAll, beforeEach, describe, expect, it } from "vitest";
import type { Project } from "~/db/models/project.server";
import type { Storm } from "~/db/models/storm.server";
import { FAIL, PASS, SUSPECT } from "~/quality/flags";
import { sampleKey, type SetFlag } from "~/quality/overrides";
import type { ChannelName } from "~/readers/reading";
import type { TestOrganisation } from "../factories/project";
import { openOwnDatabase } from "../setup/own-database";

const database = openOwnDatabase();
const { makeOrganisation, makeProject } = await import("../factories/project");
const { startStorm } = await import("~/storms/start-record.server");
const { confirmRecord } = await import("~/storms/confirm-record.server");
const { copyAsScenario } = await import("~/storms/copy-as-scenario.server");
const { setFlags, takeBackAct } = await import("~/quality/set-flags.server");
const { loadQuality } = await import("~/quality/load-quality.server");
const { chooseSuspect, takeOnMissing, withdrawMissing } = await import("~/quality/take-on-missing.server");
const { saveThresholds } = await import("~/quality/save-thresholds.server");
const { namedSamples } = await import("~/quality/find-samples");
const { overrideActs, valueNowIn } = await import("~/quality/override-acts");
const { readStorm } = await import("~/estimates/read-storm.server");

afterAll(() => database.remove());

const HOURS = 30;
const at = (hour: number) => Date.UTC(2026, 10, 4, hour) / 1000;
/** A steady breeze with one spike at hour 10, and nothing from hour 18 to 19. */
const speedAt = (hour: number) => (hour === 10 ? 55 : 8 + (hour % 3));
const file = (missing: (hour: number) => boolean) => ({
  name: "wind.csv",
  bytes: new TextEncoder().encode(
    [
      "time (UTC),wind speed at 10 m (m/s),wind direction from (deg)",
      ...Array.from({ length: HOURS }, (_, hour) =>
        missing(hour) ? [] : [`${new Date(at(hour) * 1000).toISOString()},${speedAt(hour)},${200 + (hour % 5)}`],
      ).flat(),
    ].join("\n"),
  ),
  origin: "file" as const,
});

let organisation: TestOrganisation;
let project: Project;

async function makeStorm(missing: (hour: number) => boolean = () => false): Promise<Storm> {
  const { tenant, userId } = organisation;
  const record = await startStorm(tenant, project, `Gale ${Math.trunc(at(0))}`, file(missing), userId);
  const found = async () => {
    const storm = await tenant.storms.find(record.stormId);
    if (!storm) throw new Error("The storm has gone.");
    return storm;
  };
  await confirmRecord(tenant, await found(), record, {
    window: { startsAt: at(0), endsAt: at(HOURS - 1) },
    zone: "UTC",
    choices: {},
    confirmedBy: userId,
    confirmedAt: "2026-12-01T00:00:00.000Z",
  });
  return found();
}

async function again(storm: Storm): Promise<Storm> {
  const found = await organisation.tenant.storms.find(storm.id);
  if (!found) throw new Error("The storm has gone.");
  return found;
}

async function flagOf(storm: Storm, hour: number) {
  const { judged } = await loadQuality(organisation.tenant, await again(storm));
  const speed = judged.find(({ channel }) => channel === "windSpeed");
  const k = speed?.time.indexOf(at(hour)) ?? -1;
  return speed?.inForce[k];
}

/** A wind is its speed and its direction: the spike of one is the spike of the other's components. */
const BOTH: ChannelName[] = ["windSpeed", "windFrom"];

const set = (storm: Storm, hours: number[], flag: SetFlag, channels: ChannelName[] = ["windSpeed"]) =>
  setFlags(organisation.tenant, storm, {
    choose: ({ judged }) =>
      namedSamples(
        judged,
        hours.flatMap((hour) => channels.map((channel) => sampleKey(channel, at(hour)))),
      ),
    flag,
    reason: "seen on radar",
    by: organisation.userId,
  });

const read = async (storm: Storm) => readStorm(organisation.tenant, await again(storm), "linear", "UTC", null);

beforeEach(async () => {
  organisation = await makeOrganisation();
  project = await makeProject(organisation);
});

describe("flags set by a person", () => {
  it("stand in place of the tests', change what an estimate stands on, and can be taken back", async () => {
    const storm = await makeStorm();
    expect(await flagOf(storm, 10)).toBe(FAIL);
    const before = await read(storm);
    expect(await set(storm, [10], PASS, BOTH)).toBe(2);
    expect(await flagOf(storm, 10)).toBe(PASS);
    const after = await read(storm);
    expect(after.hash).not.toBe(before.hash);
    expect(Math.max(...(after.forcing?.windSpeed ?? []))).toBe(55);
    expect(after.quality.overrides).toEqual([
      expect.objectContaining({ channel: "windSpeed", flag: PASS, reason: "seen on radar", count: 1 }),
      expect.objectContaining({ channel: "windFrom", flag: PASS, reason: "seen on radar", count: 1 }),
    ]);
    const { inputs, series } = await loadQuality(organisation.tenant, storm);
    const [act] = overrideActs(inputs.overrides, valueNowIn(series));
    await takeBackAct(organisation.tenant, storm, { key: act.key, by: organisation.userId });
    expect(await flagOf(storm, 10)).toBe(FAIL);
    expect((await read(storm)).hash).toBe(before.hash);
    expect(await organisation.tenant.flagOverrides.count()).toBe(4);
  });

  it("are not set on what is missing or not there", async () => {
    const storm = await makeStorm((hour) => hour === 18);
    expect(await set(storm, [3, 4, 18, 400], SUSPECT)).toBe(2);
    await expect(set(storm, [18], PASS)).rejects.toThrow(/no value to judge/);
  });

  it("go with a copy as a scenario, on the changed values", async () => {
    const storm = await makeStorm();
    await set(storm, [10], PASS);
    await chooseSuspect(organisation.tenant, storm, true);
    const copy = await copyAsScenario(organisation.tenant, await again(storm), {
      name: "Stronger",
      changes: { windFactor: 1.1, rainFactor: 1, shiftHours: 5 },
      requestedBy: organisation.userId,
    });
    expect(await flagOf(copy, 15)).toBe(PASS);
    expect(copy.leaveOutSuspect).toBe(true);
    const [first, second] = (await organisation.tenant.flagOverrides.list()).map(({ createdBy, createdAt }) => [
      createdBy,
      createdAt,
    ]);
    expect(second).toEqual(first);
    const [registered] = (await read(copy)).quality.overrides ?? [];
    expect(registered.by).toBeTruthy();
    expect(registered.setAt).toMatch(/Z$/);
  });

  it("are never changed or removed by themselves", async () => {
    const storm = await makeStorm();
    await set(storm, [10], PASS);
    const [override] = await organisation.tenant.flagOverrides.list();
    await expect(organisation.tenant.flagOverrides.update(override.id, { reason: "another" })).rejects.toThrow();
  });
});

describe("what is missing", () => {
  it("above a quarter of the window lets no estimate be made, until a person takes it on", async () => {
    const storm = await makeStorm((hour) => hour % 8 >= 4 && hour < 25);
    expect((await read(storm)).problems.map(({ code }) => code)).toContain("MISSING");
    await takeOnMissing(organisation.tenant, storm, {
      by: "I. Renholt",
      at: "2026-12-01T00:00:00Z",
      reason: "no other",
    });
    const taken = await read(storm);
    expect(taken.problems).toEqual([]);
    expect(taken.quality.missingAccepted?.reason).toBe("no other");
    await withdrawMissing(organisation.tenant, storm);
    expect((await read(storm)).problems.map(({ code }) => code)).toContain("MISSING");
  });
});

describe("more missing than was taken on", () => {
  it("has to be taken on anew", async () => {
    const storm = await makeStorm((hour) => hour % 8 >= 4 && hour < 25);
    await takeOnMissing(organisation.tenant, storm, {
      by: "I. Renholt",
      at: "2026-12-01T00:00:00Z",
      reason: "no other",
    });
    await set(storm, [1, 2, 9, 10], FAIL);
    const { problems, quality } = await read(storm);
    expect(problems.map(({ code }) => code)).toContain("MISSING");
    expect(quality.missingAccepted?.upTo).toBeLessThan(0.5);
  });
});

describe("thresholds", () => {
  it("are saved by one of two who write at the same time, and the other is told", async () => {
    const form = new FormData();
    form.set("gustRatio", "3");
    const { tenant, userId } = organisation;
    const save = () => saveThresholds(tenant, project.id, { part: "relations", form, seen: 0, by: userId });
    const outcomes = await Promise.allSettled([save(), save()]);
    expect(outcomes.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
    expect(await tenant.thresholdSheets.count()).toBe(1);
  });
});

describe("suspect values", () => {
  it("are kept until they are said to be left out", async () => {
    const storm = await makeStorm();
    await set(storm, [3], SUSPECT);
    const kept = await read(storm);
    await chooseSuspect(organisation.tenant, storm, true);
    const left = await read(storm);
    expect(left.hash).not.toBe(kept.hash);
    expect(left.assumptions.join(" ")).toContain("suspect value");
  });
});
