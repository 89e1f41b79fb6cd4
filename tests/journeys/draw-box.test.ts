import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { DEMO } from "../../app/db/seeders/demo-scenario";
import { browserForTests } from "../setup/browser";
import { startServer, type RunningServer } from "../setup/run-server";

const browser = browserForTests();
let server: RunningServer;

beforeAll(async () => {
  server = await startServer({ databaseFile: inject("seededDatabase") });
});

afterAll(async () => {
  await server?.stop();
});

test("a box is drawn by two clicks, undone, redone, typed further and saved; one on land is refused", async () => {
  const page = await browser.newPage({ width: 1280, height: 900, allow: [/status of 400/] });
  page.setDefaultTimeout(30_000);
  await page.goto(`${server.url}/sign-in`);
  await page.getByLabel("E-mail address").fill(DEMO.people[0].email);
  await page.getByLabel("Password").fill(DEMO.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.getByRole("link", { name: DEMO.project.name }).click();
  await page.waitForURL(/\/projects\/[0-9a-z]{21}$/);
  await page.goto(`${page.url()}/area/new`);
  const map = page.locator('.maplibregl-map[aria-busy="false"]');
  await map.waitFor();
  const corners = page.getByLabel(/^Corners/);
  const canvas = page.locator(".maplibregl-canvas");
  const { x, y, width, height } = (await canvas.boundingBox()) ?? { x: 0, y: 0, width: 0, height: 0 };

  // Open sea south of the demonstration's boxes.
  await page.mouse.click(x + width * 0.62, y + height * 0.7);
  await page.mouse.move(x + width * 0.7, y + height * 0.75, { steps: 4 });
  await page.mouse.click(x + width * 0.75, y + height * 0.82);
  await expect.poll(async () => (await corners.inputValue()).split("\n").length).toBe(4);
  await page.getByText("Inertial period").waitFor();
  const drawn = await corners.inputValue();
  await page.getByRole("button", { name: "Undo" }).click();
  await expect.poll(() => corners.inputValue()).toBe("");
  await page.getByRole("button", { name: "Redo" }).click();
  await expect.poll(() => corners.inputValue()).toBe(drawn);

  await page.getByLabel("Name").fill("Inland");
  await corners.fill("52.00 N 8.00 W\n52.00 N 7.95 W\n52.05 N 7.95 W\n52.05 N 8.00 W");
  await page.getByRole("button", { name: "Save the box" }).click();
  await page.getByText(/lies on land: 100 %/).waitFor();

  await corners.fill(drawn);
  await page.getByLabel("Name").fill("Drawn by hand");
  await page.getByRole("button", { name: "Save the box" }).click();
  await page.waitForURL(/\/area$/);
  await page.getByRole("heading", { name: "Drawn by hand" }).waitFor();
});
