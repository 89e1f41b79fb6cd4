import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

let tenants: Tenants;
let server: RunningServer;
let consultant: HttpClient;
let viewer: HttpClient;
let project: string;
let storm: string;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { parameters, people } = tenants;
  project = `/o/${parameters.organisation}/projects/${parameters.project}`;
  storm = `${project}/storms/${parameters.storm}/quality`;
  consultant = await new HttpClient(server.url).signIn(people.consultant.email, people.consultant.password);
  viewer = await new HttpClient(server.url).signIn(people.viewer.email, people.viewer.password);
});

afterAll(async () => {
  await server.stop();
  tenants.remove();
});

async function page(path: string, client = consultant): Promise<string> {
  const answer = await client.get(path);
  expect(answer.status).toBe(200);
  return (await answer.text()).replaceAll("<!-- -->", "");
}

const firstSample = (html: string) => /name="sample" value="([^"]+)"/.exec(html)?.[1] ?? "";
const firstAct = (html: string) => (/name="act" value="([^"]+)"/.exec(html)?.[1] ?? "").replaceAll("&quot;", '"');

describe("the quality of a storm", () => {
  it("shows counts, plots with their key, what each test did, and what was not done", async () => {
    const html = await page(storm);
    for (const words of [
      "Flags by channel",
      "No gap in the window",
      "gross range",
      "Tests that were not made",
      "location",
    ]) {
      expect(html).toContain(words);
    }
    expect(html).toContain('role="img"');
  });

  it("filters, pages, and gives the same samples as CSV", async () => {
    const all = await page(`${storm}?flag=all&channel=windSpeed&page=2`);
    expect(all).toMatch(/Page 2 of \d+/);
    expect(all).not.toContain("<td>rain rate</td>");
    const found = Number(/>(\d+) samples\./.exec(all)?.[1]);
    const csv = await consultant.get(`${storm}/flags.csv?flag=all&channel=windSpeed`);
    expect(csv.headers.get("Content-Type")).toBe("text/csv; charset=utf-8");
    expect((await csv.text()).trimEnd().split("\r\n")).toHaveLength(found + 1);
    expect(await page(`${storm}?from=soon`)).toContain("Write a date and a time");
  });

  it("lets a person set a flag with a reason, keeps who and why, and gives it back to the tests", async () => {
    const query = `${storm}?flag=all&channel=windSpeed`;
    const sample = firstSample(await page(query));
    const set = { intent: "set-flags", which: "ticked", sample, setFlag: "4" };
    const unreasoned = await consultant.post(query, { ...set, reason: " " });
    expect(unreasoned.status).toBe(400);
    expect(await unreasoned.text()).toContain("Write the reason");
    expect((await consultant.post(query, { ...set, setFlag: "9", reason: "Bird." })).status).toBe(400);
    expect((await consultant.post(query, { ...set, sample: "windSpeed@1", reason: "Bird." })).status).toBe(400);

    const done = await consultant.post(query, { ...set, reason: "Bird on the mast." });
    expect([done.status, done.headers.get("Location")]).toEqual([302, query]);
    const after = await page(`${storm}?flag=set`);
    expect(after).toContain("Bird on the mast. (The consultant)");
    expect(await (await consultant.get(`${storm}/flags.csv?flag=set`)).text()).toContain("Bird on the mast.");
    expect(await page(`${project}/estimates/${tenants.parameters.estimate}`)).toContain("out of date: storm changed");

    const back = { intent: "take-back", act: firstAct(after) };
    expect((await consultant.post(storm, back)).status).toBe(302);
    const returned = await page(`${storm}?flag=set`);
    expect(returned).toContain("No sample is found.");
    expect(returned).toContain("back to the tests");
    expect(returned).toContain("no longer stands");
    const twice = await consultant.post(storm, back);
    expect(twice.status).toBe(400);
    expect(await twice.text()).toContain("no longer stand");
    expect(await page(`${project}/estimates/${tenants.parameters.estimate}`)).not.toContain("out of date");
  });

  it("sets all that the filter finds", async () => {
    const query = `${storm}?flag=all&channel=windSpeed&to=2000-01-01+00:00`;
    const none = await consultant.post(query, {
      intent: "set-flags",
      which: "found",
      setFlag: "3",
      reason: "Doubtful.",
    });
    expect(none.status).toBe(400);
    const rain = `${storm}?flag=all&channel=rain`;
    const found = Number(/>(\d+) samples\./.exec(await page(rain))?.[1]);
    await consultant.post(rain, { intent: "set-flags", which: "found", setFlag: "3", reason: "Gauge in the lee." });
    const html = await page(`${storm}?flag=3&channel=rain`);
    expect(html).toContain(`>${found} samples.`);
    expect(html).toContain(`${found} samples of rain rate`);
    await consultant.post(storm, { intent: "take-back", act: firstAct(html) });
  });

  it("refuses where too much is missing until a person takes it on, and again once that is withdrawn", async () => {
    expect((await consultant.post(storm, { intent: "take-on-missing", missingReason: "Only one." })).status).toBe(400);
    const rain = `${storm}?flag=all&channel=rain`;
    await consultant.post(rain, { intent: "set-flags", which: "found", setFlag: "4", reason: "Gauge clogged." });
    const estimate = `${project}/estimates/${tenants.parameters.estimate}`;
    expect(await page(storm)).toContain("No estimate of this storm is made as it is");
    expect((await consultant.post(storm, { intent: "take-on-missing", missingReason: "" })).status).toBe(400);
    await consultant.post(storm, { intent: "take-on-missing", missingReason: "Rain matters little here." });
    const taken = await page(storm);
    expect(taken).toContain("by The consultant");
    expect(taken).toContain("Rain matters little here.");
    expect(taken).not.toContain("No estimate of this storm is made as it is");
    await consultant.post(storm, { intent: "withdraw-missing" });
    expect(await page(storm)).toContain("No estimate of this storm is made as it is");
    await consultant.post(storm, { intent: "take-back", act: firstAct(await page(storm)) });
    expect(await page(estimate)).not.toContain("out of date");
  });

  it("goes by thresholds that the project chose, of which each version is kept", async () => {
    const form = `${project}/thresholds?of=rain`;
    const fields = Object.fromEntries(
      [...(await page(form)).matchAll(/<input[^>]* name="(\w+)"[^>]*value="([^"]*)"/g)].map(([, name, value]) => [
        name,
        value,
      ]),
    );
    const save = (changes: Record<string, string>) =>
      consultant.post(form, { ...fields, spikeMethod: "differential", intent: "save", ...changes });
    const wrong = await save({ suspectHigh: "lots" });
    expect(wrong.status).toBe(400);
    expect(await wrong.text()).toContain('aria-invalid="true"');
    expect((await save({})).status).toBe(400);

    const saved = await save({ suspectHigh: "0.5" });
    expect([saved.status, saved.headers.get("Location")]).toEqual([302, form]);
    const flagged = await page(`${storm}?channel=rain&test=gross+range`);
    expect(flagged).toContain("version 1 of this project");
    expect(flagged).toContain("suspect above 0.5, bad outside 0 to 400 mm/h");
    expect(flagged).toContain("gross range: suspect");
    const stale = await save({ suspectHigh: "2" });
    expect(stale.status).toBe(400);
    expect(await stale.text()).toContain("Someone saved version 1");

    expect(await page(form)).toContain("Version 1, saved by The consultant");
    expect((await consultant.post(form, { intent: "reset", version: "1" })).status).toBe(302);
    expect(await page(`${storm}?channel=rain&test=gross+range`)).toContain("No sample is found.");
    expect(await page(form, viewer)).not.toContain("Save the thresholds");
  });

  it("can be seen by a viewer, who is offered nothing to change", async () => {
    const html = await page(storm, viewer);
    expect(html).toContain("Flags by channel");
    expect(html).not.toContain('name="sample"');
    expect(html).not.toContain('value="set-flags"');
    expect((await viewer.post(storm, { intent: "suspect", leaveOutSuspect: "yes" })).status).toBe(403);
  });

  it("answers 400 to a form that it does not know, and 404 for a storm that is not there", async () => {
    expect((await consultant.post(storm, { intent: "x" })).status).toBe(400);
    expect((await consultant.post(storm, { intent: "take-back", act: "nonsense" })).status).toBe(400);
    expect((await consultant.get(`${project}/storms/none/quality`)).status).toBe(404);
    expect((await consultant.get(`${project}/storms/none/quality/flags.csv`)).status).toBe(404);
  });
});
