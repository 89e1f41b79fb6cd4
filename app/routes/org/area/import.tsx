import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/import";
import { foundShapes, MOST_SHAPES, readChosenShapes, shapesOfForm, type FoundShape } from "~/area/found-shapes";
import { saveShapes } from "~/area/save-shapes.server";
import { ProjectionField } from "~/components/area/projection-field";
import { ShapeChoices } from "~/components/area/shape-choices";
import { FormErrors } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { OriginalFields } from "~/components/storms/original-fields";
import { ProblemList } from "~/components/storms/problem-list";
import { SubmitButton } from "~/components/submit-button";
import { UnderstoodLines } from "~/components/understood-lines";
import { currentProject } from "~/projects/current-project.server";
import { UnreadableFile, type ReadingProblem, type Understood } from "~/readers/reading";
import { readShape } from "~/readers/shapes/read-shape";
import type { ShapeQuestion } from "~/readers/shapes/shape-reading";
import { config } from "~/services/config.server";
import { answerRefusal } from "~/storms/answer-refusal.server";
import { originalFrom, receiveForm } from "~/storms/receive-original.server";
import type { FormErrorsByField } from "~/storms/refusal";
import type { UnitChoices } from "~/units/unit-choices";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation } = await currentProject(context, params, "project.edit");
  return { units: organisation.units, uploadLimitBytes: config().uploadLimitBytes };
}

interface Answer {
  shapes?: FoundShape[];
  question?: ShapeQuestion | null;
  understood?: Understood[];
  problems?: ReadingProblem[];
  errors?: FormErrorsByField;
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.edit");
  return answerRefusal(async () => {
    const form = await receiveForm(request);
    if (form.get("intent") !== "save") return readPosted(form, organisation.units);
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

async function readPosted(form: FormData, units: UnitChoices) {
  const { bytes, name, origin } = await originalFrom(form);
  const projection = form.get("projection");
  try {
    const answers = typeof projection === "string" && projection !== "" ? { projection } : {};
    const reading = readShape({ bytes, fileName: name, answers });
    const question = reading.questions.at(0) ?? null;
    return data<Answer>({
      // Before the system is known, nobody can say where a shape lies.
      shapes: question?.needed ? undefined : foundShapes(reading, units),
      question,
      understood: reading.understood,
      problems: question?.needed ? [] : [...reading.problems, ...beyondShown(reading.polygons.length)],
    });
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    const messages = error.problems.map(({ message }) => message);
    const field = origin === "file" ? "file" : "pasted";
    return data<Answer>({ errors: { [field]: [`${name}: nothing was saved.`, ...messages] } }, { status: 400 });
  }
}

function beyondShown(count: number): ReadingProblem[] {
  if (count <= MOST_SHAPES) return [];
  const message = `The file has ${count} shapes; the first ${MOST_SHAPES} are shown. Cut it to the study area.`;
  return [{ severity: "note", code: "manyShapes", message }];
}

export default function ImportShapes({ actionData, loaderData }: Route.ComponentProps) {
  const answer: Answer = actionData ?? {};
  const errors = answer.errors ?? {};
  const { shapes, question, understood = [], problems = [] } = answer;
  return (
    <>
      <PageTitle>Import shapes</PageTitle>
      <p className="max-w-prose text-slate">
        Each polygon of a file can become a study box. Nothing is saved before you have seen them on the map and chosen.
      </p>
      <Form method="post" encType="multipart/form-data" className="mt-5 grid max-w-2xl gap-5">
        <OriginalFields
          uploadLimitBytes={loaderData.uploadLimitBytes}
          errors={errors}
          accepts="GeoJSON, KML, KMZ, or a shapefile zipped with its .prj and .dbf"
          kept={false}
          pasteLabel="Or GeoJSON or KML as text"
          pasteHint="Corners in decimal degrees or degrees and minutes go into the form of a new study box."
          placeholder={'{"type": "Polygon", "coordinates": [[[-8.3, 54.4], …]]}'}
        />
        {question && <ProjectionField question={question} />}
        <div className="flex flex-wrap gap-2">
          <SubmitButton busy="Reading…" name="intent" value="read" primary={!shapes}>
            Read it
          </SubmitButton>
          <Link to=".." relative="path" className="button">
            Cancel
          </Link>
        </div>
      </Form>
      <div className="mt-5">
        <FormErrors
          errors={Object.entries(errors).flatMap(([field, messages]) =>
            field === "file" || field === "pasted" ? [] : (messages ?? []),
          )}
        />
      </div>
      <ProblemList problems={problems} dropped={[]} />
      {understood.length > 0 && (
        <>
          <SectionHeading>What was understood</SectionHeading>
          <UnderstoodLines lines={understood} />
        </>
      )}
      {shapes && <ShapeChoices shapes={shapes} units={loaderData.units} />}
    </>
  );
}
