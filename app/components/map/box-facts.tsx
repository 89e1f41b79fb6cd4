import { formatCoriolis } from "~/area/format-coriolis";
import { formatPosition } from "~/area/format-coordinates";
import { measureBox } from "~/area/measure-box";
import type { Position } from "~/ocean/scenario";
import { formatQuantity, joinUnit } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";

/** What is measured while a box is drawn: told politely to screen readers as it changes. */
export function BoxFacts({ ring, units }: { ring: Position[] | null; units: UnitChoices }) {
  return (
    <div aria-live="polite" aria-atomic="true" className="min-h-24 text-small">
      {ring ? (
        <dl className="grid grid-cols-2 gap-x-4 gap-y-1">
          {factsOf(ring, units).map(({ label, value }) => (
            <div key={label}>
              <dt className="text-quiet">{label}</dt>
              <dd>{value}</dd>
            </div>
          ))}
        </dl>
      ) : (
        <p className="text-quiet">Area, centre, f and inertial period appear here once the box has three corners.</p>
      )}
    </div>
  );
}

function factsOf(ring: Position[], units: UnitChoices): { label: string; value: string }[] {
  const { areaKm2, widthKm, heightKm, centroid, f, inertialPeriodHours } = measureBox(ring);
  const across = (km: number) => formatQuantity(km * 1000, "distance", units).text;
  return [
    { label: "Extent, west–east by south–north", value: `${across(widthKm)} by ${across(heightKm)}` },
    { label: "Area", value: formatQuantity(areaKm2 * 1e6, "area", units).text },
    { label: "Centre (WGS 84)", value: formatPosition(centroid) },
    { label: "Coriolis f", value: formatCoriolis(f) },
    {
      label: "Inertial period",
      value: inertialPeriodHours === null ? "none on the equator" : joinUnit(inertialPeriodHours.toFixed(1), "h"),
    },
  ];
}
