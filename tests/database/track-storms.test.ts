import { afterAll, beforeEach, describe, expect, it } from "vitest";
import type { Project } from "~/db/models/project.server";
import type { Storm } from "~/db/models/storm.server";
import type { TestOrganisation } from "../factories/project";
import { openOwnDatabase } from "../setup/own-database";

const database = openOwnDatabase();
const { makeBox, makeOrganisation, makeProject } = await import("../factories/project");
const { answerTrack, openTrackQuestions, saveTrack, startTrackStorm } = await import("~/storms/track-storm.server");
const { addConstant } = await import("~/storms/constant-record.server");
const { CONSTANT_KINDS } = await import("~/storms/constant-kinds");
const { copyAsScenario } = await import("~/storms/copy-as-scenario.server");
const { changeWindow } = await import("~/storms/set-window.server");
const { listStorms } = await import("~/storms/list-storms.server");
const { removeStorm } = await import("~/storms/remove-record.server");
const { readStorm } = await import("~/estimates/read-storm.server");
const { middleOf } = await import("~/estimates/gather-scenario.server");

afterAll(() => database.remove());

const AT = "2026-12-01T00:00:00.000Z";
/** Invented. */
const line = (hour: number, longitude: number, basin = "SH97") =>
  `${basin.slice(0, 2)}, ${basin.slice(2)}, 20260301${String(hour).padStart(2, "0")},   , BEST,   0, 180S, ${longitude}E,  90,  955, TY,  34, NEQ, 110,  90,  60,  80, 1008,  180,  20,   0,   0,   S,   0,    ,   0,   0,     PELLAN, D,`;
const ONE = [line(0, 1500), line(6, 1490), line(12, 1480), line(18, 1470)].join("\n");
const TWO = [ONE, line(0, 1600, "SH98"), line(6, 1610, "SH98")].join("\n");

let organisation: TestOrganisation;
let project: Project;

beforeEach(async () => {
  organisation = await makeOrganisation();
  project = await makeProject(organisation);
});

const saved = () => ({ by: organisation.userId, at: AT });
const begin = (text = ONE) =>
  startTrackStorm(organisation.tenant, project.id, {
    name: "",
    original: { name: "deck.dat", bytes: new TextEncoder().encode(text), origin: "file" },
    saved: saved(),
  });

async function again(storm: Storm): Promise<Storm> {
  const found = await organisation.tenant.storms.find(storm.id);
  if (!found) throw new Error("The storm has gone.");
  return found;
}

const read = (storm: Storm, place: [number, number]) => readStorm(organisation.tenant, storm, "linear", "UTC", place);

describe("a storm from a track", () => {
  it("takes its window from the track and is another storm at each place, the same each time", async () => {
    const storm = await again(await begin());
    expect(storm.name).toContain("PELLAN");
    expect([storm.startsAt, storm.endsAt]).toEqual([Date.UTC(2026, 2, 1) / 1000, Date.UTC(2026, 2, 1, 18) / 1000]);
    const near = await read(storm, [148.5, -18.3]);
    const far = await read(storm, [152, -20]);
    expect(near.problems).toEqual([]);
    expect(near.assumptions[0]).toMatch(/^Wind is parametric, computed from the track of PELLAN/);
    expect(near.scenarioStorm?.cyclone).toMatchObject({ parametricWind: true, radiusOfMaximumWind: 20 * 1852 });
    expect(near.scenarioStorm?.windHeight).toBe(10);
    expect(Math.max(...(near.scenarioStorm?.windSpeed ?? []))).toBeGreaterThan(30);
    expect(near.hash).not.toBe(far.hash);
    expect((await read(storm, [148.5, -18.3])).hash).toBe(near.hash);
  });

  it("has another hash with other parameters, and the former with the former", async () => {
    const storm = await again(await begin());
    const track = storm.track;
    if (!track) throw new Error("No track was taken.");
    const before = await read(storm, [148.5, -18.3]);
    await saveTrack(organisation.tenant, storm, { ...track, parameters: { ...track.parameters, inflowAngle: 15 } });
    expect((await read(await again(storm), [148.5, -18.3])).hash).not.toBe(before.hash);
    await saveTrack(organisation.tenant, storm, track);
    expect((await read(await again(storm), [148.5, -18.3])).hash).toBe(before.hash);
  });

  it("gives way to records: a constant rain takes the climatology's place, the wind stays", async () => {
    const storm = await again(await begin());
    const rain = CONSTANT_KINDS.find(({ channel }) => channel === "rain");
    if (!rain) throw new Error("No rain among the constants.");
    await addConstant(organisation.tenant, storm, {
      kind: rain,
      value: 3,
      replace: false,
      confirmedBy: organisation.userId,
      confirmedAt: AT,
    });
    const { scenarioStorm } = await read(await again(storm), [148.5, -18.3]);
    expect(new Set(scenarioStorm?.rain?.slice(0, -1))).toEqual(new Set([3]));
    expect(scenarioStorm?.cyclone?.parametricWind).toBe(true);
  });

  it("moves its window within the track, and is not copied as a scenario", async () => {
    const storm = await again(await begin());
    const startsAt = Date.UTC(2026, 2, 1, 3) / 1000;
    await changeWindow(organisation.tenant, storm, { startsAt, endsAt: storm.endsAt ?? 0 }, "UTC");
    expect((await again(storm)).startsAt).toBe(startsAt);
    const beyond = { startsAt: startsAt - 86_400, endsAt: storm.endsAt ?? 0 };
    await expect(changeWindow(organisation.tenant, storm, beyond, "UTC")).rejects.toThrow(/start there or later/);
    const changes = { windFactor: 1.2, rainFactor: 1, shiftHours: 0 };
    await expect(
      copyAsScenario(organisation.tenant, storm, { name: "", changes, requestedBy: organisation.userId }),
    ).rejects.toThrow(/change the track or its parameters/);
  });

  it("asks which of two storms a file means, and computes nothing before", async () => {
    const storm = await again(await begin(TWO));
    expect([storm.track, storm.startsAt]).toEqual([null, null]);
    expect((await openTrackQuestions(organisation.tenant, storm)).map(({ key }) => key)).toEqual(["storm"]);
    await expect(answerTrack(organisation.tenant, storm, {}, saved())).rejects.toThrow("Choose one.");
    await answerTrack(organisation.tenant, storm, { storm: "SH982026" }, saved());
    expect((await again(storm)).track?.fixes).toHaveLength(2);
  });

  it("refuses what is no track or has one fix, and leaves nothing behind", async () => {
    await expect(begin("time,wind\n2024-03-01,5")).rejects.toThrow(/no best track/);
    await expect(begin(line(0, 1500))).rejects.toThrow(/at least two fixes/);
    expect(await organisation.tenant.storms.count({ projectId: project.id })).toBe(0);
    expect(await organisation.tenant.sourceFiles.count({ projectId: project.id })).toBe(0);
  });

  it("is named parametric in the list, and takes its file along when it goes", async () => {
    const box = await makeBox(organisation.tenant, project.id);
    const storm = await again(await begin());
    const [listed] = await listStorms(organisation.tenant, project.id);
    expect(listed.trackAt).toBe(`parametric wind from a track, at ${box.name}`);
    expect((await read(storm, middleOf(box))).forcing).not.toBeNull();
    await removeStorm(organisation.tenant, storm);
    expect(await organisation.tenant.sourceFiles.count({ projectId: project.id })).toBe(0);
  });
});
