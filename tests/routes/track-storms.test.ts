import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

/** Invented. */
const HEADED = [
  "AL972031,             PELLAN,      3,",
  "20310831, 1800,  , HU, 27.0N, 179.0W,  90,  960,  100,   90,   60,   80,   50,   40,   30,   40,   25,   20,   15,   20,   25",
  "20310901, 0000,  , HU, 28.0N, 179.5W,  95,  955,  100,   90,   60,   80,   50,   40,   30,   40,   25,   20,   15,   20,   25",
  "20310901, 0600,  , HU, 29.0N, 180.0W,  90,  960,  100,   90,   60,   80,   50,   40,   30,   40,   25,   20,   15,   20,   25",
].join("\n");

let tenants: Tenants;
let server: RunningServer;
let consultant: HttpClient;
let storms: string;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { organisation, project } = tenants.parameters;
  storms = `/o/${organisation}/projects/${project}/storms`;
  const { email, password } = tenants.people.consultant;
  consultant = await new HttpClient(server.url).signIn(email, password);
});

afterAll(async () => {
  await server.stop();
  tenants.remove();
});

type Fix = [time: string, latitude: string, longitude: string, pressure: string, wind: string, radius: string];

function typed(fixes: Fix[], name = ""): FormData {
  const form = new FormData();
  form.set("intent", "typed");
  form.set("name", name);
  const columns = ["time", "latitude", "longitude", "centralPressure", "maxWind", "radiusOfMaximumWind"];
  for (const fix of fixes) columns.forEach((column, at) => form.append(column, fix[at]));
  return form;
}

async function page(path: string): Promise<string> {
  const answer = await consultant.get(path);
  expect(answer.status).toBe(200);
  return answer.text();
}

describe("a storm from a track", () => {
  it("comes from a file: its page is parametric throughout, its series are those of the box", async () => {
    const form = new FormData();
    form.set("intent", "file");
    form.set("file", new File([HEADED], "track.txt"));
    const begun = await consultant.post(`${storms}/tracks/new`, form);
    expect(begun.status).toBe(302);
    const track = begun.headers.get("Location") ?? "";
    const sheet = await page(track);
    expect(sheet).toContain("Parametric wind: computed from the fixes below");
    expect(sheet).toContain("parametric, computed from the track at the middle of");
    const storm = track.replace(/\/track$/, "");
    expect(await page(storm)).toContain("Wind is parametric, computed from the track of PELLAN");
    expect(await page(storms)).toContain("parametric wind from a track, at");
    const csv = await page(`${storm}/series.csv`);
    expect(csv.split("\n").length).toBeGreaterThan(72);
  });

  it("is typed; what is wrong is told beside its cell, and nothing is saved", async () => {
    const wrong = await consultant.post(
      `${storms}/tracks/new`,
      typed([
        ["2026-03-01 00:00", "-18", "150", "955", "45", ""],
        ["2026-02-01 00:00", "-98", "149", "", "", ""],
      ]),
    );
    expect(wrong.status).toBe(400);
    const told = await wrong.text();
    expect(told).toContain("Must come after the fix above.");
    expect(told).toContain("Write -60 to 60 °.");
    const right = await consultant.post(
      `${storms}/tracks/new`,
      typed(
        [
          ["2026-03-01 00:00", "-18", "150", "955", "45", ""],
          ["", "", "", "", "", ""],
          ["2026-03-02 00:00", "-19", "149", "", "", ""],
        ],
        "Typed cyclone",
      ),
    );
    expect(right.status).toBe(302);
    const sheet = await page(right.headers.get("Location") ?? "");
    expect(sheet).toContain("The fixes were typed.");
  });

  it("keeps parameters, refuses those beyond their range beside the field, and what is no track", async () => {
    const begun = await consultant.post(
      `${storms}/tracks/new`,
      typed([
        ["2026-03-01 00:00", "-18", "150", "955", "45", "40"],
        ["2026-03-02 00:00", "-19", "149", "950", "48", "35"],
      ]),
    );
    const parameters = {
      B: "",
      radiusOfMaximumWind: "60",
      ambientPressure: "1010",
      averagingFactor: "0.93",
      reduction: "0.9",
      inflowAngle: "15",
      asymmetry: "1",
      airDensity: "1.15",
    };
    const form = typed([
      ["2026-03-01 00:00", "-18", "150", "955", "45", "40"],
      ["2026-03-02 00:00", "-19", "149", "950", "48", "35"],
    ]);
    form.set("intent", "save");
    form.set("parameter-profile", "holland2010");
    for (const [name, value] of Object.entries(parameters)) form.set(`parameter-${name}`, value);
    const track = begun.headers.get("Location") ?? "";
    expect((await consultant.post(track, form)).status).toBe(302);
    expect(await page(track)).toContain('name="parameter-inflowAngle" value="15"');
    form.set("parameter-inflowAngle", "95");
    const refused = await consultant.post(track, form);
    expect(refused.status).toBe(400);
    expect(await refused.text()).toContain("Write 0 to 45 °.");
    const file = new FormData();
    file.set("intent", "file");
    file.set("file", new File(["time,wind\n2024-03-01,5"], "wind.csv"));
    const none = await consultant.post(`${storms}/tracks/new`, file);
    expect(none.status).toBe(400);
    expect(await none.text()).toContain("is no best track");
  });
});
