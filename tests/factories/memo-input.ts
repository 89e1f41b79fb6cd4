import type { MemoInput } from "~/memo/memo-input";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { sampleFigure } from "./memo-document";
import { sampleResponse } from "./response";

/** A memo's whole input: one estimate, one box, two series, one water column. */
export function memoInput(changes: Partial<MemoInput> = {}): MemoInput {
  return {
    pageSize: "A4",
    organisation: "Thornholm Coastal",
    units: DEFAULT_UNITS,
    project: {
      name: "Skarrow Bay intake, autumn storms",
      jobNumber: "2617",
      client: "Skarrow Water Works",
      zone: "UTC",
    },
    facts: {
      number: "2617-M2",
      title: "November gale: salinity at the Skarrow Bay intake",
      revision: "B",
      issuedFor: "issued for client decision",
      notice: "",
      originator: "R. Ansel",
      checker: "M. Tolve",
      date: "2026-11-11",
      stamp: "GP-7K2M-41XQ",
      answer: null,
      question:
        "Did the gale of early November freshen the water at the intake below 32.5 g/kg, and for how long should it be expected to stay there?",
      intendedUse:
        "For the operator's decision on load reduction at the intake. Not a design basis, and not for any other place or storm.",
      reviewBy: "2027-11-11",
      sections: [
        {
          heading: "Findings",
          text: "The lid formed **before** the wind peaked.\n\n- rain 62 mm in 14 h\n- wind from the north-west",
        },
      ],
    },
    estimates: [
      {
        code: "2617-07",
        boxName: "Skarrow Bay intake",
        stormName: "November gale",
        waterName: "Cast of 1 November",
        methodSheetName: "Slab, Large and Pond",
        shore: true,
        response: sampleResponse(),
        figures: [
          sampleFigure().figure,
          { ...sampleFigure().figure, id: "drift-hodograph", caption: "Drift hour by hour." },
        ],
      },
    ],
    boxes: [
      {
        name: "Skarrow Bay intake",
        corners: [
          [-4.92, 55.31],
          [-4.88, 55.31],
          [-4.88, 55.34],
          [-4.92, 55.34],
          [-4.92, 55.31],
        ],
        area: 8_450_000,
        waterDepth: 24,
        distanceToShore: 4100,
        shoreNormal: 268,
        whyChosen: "Holds the intake and the outfall that shares its water.",
      },
    ],
    series: [
      {
        name: "Wind and rain",
        fileName: "skarrow_buoy_2026-11_hourly_quality_controlled_second_delivery.csv",
        sha256: "3b7e1f02c4a5968778695a4b3c2d1e0f00112233445566778899aabbccddeeff",
        rows: 13_448,
        first: "2026-11-03T00:00:00Z",
        last: "2026-11-08T00:00:00Z",
        channels: "windSpeed (kn), windFrom (deg), rain (mm/h)",
        source: "Buoy 61-204, 14 km from the box, retrieved 2026-11-09",
        zone: "UTC",
        windHeight: 4,
        averagingMinutes: 10,
        missingShare: 0.012,
        steps: ["knots to m/s (× 0.514444)", "vector mean over the hour"],
        quality: ["wind speed: 13 400 good, 40 suspect, 8 bad; 0.4 % missing or left out", "by the default thresholds"],
        gaps: ["2026-11-04 02:00 to 05:00 UTC, interpolated as a vector"],
      },
      {
        name: "Heat",
        fileName: "fluxes.nc",
        sha256: "00112233445566778899aabbccddeeff3b7e1f02c4a5968778695a4b3c2d1e0f",
        rows: 121,
        first: "2026-11-03T00:00:00Z",
        last: "2026-11-08T00:00:00Z",
        channels: "netHeat (W/m²)",
        source: "",
        zone: "UTC",
        windHeight: null,
        averagingMinutes: null,
        missingShare: null,
        steps: [],
        quality: [],
        gaps: [],
      },
    ],
    waters: [
      {
        name: "Cast of 1 November",
        kind: "cast of 41 levels",
        details: [{ label: "Layer", text: "12.0 m deep, 12.2 °C, 33.6 g/kg" }],
        fileName: "cast_0311.cnv",
        sha256: "aabbccddeeff00112233445566778899aabbccddeeff00112233445566778899",
      },
    ],
    assumptions: [
      {
        statement: "The cast of 1 November stands for the start of the storm.",
        basis: "Two quiet days between.",
        effect: "Salinity ± 0.1 g/kg",
      },
    ],
    limits: ["River water is not included.", "One wind station, 14 km away, stands for the whole box."],
    independentCheck: {
      text: "The drop of salinity was recomputed by hand from rain and layer depth: 31.9 g/kg.",
      by: "M. Tolve",
      date: "2026-11-10",
    },
    revisions: [
      {
        revision: "A",
        date: "2026-11-10",
        issuedFor: "issued for comment",
        reason: "First issue",
        originator: "R. Ansel",
        checker: "M. Tolve",
      },
      {
        revision: "B",
        date: "2026-11-11",
        issuedFor: "issued for client decision",
        reason: "Trigger level corrected",
        originator: "R. Ansel",
        checker: "M. Tolve",
      },
    ],
    distribution: ["Skarrow Water Works, operations"],
    attachments: [{ name: "wind-and-rain.csv", description: "Wind and rain as used, hourly" }],
    ...changes,
  };
}
