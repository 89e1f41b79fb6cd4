import { UniqueConstraintError } from "sequelize";
import type { BoxValues } from "./box-schema";
import { checkBox } from "./check-box";
import { landShare } from "./land.server";
import type { Tenant } from "~/db/scoped.server";
import type { Position } from "~/ocean/scenario";

/** Beyond this share of land the numbers would not be about the sea. */
const MOST_LAND = 0.5;

type Saved = { id: string; fieldErrors?: undefined } | { fieldErrors: Record<string, string[]> };

async function checkSurroundings(ring: Position[]): Promise<{ share: number | null; refusal: string | null }> {
  const share = await landShare(ring);
  if (share === null || share <= MOST_LAND) return { share, refusal: null };
  const percent = Math.round(share * 100);
  return {
    share,
    refusal: `This box lies on land: ${percent} % of it, by the 100 m coastline. Move it so that at most half is land.`,
  };
}

/**
 * Checks a box against the sphere and the coast, then stores it; `id` null makes a new one.
 * Empty fields are stored as unknown, never as zero.
 */
export async function saveBox(tenant: Tenant, projectId: string, id: string | null, values: BoxValues): Promise<Saved> {
  const checked = checkBox(values.polygon);
  if (!checked.ok) return { fieldErrors: { polygon: checked.problems.map(({ message }) => message) } };
  const { share, refusal } = await checkSurroundings(checked.ring);
  if (refusal !== null) return { fieldErrors: { polygon: [refusal] } };
  const row = {
    name: values.name,
    polygon: checked.ring,
    waterDepth: values.waterDepth ?? null,
    shoreNormal: values.shoreNormal ?? null,
    distanceToShore: values.distanceToShore ?? null,
    landShare: share,
    triggerLevels: values.triggerLevels,
  };
  try {
    if (id === null) return await tenant.studyBoxes.create({ projectId, ...row });
    await tenant.studyBoxes.update(id, row);
    return { id };
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    return { fieldErrors: { name: ["Another box of this project has this name."] } };
  }
}
