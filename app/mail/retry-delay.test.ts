import { expect, it } from "vitest";
import { retryDelay } from "./retry-delay";

it("waits longer each time, for a day in all, and then gives up", () => {
  const waits: number[] = [];
  for (let attempts = 1; ; attempts++) {
    const delay = retryDelay(attempts);
    if (delay === null) break;
    waits.push(delay);
  }
  expect(waits).toEqual([...waits].sort((a, b) => a - b));
  expect(new Set(waits).size).toBe(waits.length);
  const hours = waits.reduce((sum, wait) => sum + wait, 0) / 3_600_000;
  expect(hours).toBeGreaterThan(12);
  expect(hours).toBeLessThan(48);
});
