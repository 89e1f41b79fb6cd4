import { useId, useRef, useState, type ChangeEvent, type DragEvent } from "react";
import { Field } from "~/components/field";
import type { FormErrorsByField } from "~/storms/refusal";

interface OriginalFieldsProps {
  uploadLimitBytes: number;
  errors: FormErrorsByField;
  /** Begins the hint of the file: what may be brought. */
  accepts?: string;
  /** Whether the original stays in the project. */
  kept?: boolean;
  pasteLabel?: string;
  pasteHint?: string;
  placeholder?: string;
}

const MEGABYTE = 1024 * 1024;

/** What is said of a storm's series, which most files are. */
const SERIES = {
  accepts:
    "Delimited text of any kind, an agency's buoy, airport or hourly text, an Excel workbook, or CF NetCDF (.nc)",
  pasteHint: "Copy the cells with their heading row, times in the first column, and paste them here.",
  placeholder: "time\twind speed (m/s)\twind from (deg)\train (mm/h)",
};

function tooLarge(file: File, limit: number): string | null {
  if (file.size <= limit) return null;
  const size = (file.size / MEGABYTE).toFixed(1);
  return `${file.name} has ${size} MB; at most ${limit / MEGABYTE} MB are taken at once. Cut it to the days around the storm, or leave out columns.`;
}

/** A file, dropped or chosen, or rows pasted from a spreadsheet: shared by every form that brings a record. */
export function OriginalFields({
  uploadLimitBytes,
  errors,
  accepts = SERIES.accepts,
  kept = true,
  pasteLabel = "Or rows from a spreadsheet",
  pasteHint = SERIES.pasteHint,
  placeholder = SERIES.placeholder,
}: OriginalFieldsProps) {
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const [trouble, setTrouble] = useState<string | null>(null);
  const [chosen, setChosen] = useState<string | null>(null);
  const id = useId();

  const look = (field: HTMLInputElement) => {
    const file = field.files?.[0];
    const message = file ? tooLarge(file, uploadLimitBytes) : null;
    // The browser holds the form back while the field is not valid.
    field.setCustomValidity(message ?? "");
    setTrouble(message);
    setChosen(file ? file.name : null);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    if (!input.current || event.dataTransfer.files.length === 0) return;
    const one = new DataTransfer();
    one.items.add(event.dataTransfer.files[0]);
    input.current.files = one.files;
    look(input.current);
  };
  return (
    <>
      <Field
        id={`${id}-file`}
        label="File"
        errors={trouble ? [trouble] : errors.file}
        hint={`${accepts}, up to ${uploadLimitBytes / MEGABYTE} MB.${kept ? " It is kept as it is, byte for byte." : ""}`}
      >
        {(described) => (
          <div
            onDragOver={(event) => {
              event.preventDefault();
              setOver(true);
            }}
            onDragLeave={() => setOver(false)}
            onDrop={drop}
            className={`border border-dashed px-4 py-5 ${over ? "border-ink bg-mist" : "border-quiet"}`}
          >
            <p className="mb-2 text-slate">{chosen ? <strong>{chosen}</strong> : "Drop a file here, or choose one."}</p>
            <input
              {...described}
              ref={input}
              type="file"
              name="file"
              onChange={(event: ChangeEvent<HTMLInputElement>) => look(event.target)}
              className="block w-full min-w-0 text-base file:mr-3 file:border file:border-ink file:bg-transparent file:px-3 file:py-1.5 file:text-ink"
            />
          </div>
        )}
      </Field>
      <Field id={`${id}-pasted`} label={pasteLabel} errors={errors.pasted} hint={pasteHint}>
        {(described) => (
          <textarea
            {...described}
            name="pasted"
            rows={4}
            spellCheck={false}
            className="input font-sans text-small"
            placeholder={placeholder}
          />
        )}
      </Field>
    </>
  );
}
