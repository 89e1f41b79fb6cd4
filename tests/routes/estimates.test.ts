import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";
import type { Response as EstimateResponse } from "~/ocean/response";

let tenants: Tenants;
let server: RunningServer;
let consultant: HttpClient;
let home: string;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { organisation, project } = tenants.parameters;
  home = `/o/${organisation}/projects/${project}`;
  const { email, password } = tenants.people.consultant;
  consultant = await new HttpClient(server.url).signIn(email, password);
});

afterAll(async () => {
  await server.stop();
  tenants.remove();
});

const cell = () => `cell:${tenants.parameters.box}:${tenants.parameters.storm}`;
const response = () => `${home}/estimates/${tenants.parameters.estimate}`;

async function page(path: string): Promise<string> {
  const answer = await consultant.get(path);
  expect(answer.status).toBe(200);
  return answer.text();
}

describe("the ledger", () => {
  it("shows the figure that the address asks for, and remembers it", async () => {
    expect(await page(`${home}?show=netDisplacement`)).toMatch(/<option value="netDisplacement" selected="">/);
    expect(await page(`${home}?show=nonsense`)).toMatch(/<option value="surfaceSalinity" selected="">/);
  });

  it("runs a cell and comes back to the figure that was shown", async () => {
    const answer = await consultant.post(`${home}?index&show=peakDrift`, { run: cell() });
    expect(answer.status).toBe(302);
    expect(answer.headers.get("Location")).toBe(`${home}?show=peakDrift`);
  });

  it.each([
    ["nothing", {}, "Choose what to run."],
    ["no cell", { run: "cell:a" }, "Choose what to run."],
    ["a box that is not there", { run: `cell:nobox:nostorm` }, "no longer there"],
    ["a column that is not there", { waterColumnId: "none", run: "all" }, "This water column is no longer there"],
    ["a sheet that is not there", { methodSheetId: "none", run: "all" }, "This method sheet is no longer there"],
  ])("answers 400 in words when asked to run %s", async (_, fields, words) => {
    const answer = await consultant.post(`${home}?index`, fields);
    expect(answer.status).toBe(400);
    expect(await answer.text()).toContain(words);
  });

  it("gives itself as CSV with units in its header and a line for each box and storm", async () => {
    const answer = await consultant.get(`${home}/ledger.csv`);
    expect(answer.headers.get("Content-Disposition")).toMatch(/^attachment; filename="[^"]+-ledger\.csv"/);
    const [header, ...lines] = (await answer.text()).trimEnd().split("\r\n");
    expect(header).toContain("lowest surface salinity (g/kg)");
    expect(lines.length).toBeGreaterThan(0);
    expect(new Set(lines.map((line) => line.split(",").slice(0, 2).join())).size).toBe(lines.length);
  });
});

describe("a response", () => {
  it("is given as JSON exactly as the engine made it, and its series as CSV", async () => {
    const json = (await (await consultant.get(`${response()}/response.json`)).json()) as EstimateResponse;
    expect(Object.keys(json).sort()).toEqual(
      [
        "headline",
        "series",
        "fitNotes",
        "recommendedModel",
        "recommendation",
        "method",
        "bands",
        "uncertainty",
        "memberFigures",
        "budgets",
        "inputs",
        "engine",
        "caution",
      ].sort(),
    );
    const csv = await (await consultant.get(`${response()}/series.csv`)).text();
    const [header, first, ...rest] = csv.trimEnd().split("\r\n");
    expect(header).toContain("surface Absolute Salinity (g/kg)");
    expect(first.startsWith(`${json.series.time[0]},`)).toBe(true);
    expect(rest).toHaveLength(json.series.time.length - 1);
    expect(header).toContain("surface temperature, 10th percentile (°C)");
    expect(json.uncertainty?.computed).toBe(200);
  });

  it("is set beside what it would be without suspect values", async () => {
    expect(await page(response())).toContain("without-suspect");
    const html = await page(`${response()}/without-suspect`);
    expect(html).toContain("Headline figures with and without suspect values");
    expect(html.match(/<td>Peak wind stress<\/td>/g)).toHaveLength(1);
    expect(html).toContain("Not for navigation");
  });

  it("tells its inputs by file and hash, its cautions and its sources", async () => {
    const html = await page(response());
    expect(html).toMatch(/SHA-256 (<!-- -->)?[0-9a-f]{64}/);
    expect(html).toContain("Not for navigation, search and rescue, evacuation or any emergency decision");
    expect(html).toContain("Equations and sources");
  });

  it.each(["", "/response.json", "/series.csv", "/without-suspect"])(
    "of another address is not found: %s",
    async (file) => {
      expect((await consultant.get(`${home}/estimates/nothing${file}`)).status).toBe(404);
    },
  );
});

describe("method sheets", () => {
  const sheets = () => `/o/${tenants.parameters.organisation}/method-sheets`;

  it("are refused at the field, and nothing is saved", async () => {
    const answer = await consultant.post(`${sheets()}/new`, { name: "Wild", gravity: "heavy" });
    expect(answer.status).toBe(400);
    expect(await answer.text()).toContain("Must be a number from 9.7 to 9.9 m/s²; it is the text");
    expect(await page(sheets())).not.toContain("Wild");
  });

  it("are saved as versions", async () => {
    for (const model of ["slab", "budget"]) {
      expect((await consultant.post(`${sheets()}/new`, { name: "Gentle", model })).status).toBe(302);
    }
    expect(await page(sheets())).toMatch(/Gentle<\/strong>, version (<!-- -->)?2/);
  });

  it("carry the members and the seed of their ensemble", async () => {
    const fields = { name: "Ranged", model: "slab", members: "64", seed: "5" };
    const refused = await consultant.post(`${sheets()}/new`, { ...fields, members: "6.5" });
    expect(refused.status).toBe(400);
    expect(await refused.text()).toContain("Must be a whole number.");
    expect((await consultant.post(`${sheets()}/new`, fields)).status).toBe(302);
    expect(await page(sheets())).toContain("range from 64 members, seed 5");
    expect((await consultant.post(`${sheets()}/new`, { ...fields, seed: "" })).status).toBe(302);
    expect(await page(sheets())).toContain("range from 64 members, seed 1");
  });
});
