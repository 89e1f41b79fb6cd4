import { saveBox } from "./save-box.server";
import type { ChosenShape } from "./found-shapes";
import type { Tenant } from "~/db/scoped.server";

/** A shape that could not be saved, and why. */
export interface RefusedShape {
  name: string;
  messages: string[];
}

/** Thrown inside the transaction, so that nothing of an import is kept where one of its shapes is refused. */
class ShapesRefused extends Error {
  constructor(readonly refused: RefusedShape[]) {
    super("Shapes were refused.");
  }
}

/**
 * Makes study boxes of chosen shapes, all or none.
 * @returns those that stood in the way; empty where all were saved
 */
export async function saveShapes(
  tenant: Tenant,
  projectId: string,
  shapes: readonly ChosenShape[],
): Promise<RefusedShape[]> {
  try {
    await tenant.write(async (inner) => {
      const refused: RefusedShape[] = [];
      for (const { name, ring } of shapes) {
        const saved = await saveBox(inner, projectId, null, { name, polygon: ring, triggerLevels: [] });
        if (saved.fieldErrors) refused.push({ name, messages: Object.values(saved.fieldErrors).flat() });
      }
      if (refused.length > 0) throw new ShapesRefused(refused);
    });
    return [];
  } catch (error) {
    if (error instanceof ShapesRefused) return error.refused;
    throw error;
  }
}
