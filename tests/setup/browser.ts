import { type Browser, chromium, type Page } from "playwright-core";
import { afterAll, afterEach, beforeAll, expect } from "vitest";
import { findChromium } from "../../app/cli/workspace.mjs";

interface PageOptions {
  width?: number;
  height?: number;
  colorScheme?: "light" | "dark";
  /** Errors in the console that the journey brings about on purpose, such as the answer 400 to an invalid form. */
  allow?: RegExp[];
}

export interface TestBrowser {
  /** A page in a context (cookies, storage) of its own. */
  newPage(options?: PageOptions): Promise<Page>;
}

const FLAGS = [
  "--no-sandbox",
  "--disable-background-networking",
  // The map needs WebGL, and test machines have no graphics card.
  "--use-angle=swiftshader",
  "--enable-unsafe-swiftshader",
];

/**
 * One browser for the tests of a file; call it at the file's top. A test fails when one of its pages wrote an error to the
 * console or threw.
 */
export function browserForTests(): TestBrowser {
  let browser: Browser | undefined;
  let errors: string[] = [];

  beforeAll(async () => {
    const executablePath = findChromium();
    if (executablePath === undefined) throw new Error("No Chromium on the PATH; set CHROMIUM_PATH.");
    browser = await chromium.launch({ executablePath, headless: true, args: FLAGS });
  });
  afterEach(() => {
    const seen = errors;
    errors = [];
    expect(seen, "errors in the browser").toEqual([]);
  });
  afterAll(async () => {
    await browser?.close();
  });

  return {
    async newPage({ width = 1280, height = 800, colorScheme = "light", allow = [] } = {}) {
      if (browser === undefined) throw new Error("The browser is not running yet.");
      const context = await browser.newContext({ viewport: { width, height }, colorScheme, acceptDownloads: true });
      const page = await context.newPage();
      page.on("console", (message) => {
        const text = message.text();
        if (message.type() === "error" && !allow.some((pattern) => pattern.test(text))) {
          errors.push(`${page.url()}: ${text} (${message.location().url})`);
        }
      });
      page.on("pageerror", (error) => errors.push(`${page.url()}: ${error.stack ?? error.message}`));
      return page;
    },
  };
}
