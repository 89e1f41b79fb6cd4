import type { StormRecord } from "~/db/models/record.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { UnreadableFile, type SeriesReading } from "~/readers/reading";
import { refuseInScenario } from "./copy-as-scenario.server";
import { keepOriginal, type Original } from "./original.server";
import { readOriginal } from "./read-record.server";
import { StormRefusal } from "./refusal";
import { freeName, proposeStormName } from "./storm-name";

/** @throws StormRefusal where nothing at all can be read: what, where and what to do */
function firstReading(original: Original): SeriesReading {
  try {
    return readOriginal(original, {});
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    const field = original.origin === "file" ? "file" : "pasted";
    const messages = error.problems.map(({ message }) => message);
    throw new StormRefusal([`${original.name}: nothing was saved.`, ...messages], field);
  }
}

/** A record in state `reading`: its reading sheet asks what the file does not say. Inside a writing transaction. */
async function addRecord(
  tenant: Tenant,
  storm: Pick<Storm, "id" | "projectId">,
  original: Original,
  userId: string,
): Promise<StormRecord> {
  const source = await keepOriginal(tenant, storm.projectId, original, userId);
  return tenant.records.create({
    stormId: storm.id,
    sourceFileId: source.id,
    name: original.name.slice(0, 255),
    origin: original.origin,
    state: "reading",
    answers: {},
    provenance: null,
    createdBy: userId,
  });
}

/**
 * Brings a file or a paste to a storm that is there.
 * @throws StormRefusal where nothing can be read, or the storm is a scenario, before anything is saved
 */
export async function startRecord(
  tenant: Tenant,
  storm: Pick<Storm, "id" | "projectId">,
  original: Original,
  userId: string,
): Promise<StormRecord> {
  firstReading(original);
  return tenant.write(async (inner) => {
    await refuseInScenario(inner, storm.id);
    return addRecord(inner, storm, original, userId);
  });
}

/**
 * Begins a storm with its first record.
 * @param name empty: proposed from what the file says
 * @throws StormRefusal where nothing can be read or the name is taken, before anything is saved
 */
export async function startStorm(
  tenant: Tenant,
  project: { id: string; timeZone: string },
  name: string,
  original: Original,
  userId: string,
): Promise<StormRecord> {
  const reading = firstReading(original);
  return tenant.write(async (inner) => {
    const taken = new Set((await inner.storms.list({ where: { projectId: project.id } })).map((storm) => storm.name));
    if (taken.has(name)) throw new StormRefusal(`Another storm of this project is named "${name}".`, "name");
    const storm = await inner.storms.create({
      projectId: project.id,
      name: name || freeName(proposeStormName(reading, project.timeZone), taken),
      startsAt: null,
      endsAt: null,
    });
    return addRecord(inner, storm, original, userId);
  });
}
