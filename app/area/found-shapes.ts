/** Polygons of an imported file on their way to becoming study boxes. */
import { z } from "zod";
import { BOX_LIMITS, checkBox } from "./check-box";
import { measureBox } from "./measure-box";
import { thinRing, type ThinnedRing } from "./thin-ring";
import type { Position } from "~/ocean/scenario";
import type { ShapeReading } from "~/readers/shapes/shape-reading";
import { formatQuantity } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";

/** More shapes than this are no choice of study boxes. */
export const MOST_SHAPES = 200;

/** Shapes of too many corners that are thinned at once: each takes its time. */
const MOST_THINNED = 20;

export interface FoundShape {
  name: string;
  ring: Position[];
  /** What it is, as `4 corners, 1.2 km²`. */
  facts: string;
  /** What is done to it where it is taken: to tick it is to agree. */
  change: string | null;
  /** Why it cannot be a study box; empty where it can. */
  problems: string[];
  /** Whether it has been chosen. */
  taken: boolean;
}

/** The polygons of a reading, each checked as one that was drawn; holes are told of, since a box has none. */
export function foundShapes({ polygons }: Pick<ShapeReading, "polygons">, units: UnitChoices): FoundShape[] {
  let thinning = MOST_THINNED;
  return polygons.slice(0, MOST_SHAPES).map(({ name, outer, holes }) => {
    const thinned = outer.length > BOX_LIMITS.corners && thinning-- > 0 ? thinRing(outer) : null;
    const checked = thinned ? { ok: true as const, ring: thinned.ring } : checkBox(outer);
    const area = checked.ok ? [formatQuantity(measureBox(checked.ring).areaKm2 * 1e6, "area", units).text] : [];
    const hole =
      holes.length === 0 ? [] : [`${holes.length} ${holes.length === 1 ? "hole" : "holes"}, which will be filled`];
    return {
      name: name.slice(0, 120),
      ring: checked.ok ? checked.ring : outer,
      facts: [`${outer.length} corners`, ...area, ...hole].join(", "),
      change: thinned && changeOf(thinned, units),
      problems: checked.ok ? [] : checked.problems.slice(0, 2).map(({ message }) => message),
      // A file of one shape was brought for that shape; where corners go, the person says so.
      taken: checked.ok && !thinned && polygons.length === 1,
    };
  });
}

function changeOf({ ring, deviation }: ThinnedRing, units: UnitChoices): string {
  const moved = formatQuantity(deviation, "depth", units).text;
  return `A study box has at most ${BOX_LIMITS.corners} corners. Taken, it keeps ${ring.length - 1} of them, and its outline moves by less than ${moved}.`;
}

const ringSchema = z.array(z.tuple([z.number(), z.number()])).min(3);

/** The shapes of a form that was sent and refused, as they stood there, so that the file need not be brought again. */
export function shapesOfForm(form: FormData, units: UnitChoices): FoundShape[] {
  const indices = [...form.keys()].flatMap((field) => /^ring-(\d{1,4})$/.exec(field)?.[1] ?? []);
  return indices.slice(0, MOST_SHAPES).flatMap((index) => {
    const ring = ringSchema.safeParse(parsedRing(form.get(`ring-${index}`)));
    const name = form.get(`name-${index}`);
    if (!ring.success || typeof name !== "string") return [];
    const [shape] = foundShapes({ polygons: [{ name, outer: ring.data, holes: [] }] }, units);
    return [{ ...shape, taken: form.has(`take-${index}`) }];
  });
}

const chosen = z.object({
  name: z.string().trim().min(1, "Name the box.").max(120, "Use at most 120 characters."),
  ring: ringSchema,
});
export type ChosenShape = z.infer<typeof chosen>;

export interface ChosenShapes {
  shapes: ChosenShape[];
  /** By name of the field. */
  errors: Record<string, string[]>;
}

/** Fields `take-N` for those that are wanted, with `name-N` and `ring-N`. */
export function readChosenShapes(form: FormData): ChosenShapes {
  const shapes: ChosenShape[] = [];
  const errors: Record<string, string[]> = {};
  for (const field of form.keys()) {
    const index = /^take-(\d{1,4})$/.exec(field)?.[1];
    if (index === undefined) continue;
    const read = chosen.safeParse({ name: form.get(`name-${index}`), ring: parsedRing(form.get(`ring-${index}`)) });
    if (read.success) shapes.push(read.data);
    else
      errors[`name-${index}`] = [
        read.error.issues[0].path[0] === "name"
          ? read.error.issues[0].message
          : "Its corners were lost: bring the file again.",
      ];
  }
  return { shapes, errors };
}

function parsedRing(value: FormDataEntryValue | null): unknown {
  try {
    return typeof value === "string" ? JSON.parse(value) : null;
  } catch {
    return null;
  }
}
