import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

const CAST = [
  "% Start latitude,-33.5",
  "% Start longitude,151.2",
  "pressure (dbar),temperature (°C),conductivity (mS/cm),note",
  "0,20.0,47.6,a",
  "10,19.9,47.5,b",
  "30,15.0,42.6,c",
  "60,12.0,39.7,d",
].join("\n");

let tenants: Tenants;
let server: RunningServer;
let consultant: HttpClient;
let water: string;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { organisation, project } = tenants.parameters;
  water = `/o/${organisation}/projects/${project}/water`;
  const { email, password } = tenants.people.consultant;
  consultant = await new HttpClient(server.url).signIn(email, password);
});

afterAll(async () => {
  await server.stop();
  tenants.remove();
});

function upload(content: string | Uint8Array<ArrayBuffer>, name = "cast.csv"): Promise<Response> {
  const form = new FormData();
  form.set("file", new File([content], name));
  return consultant.post(`${water}/casts/new`, form);
}

async function begin(content = CAST): Promise<string> {
  const answer = await upload(content);
  expect(answer.status).toBe(302);
  return answer.headers.get("Location") ?? "";
}

async function page(path: string): Promise<string> {
  const answer = await consultant.get(path);
  expect(answer.status).toBe(200);
  return answer.text();
}

describe("importing a cast", () => {
  it("says what was understood, draws it, and keeps the original to the byte", async () => {
    const sheet = await page(await begin());
    expect(sheet).toContain("from conductivity, by the Practical Salinity Scale of 1978");
    expect(sheet).toContain('role="img"');
    expect(sheet).toContain("By a step of 0.03 kg/m³");
    expect(sheet).toContain("Columns left out: <!-- -->note");
    const file = /href="([^"]*\/files\/[0-9a-z]+)"/.exec(sheet)?.[1] ?? "";
    const original = await consultant.get(file);
    expect(original.headers.get("Content-Disposition")).toMatch(/^attachment; filename="cast.csv"/);
    expect(await original.text()).toBe(CAST);
  });

  it("becomes a water column once it is confirmed; its page is the sheet", async () => {
    const sheet = await begin();
    const unnamed = await consultant.post(sheet, { intent: "confirm", name: "", source: "Survey" });
    expect(unnamed.status).toBe(400);
    expect(await unnamed.text()).toContain("Write the name of the column.");
    const confirmed = await consultant.post(sheet, { intent: "confirm", name: "Off the bar", source: "Survey" });
    expect([confirmed.status, confirmed.headers.get("Location")]).toEqual([302, water]);
    const list = await page(water);
    expect(list).toContain("Off the bar");
    expect(list).toContain("Cast of 4 levels");
    const column = new RegExp(`href="(${water}/[0-9a-z]{21})"[^>]*>Off the bar`).exec(list)?.[1] ?? "";
    expect((await consultant.get(column)).headers.get("Location")).toBe(sheet);
    const typedOver = await consultant.post(column, { name: "Off the bar", temperature: "1" });
    expect([typedOver.status, typedOver.headers.get("Location")]).toEqual([302, sheet]);
    const again = await consultant.post(sheet, { intent: "remove" });
    expect(again.headers.get("Location")).toBe(water);
    expect(await page(water)).not.toContain("Off the bar");
    expect((await consultant.get(sheet)).status).toBe(404);
  });

  it("reads again where an answer changed, before anything is confirmed", async () => {
    const sheet = await begin();
    const answered = await consultant.post(sheet, {
      intent: "confirm",
      temperatureScale: "IPTS-68",
      name: "A",
      source: "B",
    });
    expect(answered.status).toBe(200);
    expect(await answered.text()).toContain("IPTS-68, turned to ITS-90");
    const wrong = await consultant.post(sheet, { intent: "read", latitude: "91" });
    expect(wrong.status).toBe(400);
    expect(await wrong.text()).toContain("A latitude lies between −90° and 90°.");
  });

  it.each([
    ["an image", new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]), /PNG image/],
    ["an empty file", "", /is empty/],
    ["a wind record", "time (UTC),wind speed (m/s)\n2026-11-04T00:00Z,5\n", /no line of column names/],
  ])("refuses %s beside the field, and saves nothing", async (_, content, message) => {
    const before = await page(water);
    const answer = await upload(content);
    expect(answer.status).toBe(400);
    const words = await answer.text();
    expect(words).toMatch(message);
    expect(words).toContain("nothing was saved");
    const waiting = (html: string) => html.match(/casts\/[0-9a-z]{21}/g)?.length;
    expect(waiting(await page(water))).toBe(waiting(before));
  });

  it("answers 404 for a cast that is not there, also to a form", async () => {
    expect((await consultant.get(`${water}/casts/none`)).status).toBe(404);
    expect((await consultant.post(`${water}/casts/none`, { intent: "confirm" })).status).toBe(404);
  });
});
