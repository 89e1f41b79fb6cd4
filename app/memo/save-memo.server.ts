import type { MemoValues } from "./memo-schema";
import type { Memo } from "~/db/models/memo.server";
import type { Tenant } from "~/db/scoped.server";

type Saved = { id: string; fieldErrors?: undefined } | { fieldErrors: { estimates: string[] } };

const FOREIGN = { fieldErrors: { estimates: ["Choose estimates of this project only."] } };

async function belongToProject(tenant: Tenant, projectId: string, estimates: string[]): Promise<boolean> {
  return (await tenant.estimates.count({ projectId, id: estimates })) === estimates.length;
}

async function pointAt(tenant: Tenant, memoId: string, estimates: string[]): Promise<void> {
  await tenant.memoEstimates.remove({ memoId });
  for (const [position, estimateId] of estimates.entries()) {
    await tenant.memoEstimates.create({ memoId, estimateId, position });
  }
}

export function beginMemo(tenant: Tenant, projectId: string, originatorId: string, values: MemoValues): Promise<Saved> {
  return tenant.write(async (inside) => {
    const estimates = [...new Set(values.estimates)];
    if (!(await belongToProject(inside, projectId, estimates))) return FOREIGN;
    const { title, question, findings, purpose } = values;
    const number = (await inside.memos.max("number", { projectId })) + 1;
    const memo = await inside.memos.create({ projectId, number, title, question, findings, purpose, originatorId });
    await pointAt(inside, memo.id, estimates);
    return { id: memo.id };
  });
}

/** A change leaves the checker's signature standing in the row; it no longer matches what the memo says, so it is void. */
export function changeMemo(tenant: Tenant, memo: Memo, values: MemoValues): Promise<Saved> {
  return tenant.write(async (inside) => {
    const estimates = [...new Set(values.estimates)];
    if (!(await belongToProject(inside, memo.projectId, estimates))) return FOREIGN;
    const { title, question, findings, purpose } = values;
    await inside.memos.update(memo.id, { title, question, findings, purpose });
    await pointAt(inside, memo.id, estimates);
    return { id: memo.id };
  });
}

export async function estimatesOf(tenant: Tenant, memoId: string): Promise<string[]> {
  const links = await tenant.memoEstimates.list({ where: { memoId }, order: [["position", "ASC"]] });
  return links.map(({ estimateId }) => estimateId);
}
