import { describe, expect, it } from "vitest";
import { shippedCoverage } from "./fonts.server";
import { nameFaces } from "./svg-text";

describe("nameFaces", () => {
  it("names the face of what the plain one lacks, in text only, and keeps markup whole", () => {
    const svg = '<svg><title>σ</title><text x="1">σ &lt; 5 &#38; <tspan dy="2">a ≤ b</tspan></text></svg>';
    expect(nameFaces(svg, shippedCoverage)).toBe(
      '<svg><title>σ</title><text x="1"><tspan font-family="face:greek-400-normal">σ</tspan> &lt; 5 &amp; ' +
        '<tspan dy="2">a <tspan font-family="face:signs">≤</tspan> b</tspan></text></svg>',
    );
  });
});
