import { describe, expect, it } from "vitest";
import { splitByFace, undrawable } from "./faces";
import { shippedCoverage, shippedFonts } from "./fonts.server";

const regular = { bold: false, italic: false };

describe("splitByFace with the shipped fonts", () => {
  it.each([
    ["wind", "latin-400-normal"],
    ["Ł", "latin-ext-400-normal"],
    ["τ", "greek-400-normal"],
    ["ж", "cyrillic-400-normal"],
    ["≤", "signs"],
    ["∂", "signs"],
    ["→", "signs"],
    ["−", "latin-400-normal"],
  ])("draws %j with %s", (text, face) => {
    expect(splitByFace(text, regular, shippedCoverage)).toEqual([{ face, text }]);
  });

  it("cuts a mixed text where the face changes and keeps the style", () => {
    expect(splitByFace("ρa τ", { bold: true, italic: false }, shippedCoverage)).toEqual([
      { face: "greek-700-normal", text: "ρ" },
      { face: "latin-700-normal", text: "a " },
      { face: "greek-700-normal", text: "τ" },
    ]);
  });

  it("draws composed what comes in pieces, and leaves out what cannot be seen", () => {
    expect(splitByFace("e\u0301\u0007\u200d", regular, shippedCoverage)).toEqual([
      { face: "latin-400-normal", text: "é" },
    ]);
  });

  it("shows a replacement for what no face draws, and can name it", () => {
    expect(splitByFace("港", regular, shippedCoverage)).toEqual([{ face: "latin-400-normal", text: "\uFFFD" }]);
    expect(undrawable("港 Skarrow 港 ≤ ω", shippedCoverage)).toEqual(["港"]);
  });

  it("turns spaces and hyphens that no face draws into plain ones", () => {
    expect(splitByFace("a\u205fb\u2011c", regular, shippedCoverage)).toEqual([
      { face: "latin-400-normal", text: "a b-c" },
    ]);
  });
});

describe("the shipped fonts", () => {
  it("all unpack, and hold what their names say", () => {
    for (const [face, { codePoints }] of shippedFonts()) expect(codePoints.size, face).toBeGreaterThan(5);
    const latin = shippedFonts().get("latin-400-normal")!.codePoints;
    for (const character of "Az09°²³µ×–—…−€\u00a0") expect(latin.has(character.codePointAt(0)!), character).toBe(true);
    // What the file lacks is why a second family is shipped.
    for (const character of "→≤√∂") expect(latin.has(character.codePointAt(0)!), character).toBe(false);
  });
});
