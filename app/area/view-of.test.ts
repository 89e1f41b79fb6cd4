import { describe, expect, it } from "vitest";
import { viewOf, WORLD_VIEW } from "./view-of";

describe("viewOf", () => {
  it("holds all shapes", () => {
    expect(
      viewOf([
        [
          [0, 50],
          [1, 51],
        ],
        [
          [3, 49],
          [4, 50],
        ],
      ]),
    ).toEqual({ west: 0, east: 4, south: 49, north: 51 });
  });

  it("goes the short way round across the antimeridian", () => {
    expect(
      viewOf([
        [
          [179, 0],
          [179.5, 1],
        ],
        [
          [-179.5, 0],
          [-179, 1],
        ],
      ]),
    ).toEqual({ west: 179, east: 181, south: 0, north: 1 });
    expect(
      viewOf([
        [
          [179.5, 0],
          [-179.5, 1],
        ],
      ]),
    ).toEqual({ west: 179.5, east: 180.5, south: 0, north: 1 });
  });

  it("shows the world when there is nothing", () => {
    expect(viewOf([])).toEqual(WORLD_VIEW);
    expect(viewOf([[]])).toEqual(WORLD_VIEW);
  });
});
