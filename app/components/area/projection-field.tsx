import { formatPosition } from "~/area/format-coordinates";
import { Field } from "~/components/field";
import type { ShapeQuestion } from "~/readers/shapes/shape-reading";

/** The system of a shapefile that came without its .prj, each with the place where it puts the shapes. */
export function ProjectionField({ question }: { question: ShapeQuestion }) {
  return (
    <Field
      id="projection"
      label="System of the coordinates"
      hint={`${question.message} The file is sent once more with the answer.`}
    >
      {(described) => (
        <select {...described} name="projection" defaultValue={question.answer ?? ""} className="input">
          <option value="">choose…</option>
          {question.options.map(({ value, label, place }) => (
            <option key={value} value={value}>
              {label}: about {formatPosition(place)}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
