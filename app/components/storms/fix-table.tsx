import { useRef, useState } from "react";
import { WideTable } from "~/components/wide-table";
import { FIX_COLUMNS, FIX_QUANTITIES, fixField, type FixColumn, type FixRow } from "~/storms/posted-track";
import type { FormErrorsByField } from "~/storms/refusal";
import { displayUnit } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

interface FixTableProps {
  rows: FixRow[];
  /** Wind radii in words by row; they come with a file and stay with their time. */
  radii?: string[];
  units: UnitChoices;
  errors: FormErrorsByField;
}

const HEADINGS: Record<FixColumn, { label: string; unit?: string; width: string }> = {
  time: { label: "Time", unit: "UTC", width: "w-40" },
  latitude: { label: "Latitude", unit: "° north", width: "w-22" },
  longitude: { label: "Longitude", unit: "° east", width: "w-24" },
  centralPressure: { label: "Central pressure", unit: "hPa", width: "w-22" },
  maxWind: { label: "Maximum wind", width: "w-22" },
  radiusOfMaximumWind: { label: "Radius of maximum wind", width: "w-22" },
};

const BLANK: FixRow = {
  time: "",
  latitude: "",
  longitude: "",
  centralPressure: "",
  maxWind: "",
  radiusOfMaximumWind: "",
};

const unitOf = (column: FixColumn, units: UnitChoices) => {
  const quantity = FIX_QUANTITIES[column];
  return quantity ? displayUnit(quantity, units).unit : (HEADINGS[column].unit ?? "");
};

/** The fixes of a track to write and change: a row a fix, blank cells where nothing is known. */
export function FixTable({ rows, radii, units, errors }: FixTableProps) {
  const next = useRef(rows.length);
  const [shown, setShown] = useState(() => rows.map((row, key) => ({ key, row })));
  const add = () => {
    const key = next.current++;
    setShown((before) => [...before, { key, row: BLANK }]);
  };
  const withRadii = radii?.some((text) => text !== "");
  return (
    <div className="min-w-0">
      <WideTable label="Fixes of the track">
        <thead>
          <tr>
            {FIX_COLUMNS.map((column) => (
              <th key={column} scope="col">
                {HEADINGS[column].label} <span className="font-normal">({unitOf(column, units)})</span>
              </th>
            ))}
            {withRadii && <th scope="col">Radii NE, SE, SW, NW</th>}
            <th scope="col">
              <span className="sr-only">Remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {shown.map(({ key, row }, index) => (
            <tr key={key}>
              {FIX_COLUMNS.map((column) => (
                <td key={column} className="align-top">
                  <FixCell {...{ column, index }} value={row[column]} errors={errors[fixField(index, column)]} />
                </td>
              ))}
              {withRadii && <td className="min-w-44 text-small text-slate">{radii?.[key] ?? ""}</td>}
              <td className="align-top">
                <button
                  type="button"
                  className="button"
                  aria-label={`Remove fix ${index + 1}`}
                  disabled={shown.length <= 2}
                  onClick={() => setShown((before) => before.filter((entry) => entry.key !== key))}
                >
                  Remove
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </WideTable>
      {errors.fixes && <p className="mt-1 text-small font-bold text-error">{errors.fixes.join(" ")}</p>}
      <button type="button" className="button mt-3" onClick={add}>
        Add a fix
      </button>
    </div>
  );
}

interface FixCellProps {
  column: FixColumn;
  index: number;
  value: string;
  errors?: string[];
}

function FixCell({ column, index, value, errors }: FixCellProps) {
  const { label, width } = HEADINGS[column];
  const errorId = `${fixField(index, column)}-error`;
  return (
    <>
      <input
        name={column}
        defaultValue={value}
        aria-label={`${label}, fix ${index + 1}`}
        aria-invalid={errors ? true : undefined}
        aria-describedby={errors ? errorId : undefined}
        inputMode={column === "time" ? undefined : "decimal"}
        placeholder={column === "time" ? "2026-11-04 00:00" : undefined}
        autoComplete="off"
        className={`input ${width}`}
      />
      {errors && (
        <p id={errorId} className="mt-1 max-w-40 text-small font-bold text-error">
          {errors.join(" ")}
        </p>
      )}
    </>
  );
}
