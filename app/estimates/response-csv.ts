import { figureCsv } from "~/figures/figure-csv";
import { SERIES_UNITS, type Response, type SeriesName } from "~/ocean/response";

/** Names as a spreadsheet's reader wants them; the unit is added to each. */
const HEADERS: Record<SeriesName, string> = {
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
};

/** The series of a response as CSV: ISO UTC, SI, units in the header, numbers unrounded. */
export function responseCsv({ series }: Response): string {
  const names = Object.keys(SERIES_UNITS) as SeriesName[];
  return figureCsv({
    columns: [
      { name: "time (UTC)", unit: "" },
      ...names.map((name) => ({ name: HEADERS[name], unit: SERIES_UNITS[name] })),
    ],
    rows: series.time.map((time, index) => [time, ...names.map((name) => series[name][index])]),
  });
}
