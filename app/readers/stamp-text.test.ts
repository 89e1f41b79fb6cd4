import { describe, expect, it } from "vitest";
import { daysFromDate, isoFromSeconds, stampFromText, timeFromText, type DateOrder } from "./stamp-text";

const iso = (text: string, order: DateOrder = "dmy"): string | null => {
  const stamp = stampFromText(text, order);
  return stamp === null ? null : isoFromSeconds(stamp.clock - (stamp.offset ?? 0));
};

describe("stampFromText", () => {
  it.each([
    ["2019-01-01T05:06:07Z", "2019-01-01T05:06:07Z"],
    ["2019-01-01T05:06:07.250+02:00", "2019-01-01T03:06:07.250Z"],
    ["2019-01-01 05:06:07 -0330", "2019-01-01T08:36:07Z"],
    ["2019/01/01 0500 UTC", "2019-01-01T05:00:00Z"],
    ["201901010506", "2019-01-01T05:06:00Z"],
    ["20190101T0506Z", "2019-01-01T05:06:00Z"],
    ["2019010105", "2019-01-01T05:00:00Z"],
    ["25.12.2019 3:04", "2019-12-25T03:04:00Z"],
    ["25-Dec-2019 15h30", "2019-12-25T15:30:00Z"],
    ["3 août 2019 01:00", "2019-08-03T01:00:00Z"],
    ["1 März 2019 01:00", "2019-03-01T01:00:00Z"],
    ["05-mai-19 01:00", "2019-05-05T01:00:00Z"],
    ["Dec 25, 2019 3:04 pm", "2019-12-25T15:04:00Z"],
    ["25/12/2019 12:00 am", "2019-12-25T00:00:00Z"],
    ["31/12/2019 24:00", "2020-01-01T00:00:00Z"],
    ["2020-366 12:00", "2020-12-31T12:00:00Z"],
  ])("reads %s", (text, expected) => {
    expect(iso(text)).toBe(expected);
  });

  it("takes day and month in the order given", () => {
    expect(iso("03/04/2020", "dmy")).toBe("2020-04-03T00:00:00Z");
    expect(iso("03/04/2020", "mdy")).toBe("2020-03-04T00:00:00Z");
  });

  it.each([
    "2019-02-29",
    "2019-13-01",
    "31/04/2019",
    "2019-01-01 25:00",
    "2019-01-01 12:60",
    "12.5",
    "hello 2019",
    "",
    "24:00",
  ])("refuses %s", (text) => {
    expect(iso(text)).toBeNull();
  });
});

describe("timeFromText", () => {
  it("knows midnight at both ends of a day, and states no offset unless written", () => {
    expect(timeFromText("24:00")).toEqual({ seconds: 86400, offset: null });
    expect(timeFromText("0000 UTC")).toEqual({ seconds: 0, offset: 0 });
    expect(timeFromText("24:01")).toBeNull();
  });
});

describe("daysFromDate", () => {
  it("agrees with the platform's calendar over five centuries", () => {
    for (let year = 1700; year <= 2200; year += 1) {
      for (const [month, day] of [
        [1, 1],
        [2, 28],
        [3, 1],
        [12, 31],
      ] as const) {
        expect(daysFromDate(year, month, day)).toBe(Date.UTC(year, month - 1, day) / 86400000);
      }
    }
  });
});
