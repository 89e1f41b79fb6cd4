import { describe, expect, it } from "vitest";
import type { ColumnReading, ReadingQuestion } from "~/readers/reading";
import { readAnswers, sameAnswers } from "./answers-form";

function column(index: number, role: ColumnReading["role"]): ColumnReading {
  return {
    index,
    name: `c${index}`,
    statedUnit: null,
    role,
    unit: null,
    missingCodes: [],
    missing: 0,
    confidence: "by name",
  };
}

const shown = {
  columns: [column(0, "time"), column(1, "windSpeed"), column(2, "rain")],
  questions: [] as ReadingQuestion[],
};

function form(fields: Record<string, string>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(fields)) data.set(name, value);
  return data;
}

describe("answers from a reading sheet's form", () => {
  it("keeps nothing of fields that were left empty", () => {
    const empty = form({ zone: "", windHeight: " ", "role-0": "", "unit-1": "", "missing-2": "" });
    expect(readAnswers(empty, shown)).toEqual({ answers: {}, errors: {} });
  });

  it("reads every kind of answer", () => {
    const { answers, errors } = readAnswers(
      form({
        zone: "+05:30",
        dateOrder: "dmy",
        serialEpoch: "1904",
        directionSense: "towards",
        windHeight: "4,1",
        averagingMinutes: "8",
        "unit-1": "kn",
        "role-2": "leftOut",
        "missing-1": "99 -9",
        "missing-2": "none",
        leaveOutBadRows: "on",
      }),
      shown,
    );
    expect(errors).toEqual({});
    expect(answers).toEqual({
      zone: "+05:30",
      dateOrder: "dmy",
      serialEpoch: "1904",
      directionSense: "towards",
      windHeight: 4.1,
      averagingMinutes: 8,
      columns: { 1: { role: "windSpeed", unit: "kn" }, 2: { role: "leftOut" } },
      missingCodes: { 1: ["99", "-9"], 2: [] },
      leaveOutBadRows: true,
    });
  });

  it("says beside the field what cannot be taken", () => {
    const { errors } = readAnswers(
      form({ zone: "Atlantis/Central", windHeight: "-3", averagingMinutes: "soon" }),
      shown,
    );
    expect(errors.zone).toContain("Atlantis/Central");
    expect(errors.windHeight).toContain("0.5 to 500 m");
    expect(errors.averagingMinutes).toContain("minutes");
  });

  it("refuses a unit that the column cannot have, and drops it where the column is taken for something else", () => {
    expect(readAnswers(form({ "unit-1": "mm/h" }), shown).errors["unit-1"]).toContain("mm/h");
    expect(readAnswers(form({ "role-1": "rain", "unit-1": "kn" }), shown)).toEqual({
      answers: { columns: { 1: { role: "rain" } } },
      errors: {},
    });
  });

  it("does not take a radio button that stands where the reader put it for an answer", () => {
    const question: ReadingQuestion = { key: "directionSense", needed: false, message: "", suggestion: "from" };
    const asked = { ...shown, questions: [question] };
    expect(readAnswers(form({ directionSense: "from" }), asked).answers).toEqual({});
    expect(readAnswers(form({ directionSense: "towards" }), asked).answers).toEqual({ directionSense: "towards" });
  });

  it("reads a place however it is written, and what else a file of several places asks", () => {
    const place: ReadingQuestion = { key: "place", needed: true, message: "" };
    const axis: ReadingQuestion = {
      key: "timeAxis",
      needed: false,
      message: "",
      options: [{ value: "day", label: "" }],
    };
    const asked = { ...shown, questions: [place, axis] };
    const fields = { gridMethod: "bilinear", accumulation: "day", flagged: "keep", timeAxis: "day" };
    expect(readAnswers(form({ place: "44° 30′ N 63° 24′ W", ...fields }), asked).answers).toEqual({
      place: "44.5,-63.4",
      ...fields,
    });
    expect(readAnswers(form({ place: "somewhere" }), asked).errors.place).toContain("latitude");
    expect(readAnswers(form({ place: "44.5,-63.4", timeAxis: "day" }), shown)).toEqual({ answers: {}, errors: {} });
    const listed = { ...shown, questions: [{ ...place, options: [{ value: "Laval", label: "" }] }] };
    expect(readAnswers(form({ place: "Laval" }), listed).answers).toEqual({ place: "Laval" });
  });

  it("ignores columns that the file does not have", () => {
    expect(readAnswers(form({ "role-77": "rain" }), shown).answers).toEqual({});
  });
});

describe("two sets of answers", () => {
  it("are the same whatever the order of their keys", () => {
    const a = { zone: "UTC", columns: { 1: { role: "rain" as const, unit: "mm" }, 2: { role: "time" as const } } };
    const b = { columns: { 2: { role: "time" as const }, 1: { unit: "mm", role: "rain" as const } }, zone: "UTC" };
    expect(sameAnswers(a, b)).toBe(true);
    expect(sameAnswers(a, { ...b, windHeight: 10 })).toBe(false);
  });
});
