import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { overrideActs, stillStanding, type KeptOverride } from "./override-acts";

let made = 0;
const override = (given: Partial<KeptOverride>): KeptOverride => ({
  id: String(++made),
  recordId: "r",
  channel: "windSpeed",
  at: 0,
  value: 5,
  flag: 4,
  reason: "Bird on the vane.",
  createdBy: "ida",
  createdAt: new Date(1000),
  ...given,
});
const unchanged = ({ value }: KeptOverride) => value;

describe("acts that set flags", () => {
  it("are one for all samples set at once, newest first", () => {
    const all = [
      override({ at: 0 }),
      override({ at: 3600 }),
      override({ at: 0, flag: 1, reason: "Checked with the log.", createdAt: new Date(2000) }),
    ];
    const acts = overrideActs(all, unchanged);
    expect(
      acts.map(({ reason, overrides, standing, from, to }) => [reason, overrides.length, standing, from, to]),
    ).toEqual([
      ["Checked with the log.", 1, 1, 0, 0],
      ["Bird on the vane.", 2, 1, 0, 3600],
    ]);
    expect(stillStanding(all, acts[1].key).map(({ at }) => at)).toEqual([3600]);
  });

  it("stand no longer where they were taken back, or the record was read anew with another value", () => {
    const set = override({});
    const back = override({ flag: null, reason: "Taken back.", createdAt: new Date(2000) });
    expect(overrideActs([set, back], unchanged).map(({ flag, standing }) => [flag, standing])).toEqual([
      [null, 0],
      [4, 0],
    ]);
    expect(overrideActs([set], () => 6)[0].standing).toBe(0);
    expect(overrideActs([set], () => undefined)[0].standing).toBe(0);
  });

  it("have each sample stand in at most one act, whatever was done in whatever order", () => {
    const doing = fc.record({
      at: fc.integer({ min: 0, max: 3 }),
      flag: fc.constantFrom(1 as const, 3 as const, 4 as const, null),
      createdAt: fc.integer({ min: 1, max: 9 }).map((ms) => new Date(ms)),
    });
    fc.assert(
      fc.property(fc.array(doing, { maxLength: 20 }), (doings) => {
        const all = doings.map(override);
        const standing = overrideActs(all, unchanged).reduce((sum, act) => sum + act.standing, 0);
        const lastFlags = new Map(all.map(({ at, flag }) => [at, flag]));
        expect(standing).toBe([...lastFlags.values()].filter((flag) => flag !== null).length);
      }),
    );
  });
});
