import { Field } from "~/components/field";
import { KEEP } from "~/estimates/run-request";

interface RunChoicesProps {
  columns: { id: string; name: string }[];
  sheets: { id: string; label: string }[];
  /** Name of the sheet that a new cell takes. */
  defaultSheet: string;
}

/** What the next run uses. Each cell remembers its own; a new one takes the first column and the default sheet. */
export function RunChoices({ columns, sheets, defaultSheet }: RunChoicesProps) {
  return (
    <>
      <Field id="run-water" label="Water column" className="min-w-40">
        {(described) => (
          <select {...described} name="waterColumnId" className="input">
            <option value={KEEP}>each cell’s own, else {columns[0]?.name}</option>
            {columns.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field id="run-sheet" label="Method sheet" className="min-w-40">
        {(described) => (
          <select {...described} name="methodSheetId" className="input">
            <option value={KEEP}>each cell’s own, else {defaultSheet}</option>
            {sheets.map(({ id, label }) => (
              <option key={id} value={id}>
                {label}
              </option>
            ))}
          </select>
        )}
      </Field>
    </>
  );
}
