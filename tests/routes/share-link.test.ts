import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

let tenants: Tenants;
let server: RunningServer;
let revision: string;
let consultant: HttpClient;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  const { organisation, project, memo, revision: id } = tenants.parameters;
  revision = `/o/${organisation}/projects/${project}/memos/${memo}/revisions/${id}`;
  const { email, password } = tenants.people.consultant;
  consultant = await new HttpClient(server.url).signIn(email, password);
});

afterAll(async () => {
  await server?.stop();
  tenants?.remove();
});

/** The path of a new link, as its maker is shown it. */
async function makeLink(): Promise<string> {
  const page = await (await consultant.post(revision, { intent: "share", recipient: "A client", days: "7" })).text();
  const address = /value="(http[^"]*\/s\/[^"]+)"/.exec(page)?.[1];
  if (!address) throw new Error("The page shows no address.");
  return new URL(address).pathname;
}

async function open(path: string): Promise<{ client: HttpClient; shared: string }> {
  const client = new HttpClient(server.url);
  const response = await client.get(path);
  return { client, shared: response.headers.get("Location") ?? "" };
}

test("a link trades its token for a cookie and opens the page and the PDF without an account", async () => {
  const { client, shared } = await open(await makeLink());
  expect(shared).toMatch(/^\/shared\/[0-9a-z]+$/);
  const page = await client.get(shared);
  expect(page.status).toBe(200);
  expect(page.headers.get("Referrer-Policy")).toBe("no-referrer");
  expect(page.headers.get("X-Robots-Tag")).toContain("noindex");
  expect(page.headers.get("Cache-Control")).toContain("no-store");
  const pdf = await client.get(`${shared}/memo.pdf`);
  expect(pdf.headers.get("Content-Type")).toBe("application/pdf");
  expect(
    Buffer.from(await pdf.arrayBuffer())
      .subarray(0, 5)
      .toString(),
  ).toBe("%PDF-");
});

test("the page gives away nothing but the revision: no address inside, no names of other work", async () => {
  const { client, shared } = await open(await makeLink());
  const page = await (await client.get(shared)).text();
  expect(page).not.toContain(`/o/${tenants.parameters.organisation}`);
  expect(page).not.toContain(tenants.parameters.project);
  expect((await client.get(revision)).headers.get("Location")).toMatch(/^\/sign-in/);
});

test("without the link's own cookie its clean address is nothing", async () => {
  const { shared } = await open(await makeLink());
  expect((await new HttpClient(server.url).get(shared)).status).toBe(404);
  const other = await open(await makeLink());
  expect((await other.client.get(shared)).status, "another link's visitor").toBe(404);
});

test("a token that is not one, and one that was revoked, get the same answer", async () => {
  const path = await makeLink();
  const { client, shared } = await open(path);
  await consultant.post(revision, { intent: "revoke", link: shared.split("/")[2] });
  expect((await client.get(shared)).status).toBe(404);
  expect((await client.get(`${shared}/memo.pdf`)).status).toBe(404);
  const said = async (address: string) => {
    const response = await new HttpClient(server.url).get(address);
    return [response.status, /<h1[^>]*>(.*?)<\/h1>/.exec(await response.text())?.[1]];
  };
  expect(await said(path)).toEqual(await said(`/s/${"x".repeat(43)}`));
});

test("tokens are stored as hashes and never logged", async () => {
  const token = (await makeLink()).split("/")[2];
  await open(`/s/${token}`);
  const { default: sqlite3 } = await import("sqlite3");
  const database = new sqlite3.Database(server.databaseFile, sqlite3.OPEN_READONLY);
  const hashes = await new Promise<string[]>((resolve, reject) =>
    database.all<{ tokenHash: string }>("SELECT tokenHash FROM shareLinks", (error, rows) =>
      error ? reject(error) : resolve(rows.map(({ tokenHash }) => tokenHash)),
    ),
  );
  await new Promise((resolve) => database.close(resolve));
  expect(hashes.length).toBeGreaterThan(0);
  for (const hash of hashes) expect(hash).toMatch(/^[0-9a-f]{64}$/);
  expect(server.logs()).not.toContain(token);
});
