/** Rows of an invented organisation, for tests that need a database. The numbers are invented too. */
import { createHash } from "node:crypto";
import type { Project } from "~/db/models/project.server";
import type { Storm } from "~/db/models/storm.server";
import type { StudyBox } from "~/db/models/study-box.server";
import type { WaterColumn } from "~/db/models/water-column.server";
import { forOrganisation, type Tenant } from "~/db/scoped.server";
import { membershipBySlug } from "~/db/unscoped.server";
import type { Position, TriggerLevel } from "~/ocean/scenario";
import { signUp } from "~/organisations/sign-up.server";
import { CHANNEL_UNITS, type ChannelName } from "~/readers/reading";
import { storeSeries } from "~/storms/load-series.server";

export interface TestOrganisation {
  tenant: Tenant;
  slug: string;
  userId: string;
  email: string;
}

let count = 0;
const next = () => ++count;

export const TEST_PASSWORD = "spring tide over the bar";

export async function makeOrganisation(name = `Thornholm Coastal ${next()}`): Promise<TestOrganisation> {
  const email = `r.ansel.${next()}@example.com`;
  const signedUp = await signUp({ organisationName: name, name: "R. Ansel", email, password: TEST_PASSWORD });
  const member = signedUp && (await membershipBySlug(signedUp.userId, signedUp.slug));
  if (!signedUp || !member) throw new Error(`${name} could not sign up.`);
  return { tenant: forOrganisation(member.organisation.id), slug: signedUp.slug, userId: signedUp.userId, email };
}

export async function makeProject(
  { tenant, userId }: TestOrganisation,
  values: Partial<Pick<Project, "name" | "jobNumber" | "client" | "timeZone">> = {},
): Promise<Project> {
  return tenant.projects.create({
    name: "Skarrow Bay intake, autumn storms",
    jobNumber: String(2600 + next()),
    client: "Skarrow Water Works",
    timeZone: "UTC",
    cautionsAcceptedAt: new Date("2026-11-01T00:00:00Z"),
    cautionsAcceptedBy: userId,
    ...values,
  });
}

interface BoxValues {
  name?: string;
  polygon?: Position[];
  waterDepth?: number | null;
  shoreNormal?: number | null;
  distanceToShore?: number | null;
  triggerLevels?: TriggerLevel[];
}

/** Off an invented coast to the west of the box. */
export async function makeBox(tenant: Tenant, projectId: string, values: BoxValues = {}): Promise<StudyBox> {
  return tenant.studyBoxes.create({
    projectId,
    name: `Intake box ${next()}`,
    polygon: [
      [-8.26, 54.4],
      [-8.2, 54.4],
      [-8.2, 54.43],
      [-8.26, 54.43],
      [-8.26, 54.4],
    ],
    waterDepth: 22,
    shoreNormal: 90,
    distanceToShore: 3100,
    landShare: 0,
    triggerLevels: [{ quantity: "salinity", side: "below", value: 32.5, hours: 6 }],
    ...values,
  });
}

export const STORM_START = Date.parse("2026-11-03T00:00:00Z") / 1000;
const HOUR = 3600;

interface StormValues {
  name?: string;
  hours?: number;
  /** m/s at the peak */
  peakWind?: number;
  /** mm/h at the peak; null for a storm without a rain record */
  peakRain?: number | null;
  /** W/m²; null for a storm without heat */
  heat?: number | null;
  windHeight?: number | null;
}

const bump = (hour: number, middle: number, width: number) => Math.exp(-(((hour - middle) / width) ** 2));

/** A gale that veers from south-east to west, with rain and cooling, hourly, from one invented file. */
export async function makeStorm(
  { tenant, userId }: Pick<TestOrganisation, "tenant" | "userId">,
  projectId: string,
  { name, hours = 120, peakWind = 25, peakRain = 9.5, heat = -240, windHeight = 10 }: StormValues = {},
): Promise<Storm> {
  const time = Array.from({ length: hours + 1 }, (_, hour) => STORM_START + hour * HOUR);
  const series: [ChannelName, number[]][] = [
    ["windSpeed", time.map((_, h) => 4 + (peakWind - 4) * bump(h, 44, 18))],
    ["windFrom", time.map((_, h) => (150 + 110 / (1 + Math.exp(-(h - 44) / 6))) % 360)],
  ];
  if (peakRain !== null) series.push(["rain", time.map((_, h) => peakRain * bump(h, 38, 11))]);
  if (heat !== null) series.push(["netHeat", time.map((_, h) => -60 + heat * bump(h, 44, 16))]);
  const bytes = Buffer.from(JSON.stringify(series));
  const number = next();
  return tenant.write(async (inner) => {
    const storm = await inner.storms.create({
      projectId,
      name: name ?? `November gale ${number}`,
      startsAt: STORM_START,
      endsAt: STORM_START + hours * HOUR,
    });
    const file = await inner.sourceFiles.create({
      projectId,
      name: `buoy-${number}.csv`,
      sha256: createHash("sha256").update(`${number} ${bytes.toString()}`).digest("hex"),
      size: bytes.length,
      bytes,
      uploadedBy: userId,
    });
    const iso = (seconds: number) => new Date(seconds * 1000).toISOString();
    const record = await inner.records.create({
      stormId: storm.id,
      sourceFileId: file.id,
      name: file.name,
      origin: "file",
      state: "confirmed",
      answers: {},
      provenance: {
        formatLabel: "comma-separated text",
        rows: time.length,
        first: iso(STORM_START),
        last: iso(STORM_START + hours * HOUR),
        zone: "UTC",
        windHeight,
        averagingMinutes: 10,
        medianStepSeconds: HOUR,
        understood: [],
        steps: [],
        dropped: [],
        channels: series.map(([channel, values]) => ({
          channel,
          unit: CHANNEL_UNITS[channel],
          count: values.length,
          missing: 0,
          fromColumns: [channel],
        })),
        confirmedBy: userId,
        confirmedAt: iso(STORM_START),
      },
      createdBy: userId,
    });
    for (const [channel, values] of series) {
      const entry = {
        channel,
        unit: CHANNEL_UNITS[channel],
        time: Float64Array.from(time),
        values: Float64Array.from(values),
      };
      await storeSeries(inner, { stormId: storm.id, recordId: record.id }, entry);
    }
    return storm;
  });
}

type WaterValues = Partial<
  Pick<
    WaterColumn,
    | "name"
    | "source"
    | "temperature"
    | "salinity"
    | "salinityScale"
    | "layerDepth"
    | "belowTemperature"
    | "belowSalinity"
  >
>;

export async function makeWater(tenant: Tenant, projectId: string, values: WaterValues = {}): Promise<WaterColumn> {
  return tenant.waterColumns.create({
    projectId,
    name: `Cast of 2 November ${next()}`,
    source: "invented CTD cast",
    temperature: 12.4,
    salinity: 33.6,
    salinityScale: "absolute",
    layerDepth: 14,
    belowTemperature: 10.1,
    belowSalinity: 34.4,
    ...values,
  });
}
