import { createHash } from "node:crypto";
import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

let tenants: Tenants;
let server: RunningServer;
let stamp: string;
let pdfSha256: string;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { organisation, project, memo, revision } = tenants.parameters;
  const { email, password } = tenants.people.viewer;
  const viewer = await new HttpClient(server.url).signIn(email, password);
  const address = `/o/${organisation}/projects/${project}/memos/${memo}/revisions/${revision}`;
  stamp = /GP-[0-9A-Z]{4}-[0-9A-Z]{4}/.exec(await (await viewer.get(address)).text())?.[0] ?? "";
  const pdf = await (await viewer.get(`${address}/memo.pdf`)).arrayBuffer();
  pdfSha256 = createHash("sha256").update(Buffer.from(pdf)).digest("hex");
});

afterAll(async () => {
  await server?.stop();
  tenants?.remove();
});

async function verified(typed: string): Promise<string> {
  const response = await new HttpClient(server.url).get(`/verify?stamp=${encodeURIComponent(typed)}`);
  expect(response.status).toBe(200);
  expect(response.headers.get("Cache-Control")).toContain("no-store");
  // Server-rendered text is parted by comments.
  return (await response.text()).replaceAll("<!-- -->", "");
}

test("a memo is verified by its stamp without an account, however it is typed", async () => {
  for (const typed of [stamp, ` ${stamp.toLowerCase().replaceAll("-", " ")} `]) {
    const page = await verified(typed);
    expect(page).toContain(`${stamp} was issued here, and no later revision has been.`);
    expect(page).toContain(pdfSha256);
  }
});

test("nothing of what the memo says, and no address inside, is given away", async () => {
  const page = await verified(stamp);
  for (const secret of [tenants.parameters.project, tenants.parameters.memo, "/o/"]) expect(page).not.toContain(secret);
});

test("a stamp that was never given out, and what is no stamp, are told apart", async () => {
  const unknown = stamp === "GP-0000-0000" ? "GP-0000-0001" : "GP-0000-0000";
  expect(await verified(unknown)).toContain(`No memo was issued here under ${unknown}`);
  expect(await verified("revision B")).toContain("This is no stamp.");
  expect((await new HttpClient(server.url).get("/verify")).status).toBe(200);
});
