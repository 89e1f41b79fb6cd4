import { describe, expect, it } from "vitest";
import { sampleResponse } from "../../tests/factories/response";
import { headlineFigure, headlineRows, hoursText, triggerText, type FigureContext } from "./headline-figures";
import { DEFAULT_UNITS } from "~/units/unit-choices";

const context: FigureContext = { units: DEFAULT_UNITS, zone: "UTC", shore: true };
const { headline } = sampleResponse();

describe("headlineFigure", () => {
  it("gives number, unit, band and what belongs beside", () => {
    expect(headlineFigure("surfaceSalinity", headline, context)).toMatchObject({
      label: "Lowest surface salinity",
      value: { text: "31.9\u00a0g/kg" },
      bandText: "31.6 to 32.2\u00a0g/kg, median\u00a031.9",
      levels: [32.5],
      remarks: ["below 32.5\u00a0g/kg for 19\u00a0h", "−1.70\u00a0g/kg from the start", "2026-11-05 04:00 UTC"],
    });
    expect(headlineFigure("netDisplacement", headline, context)).toMatchObject({
      value: { text: "84\u00a0km" },
      bandText: "70 to 98\u00a0km, median\u00a083",
      remarks: ["towards 128°, south-east"],
    });
  });

  it("tells the band of the temperature's change, not of its end", () => {
    const { value, bandText } = headlineFigure("surfaceTemperature", headline, context);
    expect(value.text).toBe("−0.9\u00a0°C");
    expect(bandText).toBe("−1.2 to −0.7\u00a0°C, median\u00a0−0.9");
  });

  it("names the side of the shore, or the compass where there is none", () => {
    const across = headlineFigure("transportAcross", headline, context);
    expect(across.remarks).toEqual(["towards the shore: sinking side"]);
    const open = headlineFigure("transportAcross", headline, { ...context, shore: false });
    expect(open.label).toBe("Transport towards east");
  });

  it("says so where nothing is known", () => {
    const unknown = { ...headline, densityStep: { value: null } };
    expect(headlineFigure("densityStep", unknown, context)).toMatchObject({
      si: null,
      value: { text: "no value" },
      remarks: ["nothing is known of the water below"],
    });
    expect(headlineRows(unknown, context).at(-1)?.remarks).toContain("density step not known");
  });

  it("follows the organisation's units", () => {
    const sea: FigureContext = {
      ...context,
      units: { ...DEFAULT_UNITS, speed: "kn", distance: "nm", salinity: "PSS-78" },
    };
    expect(headlineFigure("netDisplacement", headline, sea).value.text).toBe("45\u00a0nm");
    expect(headlineFigure("peakDrift", headline, sea).value.unit).toBe("kn");
    expect(headlineFigure("surfaceSalinity", headline, sea).value.unit).toBe("PSS-78");
  });
});

describe("headlineRows", () => {
  it("are six, in the product's order, each with a unit", () => {
    const rows = headlineRows(headline, context);
    expect(rows.map(({ id }) => id)).toEqual([
      "peakStress",
      "peakDrift",
      "netDisplacement",
      "transportAcross",
      "surfaceSalinity",
      "surfaceTemperature",
    ]);
    expect(rows.every(({ value }) => value.unit !== "")).toBe(true);
    expect(rows[5].remarks).toEqual([
      "11.3\u00a0°C at the end",
      "layer 12.0\u00a0m deep",
      "density step 1.84\u00a0kg/m³",
    ]);
  });
});

it("tells hours whole from ten up", () => {
  expect([19.2, 10, 9.96, 3, 0].map(hoursText)).toEqual([
    "19\u00a0h",
    "10\u00a0h",
    "10\u00a0h",
    "3\u00a0h",
    "0\u00a0h",
  ]);
  expect(triggerText({ ...headline.triggers[0], hoursBeyond: 0 }, DEFAULT_UNITS)).toBe("never below 32.5\u00a0g/kg");
});
