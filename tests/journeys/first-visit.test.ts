import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { browserForTests } from "../setup/browser";
import { type RunningServer, startServer } from "../setup/run-server";

const browser = browserForTests();
let server: RunningServer;

beforeAll(async () => {
  server = await startServer();
});

afterAll(async () => {
  await server.stop();
});

describe("someone who has no account", () => {
  it.each([
    { width: 360, height: 740, colorScheme: "light" as const },
    { width: 360, height: 740, colorScheme: "dark" as const },
    { width: 1280, height: 800, colorScheme: "light" as const },
    { width: 1280, height: 800, colorScheme: "dark" as const },
  ])("finds the way to the sign-in page at $width px, $colorScheme", async (screen) => {
    const page = await browser.newPage(screen);
    await page.goto(server.url);
    expect(await page.title()).toContain("Galeprint");
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(screen.width);
    await page.getByRole("link", { name: "Sign in" }).click();
    await page.waitForURL("**/sign-in");
    await page.getByLabel("E-mail address").waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(screen.width);
  });

  it("gets a page that says so, with the status 404, at an address that is none", async () => {
    const page = await browser.newPage({ allow: [/status of 404/] });
    const response = await page.goto(`${server.url}/no/such/page`);
    expect(response?.status()).toBe(404);
    expect(await page.getByRole("heading", { level: 1 }).textContent()).toBeTruthy();
  });

  it("is shown to the sign-in page in place of a project's", async () => {
    const page = await browser.newPage();
    await page.goto(`${server.url}/o/some-organisation/projects/some-project`);
    expect(new URL(page.url()).pathname).toBe("/sign-in");
  });
});
