import { enqueue } from "./run-queue.server";
import type { Estimate } from "~/db/models/estimate.server";
import type { MethodSheet } from "~/db/models/method-sheet.server";
import type { Tenant } from "~/db/scoped.server";

export interface Cell {
  studyBoxId: string;
  stormId: string;
}

/** What a run shall use; where absent, each cell keeps what it had, and a new one takes the defaults. */
export interface RunChoice {
  waterColumnId?: string;
  methodSheetId?: string;
}

/** Nothing was started: what must come first, in words. */
export class CannotStart extends Error {
  override name = "CannotStart";
}

/** Newest version first of the sheet that the organisation began with. */
export async function defaultMethodSheet(tenant: Tenant): Promise<MethodSheet | null> {
  const first = await tenant.methodSheets.first({
    order: [
      ["createdAt", "ASC"],
      ["id", "ASC"],
    ],
  });
  return first && tenant.methodSheets.first({ where: { name: first.name }, order: [["version", "DESC"]] });
}

/** Whether the run that is under way is already what is asked for. */
function isAsked(estimate: Estimate, asked: { waterColumnId: string; methodSheetId: string }): boolean {
  return (
    (estimate.state === "queued" || estimate.state === "running") &&
    estimate.waterColumnId === asked.waterColumnId &&
    estimate.methodSheetId === asked.methodSheetId
  );
}

/**
 * Creates the cells' estimates, or queues them again, and puts them in line. One that is on its way with the same
 * column and sheet is left as it is, so that a button pressed twice runs once.
 * @returns the cells' estimates, in their order
 * @throws CannotStart where a cell, column or sheet is not this project's, or there is no column yet
 */
export async function startEstimates(
  tenant: Tenant,
  projectId: string,
  actorId: string,
  cells: Cell[],
  choice: RunChoice = {},
): Promise<string[]> {
  const where = { projectId };
  const started = await tenant.write(async (inner) => {
    const [boxes, storms, columns, existing, sheet] = await Promise.all([
      inner.studyBoxes.list({ where }),
      inner.storms.list({ where }),
      inner.waterColumns.list({ where, order: [["createdAt", "ASC"]] }),
      inner.estimates.list({ where }),
      choice.methodSheetId ? inner.methodSheets.find(choice.methodSheetId) : defaultMethodSheet(inner),
    ]);
    if (columns.length === 0) throw new CannotStart("Describe the water first: there is no water column yet.");
    if (choice.waterColumnId && !columns.some(({ id }) => id === choice.waterColumnId)) {
      throw new CannotStart("This water column is no longer there: choose another.");
    }
    if (!sheet) throw new CannotStart("This method sheet is no longer there: choose another.");
    let number = Math.max(0, ...existing.map((estimate) => estimate.number));
    const results: { id: string; queued: boolean }[] = [];
    for (const { studyBoxId, stormId } of cells) {
      if (!boxes.some(({ id }) => id === studyBoxId) || !storms.some(({ id }) => id === stormId)) {
        throw new CannotStart("This study box or storm is no longer there: open the ledger again.");
      }
      const estimate = existing.find((row) => row.studyBoxId === studyBoxId && row.stormId === stormId);
      const asked = {
        waterColumnId: choice.waterColumnId ?? estimate?.waterColumnId ?? columns[0].id,
        methodSheetId: choice.methodSheetId ?? estimate?.methodSheetId ?? sheet.id,
      };
      if (!estimate) {
        const created = await inner.estimates.create({
          projectId,
          studyBoxId,
          stormId,
          ...asked,
          number: ++number,
          state: "queued",
          problems: null,
          inputHash: null,
          engineVersion: null,
          requestedBy: actorId,
          startedAt: null,
          finishedAt: null,
        });
        results.push({ id: created.id, queued: true });
      } else if (isAsked(estimate, asked)) {
        results.push({ id: estimate.id, queued: false });
      } else {
        await inner.estimates.update(estimate.id, { ...asked, state: "queued", requestedBy: actorId });
        results.push({ id: estimate.id, queued: true });
      }
    }
    return results;
  });
  enqueue(
    tenant.organisationId,
    started.filter(({ queued }) => queued).map(({ id }) => id),
  );
  return started.map(({ id }) => id);
}
