import { existsSync, readFileSync, statSync } from "node:fs";
import { AxeBuilder } from "@axe-core/playwright";
import type { Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { browserForTests } from "../setup/browser";
import { startServer, type RunningServer } from "../setup/run-server";

const browser = browserForTests();
let server: RunningServer;

beforeAll(async () => {
  server = await startServer();
});

afterAll(async () => {
  await server?.stop();
});

interface Record {
  file: string;
  /** Corners of a box near the station, and what the sea is like there. */
  corners: string;
  windHeight: string;
  waterDepth: string;
}

const OWN: Record = {
  file: "tests/factories/files/invented-storm-buoy.txt",
  corners: "51.69 N 8.30 W\n51.69 N 8.25 W\n51.72 N 8.25 W\n51.72 N 8.30 W",
  windHeight: "4",
  waterDepth: "90",
};

/** A year of a Gulf of Mexico buoy with a hurricane in it; it stays outside the repository. */
const REAL: Record = {
  file: "../shared/data/buoy_txt/42040h2008.txt",
  corners: "29.15 N 88.30 W\n29.15 N 88.10 W\n29.30 N 88.10 W\n29.30 N 88.30 W",
  windHeight: "10",
  waterDepth: "165",
};

async function expectNoSideways(page: Page): Promise<void> {
  const wide = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(wide, `${page.url()} scrolls sideways`).toBeLessThanOrEqual(0);
}

async function expectAccessible(page: Page): Promise<void> {
  // The map's canvas is drawn over by its own list of boxes, which is the equal view.
  const { violations } = await new AxeBuilder({ page }).exclude(".maplibregl-map").analyze();
  expect(
    violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(" ")).join("; ")}`),
    page.url(),
  ).toEqual([]);
}

async function signUp(page: Page, email: string): Promise<void> {
  await page.goto(`${server.url}/sign-up`);
  await expectAccessible(page);
  await page.getByLabel("Organisation").fill("Lantern Rock Coastal");
  await page.getByLabel("Your name").fill("M. Orrin");
  await page.getByLabel("E-mail address").fill(email);
  await page.getByLabel("Password").fill("seven quiet tide tables");
  await page.getByRole("button", { name: "Make the account" }).click();
  await page.waitForURL(/\/o\/lantern-rock-coastal/);
}

async function beginProject(page: Page): Promise<void> {
  await page.getByRole("link", { name: "New project" }).first().click();
  await page.getByLabel("Name").fill("Lantern Rock intake");
  await page.getByLabel("Job number").fill("0412");
  await page.getByLabel("Client").fill("Lantern Rock Harbour Board");
  await page.getByRole("button", { name: "Begin the project" }).click();
  // The cautions come first.
  await page.getByText("Read the cautions and accept them").waitFor();
  await page.getByRole("checkbox").check();
  await page.getByRole("button", { name: "Begin the project" }).click();
  await page.waitForURL(/\/projects\/[0-9a-z]{21}$/);
  await expectNoSideways(page);
}

async function part(page: Page, name: string): Promise<void> {
  await page.getByRole("navigation", { name: "Parts of the project" }).getByRole("link", { name }).click();
  await page.waitForURL(new RegExp(`/${name.toLowerCase()}$`));
}

async function drawBox(page: Page, { corners, waterDepth }: Record): Promise<void> {
  await part(page, "Area");
  await page.getByRole("link", { name: "New study box" }).first().click();
  await page.getByLabel(/^Corners/).fill("52 N 8 W\n53 N 7 W\n52 N 7 W\n53 N 8 W");
  await page.getByLabel("Name").fill("Intake box");
  await page.getByRole("button", { name: "Save the box" }).click();
  await page.getByText(/cross/i).first().waitFor();
  await page.getByLabel(/^Corners/).fill(corners);
  await page.getByText("Inertial period").waitFor();
  await page.getByLabel(/^Water depth/).fill(waterDepth);
  await page.getByLabel(/^Shore normal/).fill("165");
  await page.getByLabel(/^Distance to the shore/).fill("25");
  await page.getByRole("button", { name: "Add a trigger level" }).click();
  await page.getByLabel(/^Value/).fill("34.9");
  await page.getByRole("button", { name: "Save the box" }).click();
  await page.waitForURL(/\/area$/);
  await page.locator('.maplibregl-map[aria-busy="false"]').waitFor({ timeout: 60_000 });
  await page.getByRole("heading", { name: "Intake box" }).waitFor();
  await expectNoSideways(page);
  await expectAccessible(page);
}

async function bringStorm(page: Page, { file, windHeight }: Record): Promise<void> {
  await part(page, "Storms");
  await page.getByRole("link", { name: "New storm" }).first().click();
  await page.locator('input[type="file"]').setInputFiles(file);
  await page.getByRole("button", { name: "Read it" }).click();
  await page.waitForURL(/\/records\//);
  await page.getByRole("heading", { name: /Reading sheet/ }).waitFor();
  await expectAccessible(page);
  const height = page.getByLabel(/Height of the wind/);
  await height.fill(windHeight);
  await page.getByRole("button", { name: "Answer and read again" }).click();
  await page.getByText("Nothing is open").waitFor();
  await page.getByRole("button", { name: "Confirm and plot" }).click();
  await page.waitForURL(/\/storms\/[0-9a-z]{21}$/);
  await page.locator("svg[role=img]").first().waitFor();
  await page.getByLabel(/^Or one value/).selectOption({ index: 0 });
  await page.getByLabel(/^Value, in the unit/).fill("3");
  await page.getByRole("button", { name: "Add the constant" }).click();
  await page
    .getByText(/3(\.0)?\smm\/h/)
    .first()
    .waitFor();
  await page.getByRole("img", { name: /^Wind rose/ }).waitFor();
  await page.getByRole("heading", { name: "What the storm added up to" }).waitFor();
  await expectNoSideways(page);
  await expectAccessible(page);
}

async function describeWater(page: Page): Promise<void> {
  await part(page, "Water");
  await page.getByRole("link", { name: "New water column" }).first().click();
  await page.getByLabel("Name").fill("Cast of the day before");
  await page.getByLabel("Where the numbers come from").fill("Cast C1, averaged");
  await page
    .getByLabel(/^Temperature/)
    .first()
    .fill("15");
  await page
    .getByLabel(/^Salinity/)
    .first()
    .fill("35.1");
  await page.getByLabel(/^Depth/).fill("30");
  // Lighter water below would overturn: refused beside the field.
  await page
    .getByLabel(/^Temperature/)
    .nth(1)
    .fill("19");
  await page
    .getByLabel(/^Salinity/)
    .nth(1)
    .fill("35.1");
  await page.getByRole("button", { name: /^Save/ }).click();
  await page
    .getByText(/lighter|unstable|overturn/i)
    .first()
    .waitFor();
  await page
    .getByLabel(/^Temperature/)
    .nth(1)
    .fill("11");
  await page.getByRole("button", { name: /^Save/ }).click();
  await page.waitForURL(/\/water$/);
}

async function runAndRead(page: Page): Promise<void> {
  await page.getByRole("heading", { level: 1 }).getByRole("link").click();
  await page.getByRole("button", { name: "Run all" }).click();
  await page.getByText(/g\/kg/).first().waitFor({ timeout: 60_000 });
  await expectNoSideways(page);
  await expectAccessible(page);
  await page.getByRole("link", { name: "0412-01" }).first().click();
  await page.getByRole("region", { name: "The answer" }).getByText("Peak wind stress", { exact: true }).waitFor();
  await page.getByText("Range from 200 members").waitFor();
  await page.getByText("Where the layer went").waitFor();
  await page.getByRole("heading", { name: "Fit notes" }).waitFor();
  await page.getByText("Not for navigation").first().waitFor();
  await expectNoSideways(page);
  await expectAccessible(page);
}

async function issueMemo(page: Page): Promise<void> {
  await part(page, "Memos");
  await page.getByRole("link", { name: "New memo" }).first().click();
  await page.getByLabel("Title").fill("Salinity at the Lantern Rock intake");
  await page.getByLabel("Question").fill("Did the storm freshen the layer at the intake, and for how long?");
  await page.getByRole("checkbox").first().check();
  await page.getByRole("button", { name: "Begin the memo" }).click();
  await page.getByText("The originator cannot check their own memo.").waitFor();
  await page.getByRole("button", { name: "Issue a revision" }).click();
  await page.getByRole("dialog").getByText("Nobody has checked this memo.").waitFor();
  await page.getByRole("dialog").getByRole("button", { name: "Issue a revision" }).click();
  await page.waitForURL(/\/revisions\//);
}

async function shareAndRevoke(page: Page): Promise<void> {
  await page.getByLabel("For", { exact: true }).fill("The harbour board");
  await page.getByRole("button", { name: "Make a link" }).click();
  const address = await page.getByLabel("Address of the share link").inputValue();

  const client = await browser.newPage({ width: 360, height: 740, allow: [/status of 404/] });
  await client.goto(address);
  expect(new URL(client.url()).pathname, "the token leaves the address").toMatch(/^\/shared\/[0-9a-z]+$/);
  await client.getByRole("heading", { name: "Salinity at the Lantern Rock intake" }).first().waitFor();
  await expectNoSideways(client);
  await expectAccessible(client);
  const [download] = await Promise.all([
    client.waitForEvent("download"),
    client.getByRole("link", { name: "Download the PDF" }).click(),
  ]);
  expect(download.suggestedFilename()).toBe("0412-M1 revision A.pdf");
  const pdf = await download.path();
  expect(statSync(pdf).size).toBeGreaterThan(50_000);
  expect(readFileSync(pdf).subarray(0, 5).toString()).toBe("%PDF-");

  await page.reload();
  await page.getByRole("button", { name: "Revoke" }).first().click();
  await page.getByRole("dialog").getByRole("button", { name: "Revoke" }).click();
  await page.getByText("revoked").waitFor();
  expect((await client.goto(client.url()))?.status(), "an open page of a revoked link").toBe(404);
  expect((await client.goto(address))?.status()).toBe(404);
}

async function wholeJob(record: Record, email: string, width: number): Promise<void> {
  const page = await browser.newPage({ width, height: 900, allow: [/status of 400/] });
  page.setDefaultTimeout(30_000);
  await signUp(page, email);
  await beginProject(page);
  await drawBox(page, record);
  await bringStorm(page, record);
  await describeWater(page);
  await runAndRead(page);
  await issueMemo(page);
  await shareAndRevoke(page);
}

describe("from an empty organisation to a client's PDF", () => {
  test("with an invented buoy file, at 1280 px", () => wholeJob(OWN, "m.orrin@lanternrock.example", 1280));

  test.skipIf(!existsSync(REAL.file))("with a year of a real buoy, at 1280 px [skipped without the real files]", () =>
    wholeJob(REAL, "real@lanternrock.example", 1280),
  );
});
