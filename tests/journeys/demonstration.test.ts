import { existsSync, mkdirSync } from "node:fs";
import path from "node:path";
import { AxeBuilder } from "@axe-core/playwright";
import type { Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, inject, test } from "vitest";
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

async function signIn(page: Page): Promise<string> {
  await page.goto(`${server.url}/sign-in`);
  await page.getByLabel("E-mail address").fill(DEMO.people[0].email);
  await page.getByLabel("Password").fill(DEMO.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.getByRole("link", { name: DEMO.project.name }).click();
  await page.waitForURL(/\/projects\/[0-9a-z]{21}$/);
  return new URL(page.url()).pathname;
}

/** Opens a part of the project, then the first thing in it. */
async function open(page: Page, home: string, part: string, link?: RegExp): Promise<void> {
  await page.goto(`${server.url}${home}${part}`);
  if (link) {
    await page.locator("main").getByRole("link", { name: link }).first().click();
    await page.waitForURL((url) => url.pathname !== `${home}${part}`);
  }
  // The address changes a moment before the page does.
  await page.locator('body > div[aria-busy="false"]').waitFor();
  const map = page.locator(".maplibregl-map");
  if ((await map.count()) > 0) await page.locator('.maplibregl-map[aria-busy="false"]').first().waitFor();
}

/** Opened by a part of the project, the first thing in it, and a link of that page. */
const PLACES: { name: string; part: string; link?: RegExp; then?: RegExp }[] = [
  { name: "ledger", part: "" },
  { name: "area", part: "/area" },
  { name: "new box", part: "/area/new" },
  { name: "storms", part: "/storms" },
  { name: "storm", part: "/storms", link: /All Souls gale/ },
  { name: "quality", part: "/storms", link: /All Souls gale/, then: /[Qq]uality/ },
  { name: "water", part: "/water" },
  { name: "new water column", part: "/water/new" },
  { name: "estimates", part: "/estimates" },
  { name: "response", part: "/estimates", link: /3108-01/ },
  { name: "memos", part: "/memos" },
  { name: "memo", part: "/memos", link: /All Souls gale/ },
  { name: "issued revision", part: "/memos", link: /^Revision A$/ },
  { name: "facts", part: "/facts" },
];

const PUBLIC_PLACES = ["/methods", "/verify"];

const WIDTHS = [360, 768, 1280, 1920];
const HEIGHT = 900;

/** Takes seconds a page; what it finds hardly depends on the width, but does on the colours. */
const LOOKED_AT_CLOSELY = ["360 light", "1280 dark"];

/** Ends when the page has been laid out and painted at its new width. */
async function resize(page: Page, width: number): Promise<void> {
  await page.setViewportSize({ width, height: HEIGHT });
  await page.evaluate(
    () => new Promise<void>((done) => requestAnimationFrame(() => requestAnimationFrame(() => done()))),
  );
}

describe.each(["light", "dark"] as const)("the demonstration in %s colours", (colorScheme) => {
  test("fits its pages to every screen, and every page can be used by everyone", async () => {
    const page = await browser.newPage({ width: WIDTHS[0], height: HEIGHT, colorScheme });
    const home = await signIn(page);
    const faults: string[] = [];
    const look = async (name: string) => {
      for (const width of WIDTHS) {
        await resize(page, width);
        const sideways = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
        if (sideways > 0) faults.push(`${name} is ${sideways} px too wide at ${width} px`);
        if (!LOOKED_AT_CLOSELY.includes(`${width} ${colorScheme}`)) continue;
        // The map's canvas is drawn over by its own list of boxes, which is the equal view.
        const { violations } = await new AxeBuilder({ page }).exclude(".maplibregl-map").analyze();
        for (const { id, nodes } of violations) faults.push(`${name}: ${id} at ${nodes[0].target.join(" ")}`);
      }
      await resize(page, WIDTHS[0]);
    };
    for (const { name, part, link, then } of PLACES) {
      await open(page, home, part, link);
      if (then) {
        const before = page.url();
        await page.locator("main").getByRole("link", { name: then }).first().click();
        await page.waitForURL((url) => url.href !== before);
        await page.locator('body > div[aria-busy="false"]').waitFor();
      }
      await look(name);
    }
    for (const place of PUBLIC_PLACES) {
      await page.goto(new URL(place, page.url()).href, { waitUntil: "networkidle" });
      await look(place);
    }
    expect(faults).toEqual([]);
  });
});

/** Pictures of the tour in the README; taken anew where one is missing, or with PICTURES=1. */
const PICTURES = "tests/journeys/pictures";

test("shows the ledger, a reading sheet, a response and a memo", async () => {
  const anew = process.env.PICTURES === "1";
  mkdirSync(PICTURES, { recursive: true });
  const page = await browser.newPage({ width: 1280, height: 1000 });
  const home = await signIn(page);
  const picture = async (name: string) => {
    await page.evaluate(() => document.fonts.ready);
    const file = path.join(PICTURES, `${name}.png`);
    const bytes = await page.screenshot(anew || !existsSync(file) ? { path: file } : {});
    expect(bytes.length, `${name} is not a blank sheet`).toBeGreaterThan(20_000);
  };
  await picture("ledger");
  await open(page, home, "/storms", /All Souls gale/);
  await page.getByRole("link", { name: "Reading sheet" }).first().click();
  await page.getByRole("heading", { name: /Reading sheet/ }).waitFor();
  await picture("reading-sheet");
  await open(page, home, "/estimates", /3108-01/);
  await page.locator('.maplibregl-map[aria-busy="false"]').waitFor();
  await picture("response");
  await open(page, home, "/memos", /^Revision A$/);
  await page.getByRole("heading", { name: DEMO.project.name }).first().waitFor();
  await page
    .locator("article, section")
    .getByText("salinity at the Pellan Sound intake")
    .first()
    .scrollIntoViewIfNeeded();
  await picture("memo");
});
