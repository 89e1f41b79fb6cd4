import type { ColumnRecord } from "../models/column-run";
import type { ResponseColumn } from "../response";
import type { Scenario } from "../scenario";
import { inSituFromConservative } from "../seawater/potential-temperature";
import { potentialDensityOf } from "../seawater/density";
import { placeOf } from "../box/place";
import { pressureFromDepth } from "../seawater/pressure-from-depth";

/** The column's profiles as they leave the engine: in-situ temperature, plain arrays. */
export function responseColumn(scenario: Scenario, column: ColumnRecord): ResponseColumn {
  const { latitude } = placeOf(scenario.box);
  const pressure = Array.from(column.depth, (depth) => pressureFromDepth(depth, latitude));
  return {
    depth: Array.from(column.depth),
    time: column.sample.map((k) => scenario.storm.time[k]),
    temperature: column.CT.map((CT, i) =>
      Array.from(CT, (value, k) => inSituFromConservative(column.SA[i][k], value, pressure[k])),
    ),
    salinity: column.SA.map((SA) => Array.from(SA)),
    density: column.CT.map((CT, i) => Array.from(CT, (value, k) => potentialDensityOf(column.SA[i][k], value))),
    driftEast: column.east.map((values) => Array.from(values)),
    driftNorth: column.north.map((values) => Array.from(values)),
  };
}
