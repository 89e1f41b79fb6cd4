import { figureCsv } from "~/figures/figure-csv";
import { BAND_NAMES, BAND_UNITS, SERIES_NAMES, SERIES_UNITS, type BandName, type Response } from "~/ocean/response";

/** Names as a spreadsheet's reader wants them; the unit is added to each. */
const HEADERS: Record<BandName, string> = {
  stressX: "wind stress towards east",
  stressY: "wind stress towards north",
  driftEast: "drift towards east",
  driftNorth: "drift towards north",
  displacementEast: "displacement towards east",
  displacementNorth: "displacement towards north",
  transportAlong: "Ekman transport along the shore, positive to the right looking offshore (north without a shore)",
  transportAcross: "Ekman transport across the shore, positive offshore (east without a shore)",
  temperature: "surface temperature",
  salinity: "surface Absolute Salinity",
  density: "surface potential density",
  layerDepth: "layer depth",
  stress: "wind stress",
  driftSpeed: "drift speed",
};

const PERCENTILES = { p10: "10th percentile", p50: "median", p90: "90th percentile" } as const;
const PERCENTILE_KEYS = Object.keys(PERCENTILES) as (keyof typeof PERCENTILES)[];

/**
 * The series of a response as CSV: ISO UTC, SI, units in the header, numbers unrounded. Where an ensemble ran, its
 * percentiles follow; a long storm has them at some of its times, and blanks between.
 */
export function responseCsv({ series, bands }: Pick<Response, "series" | "bands">): string {
  const banded = bands ? BAND_NAMES.flatMap((name) => PERCENTILE_KEYS.map((p) => ({ name, p }))) : [];
  const sampleAt = new Map(bands?.time.map((time, sample) => [time, sample]));
  return figureCsv({
    columns: [
      { name: "time (UTC)", unit: "" },
      ...SERIES_NAMES.map((name) => ({ name: HEADERS[name], unit: SERIES_UNITS[name] })),
      ...banded.map(({ name, p }) => ({ name: `${HEADERS[name]}, ${PERCENTILES[p]}`, unit: BAND_UNITS[name] })),
    ],
    rows: series.time.map((time, index) => {
      const sample = sampleAt.get(time);
      return [
        time,
        ...SERIES_NAMES.map((name) => series[name][index]),
        ...banded.map(({ name, p }) => (sample === undefined ? null : (bands?.series[name][p][sample] ?? null))),
      ];
    }),
  });
}
