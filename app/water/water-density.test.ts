import { describe, expect, it } from "vitest";
import { freezingPoint, gramsPerKilogram, layerDensities } from "./water-density";

const column = { temperature: 20, salinity: 35, salinityScale: "practical" as const, layerDepth: 20, below: null };

describe("densities of a two-layer column", () => {
  // EOS-80, UNESCO 1983 check table: 1024.763 at S 35, 20 °C; TEOS-10 differs by 0.0036 there (specification A.4).
  it("agrees with the published density of seawater at 35 and 20 °C", () => {
    expect(layerDensities(column).layer).toBeCloseTo(24.763 + 0.0036, 2);
  });

  it("is the same on both salinity scales", () => {
    const absolute = { ...column, salinity: gramsPerKilogram(35, "practical"), salinityScale: "absolute" as const };
    expect(layerDensities(absolute).layer).toBe(layerDensities(column).layer);
    // 35 PSS-78 is the standard ocean's 35.16504 g/kg by definition (TEOS-10).
    expect(gramsPerKilogram(35, "practical")).toBeCloseTo(35.16504, 10);
  });

  it("tells the step to the water below, and that colder and saltier lies stable", () => {
    const { layer, below, step, stable } = layerDensities({ ...column, below: { temperature: 10, salinity: 35.2 } });
    expect(stable).toBe(true);
    expect(step).toBe((below ?? 0) - layer);
    expect(step).toBeGreaterThan(0);
  });

  it("tells that warmer and fresher water below is not stable", () => {
    const { step, stable } = layerDensities({ ...column, below: { temperature: 22, salinity: 34 } });
    expect(stable).toBe(false);
    expect(step).toBeLessThan(0);
  });

  it("takes water of the same kind below for stable", () => {
    expect(layerDensities({ ...column, layerDepth: 0.1, below: { temperature: 20, salinity: 35 } }).stable).toBe(true);
  });

  it("knows where seawater freezes", () => {
    // UNESCO 1983: -1.922 °C at S 35 and the surface, for air-saturated water within 0.003 °C (from memory).
    expect(freezingPoint(35, "practical")).toBeCloseTo(-1.92, 2);
    expect(freezingPoint(0, "absolute")).toBeCloseTo(0, 2);
  });
});
