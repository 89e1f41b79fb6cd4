/** Makes the demonstration through the same doors that people use: files are read, confirmed, estimated, checked, issued. */
import { buoyText, gaugeCsv, heatCsv } from "./invented-storm";
import { DEMO, DEMO_BOXES, DEMO_MEMO, DEMO_STORMS, DEMO_WATER } from "./demo-scenario";
import { saveBox } from "~/area/save-box.server";
import { inWriteTransaction } from "~/db/connection.server";
import type { Project } from "~/db/models/project.server";
import type { Storm } from "~/db/models/storm.server";
import { forOrganisation, type Tenant } from "~/db/scoped.server";
import { createOrganisation, createUser, membershipBySlug, findUserByEmail } from "~/db/unscoped.server";
import { DEFAULT_METHOD_SHEET } from "~/estimates/default-method";
import { queueIsEmpty } from "~/estimates/run-queue.server";
import { startEstimates } from "~/estimates/start-estimates.server";
import { composeDraft } from "~/memo/compose-draft.server";
import { issueMemo, signMemo } from "~/memo/issue-memo.server";
import { beginMemo } from "~/memo/save-memo.server";
import { beginProject } from "~/projects/save-project.server";
import { usualStanding } from "~/organisations/permissions";
import type { ReadingAnswers } from "~/readers/reading";
import { hashPassword } from "~/services/password.server";
import { createShareLink } from "~/sharing/share-link.server";
import { confirmRecord } from "~/storms/confirm-record.server";
import { startRecord, startStorm } from "~/storms/start-record.server";
import type { Original } from "~/storms/original.server";
import { DEFAULT_UNITS } from "~/units/unit-choices";

export { DEMO };

interface Seeded {
  path: string;
  users: { email: string; password: string; role: string }[];
}

const HOUR = 3600;
const USERS = DEMO.people.map(({ email, role }) => ({ email, role, password: DEMO.password }));

async function makeOrganisation() {
  const passwordHash = await hashPassword(DEMO.password);
  return inWriteTransaction(async (transaction) => {
    const organisation = await createOrganisation(
      { slug: DEMO.slug, name: DEMO.organisation, units: DEFAULT_UNITS, paperSize: "A4" },
      transaction,
    );
    const tenant = forOrganisation(organisation.id, transaction);
    await tenant.methodSheets.create({ ...DEFAULT_METHOD_SHEET, version: 1 });
    const people = [];
    for (const { email, name, role } of DEMO.people) {
      const user = await createUser({ email, name, passwordHash }, transaction);
      await tenant.memberships.create({ userId: user.id, ...usualStanding(role) });
      people.push({ id: user.id, name, email });
    }
    return { organisation, people };
  });
}

async function must<T>(what: string, found: Promise<T | null>): Promise<T> {
  const row = await found;
  if (row === null) throw new Error(`The demonstration could not find its own ${what}.`);
  return row;
}

function original(name: string, text: string): Original {
  return { name, bytes: new TextEncoder().encode(text), origin: "file" };
}

async function confirm(
  tenant: Tenant,
  project: Project,
  record: { id: string; stormId: string },
  shape: (typeof DEMO_STORMS)[number],
  answers: ReadingAnswers,
  userId: string,
): Promise<Storm> {
  await tenant.records.update(record.id, { answers });
  const storm = await must("storm", tenant.storms.find(record.stormId));
  const start = Date.parse(shape.shape.start) / 1000;
  await confirmRecord(tenant, storm, await must("record", tenant.records.find(record.id)), {
    window: { startsAt: start + shape.window.fromHour * HOUR, endsAt: start + shape.window.toHour * HOUR },
    choices: {},
    confirmedBy: userId,
    confirmedAt: new Date().toISOString(),
    zone: project.timeZone,
  });
  return must("storm", tenant.storms.find(record.stormId));
}

async function makeStorm(
  tenant: Tenant,
  project: Project,
  demo: (typeof DEMO_STORMS)[number],
  user: { id: string },
): Promise<Storm> {
  const wind = original(`${demo.file}-buoy.txt`, buoyText(demo.shape));
  const record = await startStorm(tenant, project, demo.name, wind, user.id);
  const storm = await confirm(tenant, project, record, demo, { windHeight: 4, averagingMinutes: 8 }, user.id);
  for (const file of [
    original(`${demo.file}-gauge.csv`, gaugeCsv(demo.shape)),
    original(`${demo.file}-heat.csv`, heatCsv(demo.shape)),
  ]) {
    const added = await startRecord(tenant, storm, file, user.id);
    await confirm(tenant, project, added, demo, { zone: "UTC" }, user.id);
  }
  return must("storm", tenant.storms.find(storm.id));
}

async function makeProject(tenant: Tenant, userId: string): Promise<Project> {
  const begun = await beginProject(tenant, DEMO.project, userId);
  if (begun.fieldErrors) throw new Error("The demonstration's project was refused.");
  return must("project", tenant.projects.find(begun.id));
}

async function makeBoxes(tenant: Tenant, project: Project): Promise<void> {
  for (const box of DEMO_BOXES) {
    const saved = await saveBox(tenant, project.id, null, box);
    if (saved.fieldErrors) throw new Error(`${box.name}: ${Object.values(saved.fieldErrors).flat().join(" ")}`);
  }
}

async function runEverything(tenant: Tenant, project: Project, userId: string): Promise<string[]> {
  const where = { projectId: project.id };
  const boxes = await tenant.studyBoxes.list({ where, order: [["createdAt", "ASC"]] });
  const storms = await tenant.storms.list({ where, order: [["createdAt", "ASC"]] });
  const cells = boxes.flatMap((box) => storms.map((storm) => ({ studyBoxId: box.id, stormId: storm.id })));
  const ids = await startEstimates(tenant, project.id, userId, cells);
  await queueIsEmpty();
  return ids;
}

/** Idempotent: what is there already is left as it is. */
export async function seedDemo(): Promise<Seeded> {
  const known = await findUserByEmail(DEMO.people[0].email);
  const there = known && (await membershipBySlug(known.id, DEMO.slug));
  if (there) {
    const [project] = await forOrganisation(there.organisation.id).projects.list({ order: [["createdAt", "ASC"]] });
    return { path: project ? `/o/${DEMO.slug}/projects/${project.id}` : `/o/${DEMO.slug}`, users: USERS };
  }
  const { organisation, people } = await makeOrganisation();
  const [owner, consultant] = people;
  const tenant = forOrganisation(organisation.id);
  const project = await makeProject(tenant, owner.id);
  await makeBoxes(tenant, project);
  await tenant.waterColumns.create({ projectId: project.id, ...DEMO_WATER });
  for (const storm of DEMO_STORMS) await makeStorm(tenant, project, storm, owner);
  const [first, , second] = await runEverything(tenant, project, owner.id);

  const begun = await beginMemo(tenant, project.id, owner.id, { ...DEMO_MEMO, estimates: [first, second] });
  if (begun.fieldErrors) throw new Error("The demonstration's memo was refused.");
  const signing = async (actor: (typeof people)[number]) => {
    const memo = await must("memo", tenant.memos.find(begun.id));
    const { content } = await composeDraft(tenant, organisation, project, memo);
    return { tenant, organisation, project, memo, actor, content };
  };
  const refusal = await signMemo(await signing(consultant));
  if (refusal) throw new Error(refusal);
  const issued = await issueMemo(await signing(owner));
  if ("refusal" in issued) throw new Error(issued.refusal);
  await createShareLink(tenant, {
    memoRevisionId: issued.revisionId,
    recipient: DEMO.project.client,
    days: 90,
    createdBy: owner.id,
  });
  return { path: `/o/${DEMO.slug}/projects/${project.id}`, users: USERS };
}
