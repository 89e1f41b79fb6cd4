import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { browserForTests } from "../setup/browser";
import { startServer, type RunningServer } from "../setup/run-server";

const browser = browserForTests();
let tenants: Tenants;
let server: RunningServer;

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
});

afterAll(async () => {
  await server?.stop();
  tenants?.remove();
});

test("someone without an account types a memo's stamp and holds their PDF against the one that was issued", async () => {
  const { organisation, project, memo, revision } = tenants.parameters;
  const { email, password } = tenants.people.viewer;
  const viewer = await new HttpClient(server.url).signIn(email, password);
  const address = `/o/${organisation}/projects/${project}/memos/${memo}/revisions/${revision}`;
  const stamp = /GP-[0-9A-Z]{4}-[0-9A-Z]{4}/.exec(await (await viewer.get(address)).text())?.[0] ?? "";
  const pdf = Buffer.from(await (await viewer.get(`${address}/memo.pdf`)).arrayBuffer());

  const page = await browser.newPage({ width: 360 });
  await page.goto(server.url);
  await page.getByRole("link", { name: "Verify it by its stamp" }).click();
  await page.getByLabel("Stamp").fill(stamp.toLowerCase());
  await page.getByRole("button", { name: "Verify" }).click();
  await page.getByText(`${stamp} was issued here, and no later revision has been.`).waitFor();

  const hold = (buffer: Buffer) =>
    page.getByLabel("Your file").setInputFiles({ name: "memo.pdf", mimeType: "application/pdf", buffer });
  await hold(pdf);
  await page.getByText("memo.pdf is, byte for byte, the PDF that was issued.").waitFor();
  const altered = Buffer.from(pdf);
  altered[altered.length >> 1] ^= 1;
  await hold(altered);
  await page.getByText("memo.pdf is not the PDF that was issued under this stamp").waitFor();
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
});
