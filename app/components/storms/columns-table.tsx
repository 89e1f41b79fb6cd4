import { useState } from "react";
import { WideTable } from "~/components/wide-table";
import type { ColumnReading, ReadingAnswers } from "~/readers/reading";
import { NO_CODES, roleLabel, ROLES, unitsFor } from "~/storms/answers-form";
import type { PresentedReading } from "~/storms/present-reading";
import type { FormErrorsByField } from "~/storms/refusal";

interface ColumnsTableProps {
  reading: PresentedReading;
  answers: ReadingAnswers;
  errors: FormErrorsByField;
}

/** What each column was taken for; every cell can be changed in place, and left empty stays as read. */
export function ColumnsTable({ reading, answers, errors }: ColumnsTableProps) {
  const askedAbove = (key: "columns" | "missingCodes", index: number) =>
    reading.questions.some((question) => question.key === key && question.column === index);
  return (
    <WideTable label="Columns">
      <thead>
        <tr>
          <th scope="col" className="number">
            No.
          </th>
          <th scope="col">Column</th>
          <th scope="col">Taken for</th>
          <th scope="col">Unit</th>
          <th scope="col">Codes for missing</th>
          <th scope="col" className="number">
            Missing
          </th>
          <th scope="col">How sure</th>
        </tr>
      </thead>
      <tbody>
        {reading.columns.map((column) => (
          <ColumnRow
            key={column.index}
            column={column}
            answers={answers}
            errors={errors}
            unitAskedAbove={askedAbove("columns", column.index)}
            codesAskedAbove={askedAbove("missingCodes", column.index)}
          />
        ))}
      </tbody>
    </WideTable>
  );
}

interface ColumnRowProps extends Pick<ColumnsTableProps, "answers" | "errors"> {
  column: ColumnReading;
  unitAskedAbove: boolean;
  codesAskedAbove: boolean;
}

function ColumnRow({ column, answers, errors, unitAskedAbove, codesAskedAbove }: ColumnRowProps) {
  const { index, name, statedUnit, missingCodes, missing, confidence, note } = column;
  const answer = answers.columns?.[String(index)];
  const codes = answers.missingCodes?.[String(index)];
  const [role, setRole] = useState<ColumnReading["role"]>(column.role);
  const units = unitsFor(role);
  const asRead = unitsFor(column.role).find(({ value }) => value === column.unit)?.label;
  const trouble = errors[`unit-${index}`];
  return (
    <tr className={column.role === "leftOut" ? "text-quiet" : undefined}>
      <td className="number">{index + 1}</td>
      <td className="min-w-28">
        <span className="break-words">{name}</span>
        {statedUnit && <span className="text-quiet"> ({statedUnit})</span>}
      </td>
      <td>
        <select
          name={`role-${index}`}
          aria-label={`What column ${name} is`}
          defaultValue={answer ? answer.role : ""}
          onChange={(event) =>
            setRole(event.target.value === "" ? column.role : (event.target.value as ColumnReading["role"]))
          }
          className="input min-w-48"
        >
          <option value="">{answer ? "as the reader takes it" : `as read: ${roleLabel(column.role)}`}</option>
          {ROLES.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </td>
      <td>
        {unitAskedAbove ? (
          <span className="text-quiet">{asRead ?? "see the question above"}</span>
        ) : units.length === 0 ? (
          <span className="text-quiet">none</span>
        ) : (
          <select
            name={`unit-${index}`}
            aria-label={`Unit of column ${name}`}
            aria-invalid={trouble ? true : undefined}
            defaultValue={answer?.unit ?? ""}
            className="input min-w-36"
          >
            <option value="">{asRead && !answer?.unit ? `as read: ${asRead}` : "as read"}</option>
            {units.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </select>
        )}
        {trouble && <p className="text-small font-bold text-error">{trouble.join(" ")}</p>}
      </td>
      <td>
        {codesAskedAbove ? (
          <span className="text-quiet">{missingCodes.join(", ")}</span>
        ) : (
          <input
            name={`missing-${index}`}
            aria-label={`Codes for missing in column ${name}; ${NO_CODES} where there are none`}
            defaultValue={codes === undefined ? "" : codes.length === 0 ? NO_CODES : codes.join(" ")}
            placeholder={missingCodes.join(" ") || NO_CODES}
            autoComplete="off"
            className="input min-w-24"
          />
        )}
      </td>
      <td className="number">{missing}</td>
      <td className="min-w-32">
        {confidence}
        {note && <span className="block text-small text-quiet">{note}</span>}
      </td>
    </tr>
  );
}
