import { measureBox } from "./measure-box";
import { formatCoriolis } from "./format-coriolis";
import { formatPosition } from "./format-coordinates";
import type { Position, TriggerLevel } from "~/ocean/scenario";
import { formatBearing, formatQuantity } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";

interface StoredBox {
  id: string;
  name: string;
  polygon: Position[];
  waterDepth: number | null;
  shoreNormal: number | null;
  distanceToShore: number | null;
  landShare: number | null;
  triggerLevels: TriggerLevel[];
}

export interface BoxFact {
  label: string;
  value: string;
}

export interface PresentedBox {
  id: string;
  name: string;
  polygon: Position[];
  facts: BoxFact[];
}

/** A box as it is read on the Area page, in the organisation's units. */
export function presentBox(box: StoredBox, units: UnitChoices): PresentedBox {
  const { areaKm2, centroid, f, inertialPeriodHours } = measureBox(box.polygon);
  const quantity = (value: number | null, id: "area" | "depth" | "distance" | "share", missing = "not given") =>
    value === null ? missing : formatQuantity(value, id, units).text;
  return {
    id: box.id,
    name: box.name,
    polygon: box.polygon,
    facts: [
      { label: "Centre", value: formatPosition(centroid) },
      { label: "Area", value: quantity(areaKm2 * 1e6, "area") },
      { label: "Coriolis f", value: formatCoriolis(f) },
      {
        label: "Inertial period",
        value: inertialPeriodHours === null ? "none on the equator" : `${inertialPeriodHours.toFixed(1)} h`,
      },
      { label: "Water depth", value: quantity(box.waterDepth, "depth") },
      { label: "Shore", value: quantity(box.distanceToShore, "distance") },
      { label: "Shore normal", value: box.shoreNormal === null ? "not given" : formatBearing(box.shoreNormal) },
      { label: "Land share", value: quantity(box.landShare, "share", "not measured") },
      {
        label: "Trigger levels",
        value: box.triggerLevels.length === 0 ? "none" : String(box.triggerLevels.length),
      },
    ],
  };
}
