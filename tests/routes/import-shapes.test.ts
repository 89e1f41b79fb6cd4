import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

let tenants: Tenants;
let server: RunningServer;
let consultant: HttpClient;
let area: string;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { email, password } = tenants.people.consultant;
  consultant = await new HttpClient(server.url).signIn(email, password);
  area = `/o/${tenants.parameters.organisation}/projects/${tenants.parameters.project}/area`;
});

afterAll(async () => {
  await server?.stop();
  tenants?.remove();
});

/** A square of sea far from any land. */
const RING = [
  [-30, 40],
  [-29.9, 40],
  [-29.9, 40.1],
  [-30, 40.1],
];
const GEOJSON = JSON.stringify({
  type: "Feature",
  properties: { name: "Imported lease" },
  geometry: { type: "Polygon", coordinates: [[...RING, RING[0]]] },
});

test("a pasted shape is shown, nothing is saved before it is chosen, then it is a study box", async () => {
  const shown = await consultant.post(`${area}/import`, { intent: "read", pasted: GEOJSON });
  expect(shown.status).toBe(200);
  expect(await shown.text()).toContain("Imported lease");
  expect(await (await consultant.get(area)).text()).not.toContain("Imported lease");
  const chosen = { intent: "save", "take-0": "on", "name-0": "Imported lease", "ring-0": JSON.stringify(RING) };
  const saved = await consultant.post(`${area}/import`, chosen);
  expect(saved.status).toBe(302);
  expect(await (await consultant.get(area)).text()).toContain("Imported lease");
});

test("one shape that is refused keeps all from being saved, and says why", async () => {
  const answer = await consultant.post(`${area}/import`, {
    intent: "save",
    "take-0": "on",
    "name-0": "A second lease",
    "ring-0": JSON.stringify(RING),
    "take-1": "on",
    "name-1": "Imported lease",
    "ring-1": JSON.stringify(RING),
  });
  expect(answer.status).toBe(400);
  const page = await answer.text();
  expect(page).toContain("Another box of this project has this name.");
  expect(page).toContain("Nothing was saved.");
  expect(await (await consultant.get(area)).text()).not.toContain("A second lease");
});

test("what is no shape is refused with the reason; choosing nothing is told", async () => {
  const lines = JSON.stringify({ type: "LineString", coordinates: RING });
  const refused = await consultant.post(`${area}/import`, { intent: "read", pasted: lines });
  expect(refused.status).toBe(400);
  expect(await refused.text()).toContain("The file has no polygon: it holds 1 lines.");
  const none = await consultant.post(`${area}/import`, { intent: "save" });
  expect(none.status).toBe(400);
  expect(await none.text()).toContain("Choose at least one shape.");
});
