import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sampleResponse } from "../../tests/factories/response";
import type { Headline, Response } from "~/ocean/response";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { textOf } from "./document";
import { draftAnswer, hoursText, MOST_WORDS, wordsIn, type WordsContext } from "./words";

const context: WordsContext = { units: DEFAULT_UNITS, zone: "UTC", boxName: "Skarrow Bay", shore: true };

function answer(headline: Partial<Headline> = {}, changes: Partial<Response> = {}, words: Partial<WordsContext> = {}) {
  const response = sampleResponse(changes);
  const text = textOf(
    draftAnswer({ ...response, headline: { ...response.headline, ...headline } }, { ...context, ...words }),
  );
  return text.replaceAll("\u00a0", " ");
}

describe("draftAnswer", () => {
  it("tells values with units, band, bearing, compass word, time above the trigger level and what limits it", () => {
    const text = answer();
    expect(text).toContain("from 33.6 to 31.9 g/kg (31.6 to 32.2 g/kg), lowest at 2026-11-05 04:00 UTC.");
    expect(text).toContain(
      "below the trigger level of 32.5 g/kg for 19 h, first at 2026-11-04 18:00 UTC; this meets the limit of 6 h.",
    );
    expect(text).toContain("cooled by 0.9 °C to 11.3 °C.");
    expect(text).toContain("about 84 km (70 to 98 km) towards the south-east (128°).");
    expect(text).toContain("124 million m³/km towards the shore, which favours sinking.");
    expect(text).toContain("What limits this: the shore is 4.1 km away, within one internal Rossby radius of 9.0 km.");
    expect(text).not.toContain("Rising or sinking");
  });

  it("says that there is no range where no ensemble ran", () => {
    const text = answer(
      {
        surfaceSalinity: { value: 31.9, change: -1.7, time: "2026-11-05T04:00:00Z" },
        netDisplacement: { value: 84_200, towards: 128 },
      },
      { uncertainty: undefined },
    );
    expect(text).toContain("No ensemble was run, so these values carry no range.");
    expect(text).not.toContain("percentile");
  });

  it("says of how many members its ranges are, and what the salinity depends on", () => {
    const text = answer({}, { fitNotes: [] });
    expect(text).toContain("Ranges are the 10th to 90th percentile of 200 members; the salinity depends most on rain.");
  });

  it("warns first of all where the method does not hold", () => {
    const note = {
      code: "X",
      severity: "doNotUse" as const,
      message: "The box lies at 1° latitude.",
      value: 1,
      threshold: 2,
      source: "",
    };
    const text = answer({}, { fitNotes: [...sampleResponse().fitNotes, note] });
    expect(text).toMatch(/^The method should not be used here: the box lies at 1° latitude\. At Skarrow Bay/);
    const wordy = { ...note, message: "a word ".repeat(60) };
    const cited = { ...note, message: "The wind passes the range of Trenberth et al. (1990). Take another law." };
    expect(answer({}, { fitNotes: [cited] })).toContain("here: the wind passes the range of Trenberth et al. (1990).");
    expect(answer({}, { fitNotes: [cited] })).not.toContain("another law");
    expect(answer({}, { fitNotes: [wordy] })).toMatch(/^The method should not be used here: see the fit notes\. At /);
  });

  it("claims no change that the decimals do not show", () => {
    const text = answer({
      surfaceSalinity: { value: 33.59, change: -0.01, time: "2026-11-05T04:00:00Z" },
      surfaceTemperature: { value: 12.2, change: -0.04 },
      netDisplacement: { value: 0, towards: null },
      transportAcross: { value: 0.001 },
    });
    expect(text).toContain("did not fall noticeably below its start of 33.6 g/kg");
    expect(text).toContain("ended at 12.2 °C, as warm as it began");
    expect(text).toContain("ended where it began");
    expect(text).not.toContain("Ekman");
  });

  it("leaves out the shore where there is none, and follows the organisation's units", () => {
    const text = answer({}, {}, { shore: false, units: { ...DEFAULT_UNITS, distance: "nm", salinity: "PSS-78" } });
    expect(text).not.toContain("shore, which");
    expect(text).toContain("about 45 nm");
    expect(text).toContain("31.8 PSS-78");
  });

  it("says so where a trigger level was never passed, and where the limit is not met", () => {
    const [trigger] = sampleResponse().headline.triggers;
    const never = { ...trigger!, hoursBeyond: 0, firstAt: null, longestSpell: 0, met: false };
    expect(answer({ triggers: [never] })).toContain("Salinity was never below the trigger level of 32.5 g/kg.");
    const short = { ...trigger!, hoursBeyond: 5.5, longestSpell: 3, met: false };
    expect(answer({ triggers: [short] })).toContain(
      "for 5.5 h, first at 2026-11-04 18:00 UTC, at most 3 h at a stretch; this stays short of the limit of 6 h.",
    );
  });

  it("never uses more words than a reader has patience for", () => {
    const [trigger] = sampleResponse().headline.triggers;
    const long = fc.string({ minLength: 1, maxLength: 300 });
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 8 }), long, (count, message) => {
        const note = { code: "X", severity: "caution" as const, message, value: 0, threshold: 0, source: "" };
        const text = answer({ triggers: Array.from({ length: count }, () => trigger!) }, { fitNotes: [note] });
        expect(wordsIn(text)).toBeLessThanOrEqual(MOST_WORDS);
        expect(text).toContain("31.9 g/kg");
      }),
    );
  });
});

describe("hoursText", () => {
  it.each([
    [0, "0 h"],
    [5.5, "5.5 h"],
    [6, "6 h"],
    [19.2, "19 h"],
  ])("tells %d as %j", (hours, text) => {
    expect(hoursText(hours).replace("\u00a0", " ")).toBe(text);
  });
});
