import { Form } from "react-router";
import { StudyAreaMap } from "~/components/map/study-area-map";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";
import type { FoundShape } from "~/area/found-shapes";
import type { UnitChoices } from "~/units/unit-choices";

/** The shapes of a file on the map and as a list, to choose those that become study boxes. */
export function ShapeChoices({ shapes, units }: { shapes: FoundShape[]; units: UnitChoices }) {
  const sound = shapes.filter(({ problems }) => problems.length === 0);
  return (
    <Form method="post" encType="multipart/form-data" className="mt-6">
      <SectionHeading>
        {shapes.length} {shapes.length === 1 ? "shape" : "shapes"} found
      </SectionHeading>
      <div className={sound.length > 0 ? "grid gap-6 lg:grid-cols-[3fr_2fr]" : undefined}>
        {sound.length > 0 && (
          <StudyAreaMap
            boxes={sound.map(({ name, ring }) => ({ name, polygon: ring }))}
            units={units}
            label="Shapes of the file on the map"
            className="h-96"
          />
        )}
        <ul className="border-t border-hairline">
          {shapes.map(({ name, ring, facts, change, problems, taken }, index) => (
            <li key={index} className="grid gap-1 border-b border-hairline py-3">
              <label className="flex items-center gap-2.5">
                <input
                  type="checkbox"
                  name={`take-${index}`}
                  disabled={problems.length > 0}
                  defaultChecked={taken}
                  className="size-5 shrink-0 accent-ink"
                />
                <span className="sr-only">Take {name}</span>
                <input
                  name={`name-${index}`}
                  defaultValue={name}
                  aria-label={`Name of the box from ${name}`}
                  disabled={problems.length > 0}
                  maxLength={120}
                  className="input"
                />
              </label>
              <p className="text-small text-slate">{facts}</p>
              {change && <p className="text-small font-bold">{change}</p>}
              {problems.map((problem) => (
                <p key={problem} className="text-small font-bold text-error">
                  {problem}
                </p>
              ))}
              {problems.length === 0 && <input type="hidden" name={`ring-${index}`} value={JSON.stringify(ring)} />}
            </li>
          ))}
        </ul>
      </div>
      <div className="mt-5">
        <SubmitButton busy="Saving…" name="intent" value="save">
          Make study boxes of those chosen
        </SubmitButton>
      </div>
    </Form>
  );
}
