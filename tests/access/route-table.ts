import type { RouteConfigEntry } from "@react-router/dev/routes";
import routes from "../../app/routes";

export interface RouteEntry {
  /** `routes/org/area/edit.tsx` */
  file: string;
  /** `/o/:organisation/projects/:project/area/:box` */
  path: string;
  /** Where a form is sent to: an index shares its path with its layout and is told apart by a mark. */
  formPath: string;
}

function walk(entries: RouteConfigEntry[], above: string): RouteEntry[] {
  return entries.flatMap((entry) => {
    const path = entry.path ? `${above}/${entry.path}` : above;
    const own = path || "/";
    const formPath = entry.index && own !== "/" ? `${own}?index` : own;
    return [{ file: entry.file, path: own, formPath }, ...walk(entry.children ?? [], path)];
  });
}

/** Every route of the product with its whole address, layouts too. */
export async function routeTable(): Promise<RouteEntry[]> {
  return walk(await routes, "");
}
