/** The demonstration's invented consultancy, job, coast and storms. No person, firm or storm of these names is meant. */
import type { InventedStorm } from "./invented-storm";
import type { Position, TriggerLevel } from "~/ocean/scenario";

export const DEMO = {
  slug: "merrow-quill",
  organisation: "Merrow & Quill Coastal",
  people: [
    { email: "ida.renholt@merrowquill.example", name: "I. Renholt", role: "owner" },
    { email: "tomas.brae@merrowquill.example", name: "T. Brae", role: "consultant" },
  ],
  password: "slack water at the pier",
  project: {
    name: "Pellan Sound intake, autumn gales",
    jobNumber: "3108",
    client: "Pellan Water Works",
    timeZone: "UTC",
  },
} as const;

interface DemoBox {
  name: string;
  polygon: Position[];
  waterDepth: number;
  shoreNormal: number;
  distanceToShore: number;
  triggerLevels: TriggerLevel[];
}

function rectangle(west: number, south: number, east: number, north: number): Position[] {
  return [
    [west, south],
    [east, south],
    [east, north],
    [west, north],
    [west, south],
  ];
}

const INTAKE_LIMIT: TriggerLevel = { quantity: "salinity", side: "below", value: 34.9, hours: 6 };

export const DEMO_BOXES: DemoBox[] = [
  {
    name: "Intake box",
    polygon: rectangle(-8.3, 51.69, -8.255, 51.715),
    waterDepth: 46,
    shoreNormal: 165,
    distanceToShore: 8_400,
    triggerLevels: [INTAKE_LIMIT],
  },
  {
    name: "Outer sound",
    polygon: rectangle(-8.5, 51.46, -8.4, 51.52),
    waterDepth: 110,
    shoreNormal: 165,
    distanceToShore: 17_500,
    triggerLevels: [INTAKE_LIMIT],
  },
  {
    name: "Harbour mouth",
    polygon: rectangle(-8.27, 51.768, -8.245, 51.783),
    waterDepth: 9,
    shoreNormal: 170,
    distanceToShore: 1_800,
    triggerLevels: [],
  },
];

export const DEMO_WATER = {
  name: "Sound, late October",
  source: "Cast C3 of the harbour survey, 2026-10-28, averaged above and below the thermocline",
  temperature: 14.2,
  salinity: 35.1,
  salinityScale: "absolute" as const,
  layerDepth: 28,
  belowTemperature: 11.2,
  belowSalinity: 35.3,
};

interface DemoStorm {
  name: string;
  file: string;
  /** Hours of the record; the storm's own window lies inside. */
  window: { fromHour: number; toHour: number };
  shape: InventedStorm;
}

export const DEMO_STORMS: DemoStorm[] = [
  {
    name: "All Souls gale",
    file: "all-souls",
    window: { fromHour: 24, toHour: 144 },
    shape: {
      start: "2026-10-31T00:00:00Z",
      hours: 168,
      peakHour: 72,
      peakWind: 18,
      calmWind: 5,
      width: 17,
      windFromBefore: 205,
      windFromAfter: 310,
      peakRain: 11,
      lowestPressure: 968,
      seaTemperature: 14.2,
      airTemperature: 12.1,
      noonSun: 230,
      seed: 3108,
    },
  },
  {
    name: "October trough",
    file: "october-trough",
    window: { fromHour: 12, toHour: 84 },
    shape: {
      start: "2026-10-12T00:00:00Z",
      hours: 96,
      peakHour: 40,
      peakWind: 13,
      calmWind: 4.5,
      width: 12,
      windFromBefore: 170,
      windFromAfter: 265,
      peakRain: 4,
      lowestPressure: 989,
      seaTemperature: 14.9,
      airTemperature: 13.2,
      noonSun: 310,
      seed: 4,
    },
  },
];

export const DEMO_MEMO = {
  title: "All Souls gale: salinity at the Pellan Sound intake",
  question:
    "Did the gale of early November freshen the surface layer at the intake below the 34.9 g/kg at which the plant lowers its recovery, and for how long?",
  findings: "",
  purpose: "client decision" as const,
};
