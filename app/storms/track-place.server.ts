import { measureBox } from "~/area/measure-box";
import type { Tenant } from "~/db/scoped.server";
import type { Position } from "~/ocean/scenario";

export interface TrackPlace {
  boxes: { id: string; name: string; polygon: Position[] }[];
  /** The box that is looked at; null while the project has none. */
  box: { id: string; name: string } | null;
  /** Its middle. */
  place: Position | null;
}

/** The boxes of a project, and the one at which a track's wind is shown: the one asked for, else the first. */
export async function trackPlace(tenant: Tenant, projectId: string, request: Request): Promise<TrackPlace> {
  const rows = await tenant.studyBoxes.list({
    where: { projectId },
    order: [
      ["createdAt", "ASC"],
      ["id", "ASC"],
    ],
  });
  const asked = new URL(request.url).searchParams.get("box");
  const box = rows.find(({ id }) => id === asked) ?? rows[0];
  return {
    boxes: rows.map(({ id, name, polygon }) => ({ id, name, polygon })),
    box: box ? { id: box.id, name: box.name } : null,
    place: box ? measureBox(box.polygon).centroid : null,
  };
}
