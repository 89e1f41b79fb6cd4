import { afterAll, beforeAll, expect, test } from "vitest";
import { CAUTION } from "~/ocean/caution";
import { FACTORS } from "~/ocean/ensemble/factors";
import { SOURCES } from "~/ocean/sources";
import { HttpClient } from "../factories/http";
import { startServer, type RunningServer } from "../setup/run-server";

let server: RunningServer;

beforeAll(async () => {
  server = await startServer();
});

afterAll(async () => {
  await server?.stop();
});

test("every method stands on the public page, typeset, with its source and the caution", async () => {
  const response = await new HttpClient(server.url).get("/methods");
  expect(response.status).toBe(200);
  const page = await response.text();
  const text = page.replaceAll("&#x27;", "'").replaceAll("&amp;", "&").replaceAll("&lt;", "<");
  expect(text).toContain(CAUTION);
  for (const { id, title, citation, tex } of SOURCES) {
    expect(page).toContain(`<article id="${id}"`);
    expect(text).toContain(title);
    expect(text).toContain(citation);
    expect(tex.length).toBeGreaterThan(0);
  }
  for (const { name, range, when } of FACTORS) {
    for (const told of [name, range, when]) expect(text).toContain(`>${told}</td>`);
  }
  const equations = SOURCES.reduce((sum, { tex }) => sum + tex.length, 0);
  expect(page.match(/<math /g)?.length).toBeGreaterThanOrEqual(equations);
});
