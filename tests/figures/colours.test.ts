import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { PRINT_COLOURS, printColours } from "~/figures/colours";

const stylesheet = readFileSync(new URL("../../app/app.css", import.meta.url), "utf8");

describe("printColours", () => {
  it("replaces every token", () => {
    expect(printColours('<path stroke="var(--wind)" fill="var(--heat-mark)"/>')).toBe(
      '<path stroke="#b5482a" fill="#b97800"/>',
    );
  });
  it("refuses a token without a print colour", () => {
    expect(() => printColours('<path fill="var(--sheet)"/>')).toThrow(/--sheet/);
  });
});

describe("print colours", () => {
  const light = stylesheet.slice(stylesheet.indexOf(":root"), stylesheet.indexOf("@media"));
  it.each(Object.entries(PRINT_COLOURS).filter(([token]) => token !== "paper"))(
    "%s is the page's own light value, %s",
    (token, value) => {
      expect(light).toContain(`--${token}: ${value};`);
    },
  );

  it.each(["ink", "slate", "wind", "rain", "heat", "density", "drift", "shore", "error"] as const)(
    "%s reads on white: contrast of 4.5 to 1 (WCAG 2.2, 1.4.3)",
    (token) => {
      expect(contrastOnWhite(PRINT_COLOURS[token])).toBeGreaterThanOrEqual(4.5);
    },
  );
  it("the mark of heat is seen on white: contrast of 3 to 1 (WCAG 2.2, 1.4.11)", () => {
    expect(contrastOnWhite(PRINT_COLOURS["heat-mark"])).toBeGreaterThanOrEqual(3);
  });
});

/** WCAG 2.2, relative luminance; from memory. */
function contrastOnWhite(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 1.05 / (0.2126 * red + 0.7152 * green + 0.0722 * blue + 0.05);
}
