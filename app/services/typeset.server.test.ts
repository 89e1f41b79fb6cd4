import { describe, expect, it } from "vitest";
import { SOURCES } from "~/ocean/sources";
import { mathMarkup } from "./typeset.server";

const numbersIn = (text: string) => [...new Set(text.match(/\d+\.\d+/g) ?? [])].sort();

describe("equations typeset", () => {
  it.each(SOURCES.map(({ id, tex }) => [id, tex] as const))("sets %s", (_, tex) => {
    for (const line of tex) {
      const markup = mathMarkup(line);
      expect(markup).toMatch(/^<span class="katex"><math .*<\/math><\/span>$/s);
      expect(markup).not.toContain(" style=");
      expect(markup).not.toContain("merror");
    }
  });

  it.each(SOURCES.map(({ id, equation, tex }) => [id, equation, tex.join(" ")] as const))(
    "has no coefficient of %s typeset that its text does not have",
    (_, equation, tex) => {
      const text = numbersIn(equation);
      expect(numbersIn(tex).filter((number) => !text.includes(number))).toEqual([]);
    },
  );

  it("refuses what it cannot read", () => {
    expect(() => mathMarkup("\\frac{1}{")).toThrow();
    expect(() => mathMarkup("\\undefinedmacro")).toThrow();
  });
});
