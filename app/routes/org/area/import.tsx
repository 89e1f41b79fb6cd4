import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/import";
import { foundShapes, MOST_SHAPES, readChosenShapes, shapesOfForm, type FoundShape } from "~/area/found-shapes";
import { saveShapes } from "~/area/save-shapes.server";
import { ShapeChoices } from "~/components/area/shape-choices";
import { Field, FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { SubmitButton } from "~/components/submit-button";
import { currentProject } from "~/projects/current-project.server";
import { UnreadableFile } from "~/readers/reading";
import { readShape } from "~/readers/shapes/read-shape";
import type { ShapeQuestion } from "~/readers/shapes/shape-reading";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { originalFrom, receiveForm } from "~/storms/receive-original.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation } = await currentProject(context, params, "project.edit");
  return { units: organisation.units };
}

interface Answer {
  shapes?: FoundShape[];
  question?: ShapeQuestion | null;
  /** Notes of the reading, in sentences. */
  notes?: string[];
  errors?: Partial<Record<string, string[]>>;
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    if (form.get("intent") !== "save") {
      const projection = form.get("projection");
      const { bytes, name } = await originalFrom(form);
      try {
        const answers = typeof projection === "string" && projection !== "" ? { projection } : {};
        const reading = readShape({ bytes, fileName: name, answers });
        const more = reading.polygons.length - MOST_SHAPES;
        const notes = reading.problems.map(({ message }) => message);
        if (more > 0) notes.push(`The file has ${more} shapes more than the ${MOST_SHAPES} that are shown.`);
        return data<Answer>({
          shapes: foundShapes(reading, organisation.units),
          question: reading.questions.find(({ needed }) => needed) ?? null,
          notes,
        });
      } catch (error) {
        if (!(error instanceof UnreadableFile)) throw error;
        return data<Answer>({ errors: { file: error.problems.map(({ message }) => message) } }, { status: 400 });
      }
    }
    const { shapes, errors } = readChosenShapes(form);
    const refuse = (refusals: Answer["errors"]) =>
      data<Answer>({ shapes: shapesOfForm(form, organisation.units), errors: refusals }, { status: 400 });
    if (shapes.length === 0 && Object.keys(errors).length === 0) errors.shapes = ["Choose at least one shape."];
    if (Object.keys(errors).length > 0) return refuse(errors);
    const refused = await saveShapes(tenant, project.id, shapes);
    if (refused.length > 0) {
      const messages = refused.map(({ name, messages: why }) => `${name}: ${why.join(" ")}`);
      return refuse({ shapes: [...messages, "Nothing was saved."] });
    }
    return redirect(`/o/${organisation.slug}/projects/${project.id}/area`);
  });
}

export default function ImportShapes({ actionData, loaderData }: Route.ComponentProps) {
  const answer: Answer = actionData ?? {};
  const errors = answer.errors ?? {};
  return (
    <>
      <PageTitle>Import shapes</PageTitle>
      <p className="max-w-prose text-slate">
        Bring GeoJSON, KML, KMZ, or a shapefile zipped with its .prj and .dbf. Each polygon can become a study box;
        nothing is saved before you choose.
      </p>
      <Form method="post" encType="multipart/form-data" className="mt-5 grid max-w-2xl gap-4">
        <Field id="file" label="File" errors={errors.file}>
          {(described) => (
            <input
              {...described}
              type="file"
              name="file"
              accept=".geojson,.json,.kml,.kmz,.zip,.shp,application/geo+json"
              className="input"
            />
          )}
        </Field>
        <Field id="pasted" label="Or paste GeoJSON or KML" errors={errors.pasted} optional>
          {(described) => (
            <textarea {...described} name="pasted" rows={3} spellCheck={false} className="input font-sans" />
          )}
        </Field>
        {answer.question && (
          <Field
            id="projection"
            label="Projection"
            hint={`${answer.question.message} Choose it and the file once more.`}
          >
            {(described) => (
              <select {...described} name="projection" className="input">
                <option value="">choose…</option>
                {answer.question?.options.map(({ value, label }) => (
                  <option key={value} value={value}>
                    {label}
                  </option>
                ))}
              </select>
            )}
          </Field>
        )}
        <div className="flex gap-2">
          <SubmitButton busy="Reading…" name="intent" value="read" primary={!answer.shapes}>
            Read it
          </SubmitButton>
          <Link to=".." relative="path" className="button">
            Cancel
          </Link>
        </div>
      </Form>
      <div className="mt-5">
        <FormErrors
          errors={[
            ...(answer.notes ?? []),
            ...Object.entries(errors).flatMap(([field, messages]) =>
              field === "file" || field === "pasted" ? [] : (messages ?? []),
            ),
          ]}
        />
      </div>
      {answer.shapes && !answer.question && <ShapeChoices shapes={answer.shapes} units={loaderData.units} />}
    </>
  );
}
