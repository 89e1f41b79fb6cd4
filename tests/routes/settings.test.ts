import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

let tenants: Tenants;
let server: RunningServer;
let admin: HttpClient;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { email, password } = tenants.people.admin;
  admin = await new HttpClient(server.url).signIn(email, password);
});

afterAll(async () => {
  await server?.stop();
  tenants?.remove();
});

const SETTINGS = {
  name: "Merrow & Quill, Engineers",
  paperSize: "Letter",
  speed: "kn",
  rain: "in/h",
  length: "ft",
  distance: "nm",
  salinity: "PSS-78",
};

test("refuses what is in no list, beside the field, and saves nothing", async () => {
  const address = `/o/${tenants.parameters.organisation}/settings`;
  const response = await admin.post(address, { ...SETTINGS, speed: "furlongs" });
  expect(response.status).toBe(400);
  expect(await response.text()).toContain("Choose one of the list.");
  expect(await (await admin.get(address)).text()).not.toContain(SETTINGS.name);
});

test("units and paper follow the choice; what was issued stays as it was", async () => {
  const { organisation, project, memo, revision } = tenants.parameters;
  const home = `/o/${organisation}/projects/${project}`;
  const issued = `${home}/memos/${memo}/revisions/${revision}/memo.pdf`;
  const before = Buffer.from(await (await admin.get(issued)).arrayBuffer());
  expect((await admin.post(`/o/${organisation}/settings`, SETTINGS)).status).toBe(200);
  const storms = await (await admin.get(`${home}/storms`)).text();
  expect(storms).toMatch(/\d\.\d\skn/);
  expect(storms).not.toMatch(/\d\sm\/s/);
  const draft = Buffer.from(await (await admin.get(`${home}/memos/${memo}/draft.pdf`)).arrayBuffer());
  expect(draft.toString("latin1")).toMatch(/\/MediaBox \[0 0 612 792\]/);
  expect(Buffer.from(await (await admin.get(issued)).arrayBuffer()).equals(before)).toBe(true);
});
