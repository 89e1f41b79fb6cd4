/** Responses are kept once for each organisation, input hash and engine version; their series as blobs beside them. */
import {
  readBands,
  readColumn,
  readMemberFigures,
  readSeries,
  ROWS_WITHOUT_PROFILES,
  storedSeries,
  type LongParts,
} from "./stored-series";
import type { Tenant } from "~/db/scoped.server";
import { fromBlob, toBlob } from "~/db/typed-array.server";
import type { Response } from "~/ocean/response";
import { epochSeconds } from "~/units/format-time";

export type ResponseWithoutSeries = Omit<Response, keyof LongParts>;

export interface ResultKey {
  inputHash: string;
  engineVersion: string;
}

/** Stores a response whose times are ISO 8601; one that is there already stays as it is. */
export async function storeResult(tenant: Tenant, response: Response): Promise<void> {
  const { series, bands, column, memberFigures, ...rest } = response;
  const { inputs: inputHash, engine: engineVersion } = response;
  await tenant.write(async (inner) => {
    if (await resultIsStored(inner, { inputHash, engineVersion })) return;
    const { id: resultId } = await inner.results.create({
      inputHash,
      engineVersion,
      response: rest,
      length: series.time.length,
      time: toBlob(series.time.map(epochSeconds)),
    });
    for (const { name, unit, values } of storedSeries({ series, bands, column, memberFigures })) {
      await inner.resultSeries.create({ resultId, name, unit, length: values.length, values: toBlob(values) });
    }
  });
}

export async function resultIsStored(tenant: Tenant, { inputHash, engineVersion }: ResultKey): Promise<boolean> {
  return (await tenant.results.count({ inputHash, engineVersion })) > 0;
}

/** Responses without their series, by input hash and engine version as `resultKey` writes them. */
export async function readHeadlines(tenant: Tenant, keys: ResultKey[]): Promise<Map<string, ResponseWithoutSeries>> {
  const rows = await tenant.results.list({
    where: { inputHash: [...new Set(keys.map(({ inputHash }) => inputHash))] },
    without: ["time"],
  });
  return new Map(rows.map((row) => [resultKey(row), row.response]));
}

export function resultKey({ inputHash, engineVersion }: ResultKey): string {
  return `${engineVersion} ${inputHash}`;
}

/**
 * The whole response, as it was stored; null where there is none.
 * @param profiles false leaves the column's profiles, by far its longest part, in the database
 */
export async function readResponse(
  tenant: Tenant,
  { inputHash, engineVersion }: ResultKey,
  { profiles = true } = {},
): Promise<Response | null> {
  const result = await tenant.results.first({ where: { inputHash, engineVersion } });
  if (!result) return null;
  const rows = await tenant.resultSeries.list({
    where: { resultId: result.id, ...(!profiles && { name: [...ROWS_WITHOUT_PROFILES] }) },
  });
  const values = new Map(rows.map((row) => [row.name, [...fromBlob(row.values, row.length)]]));
  const bands = readBands(values);
  const column = readColumn(values);
  const memberFigures = readMemberFigures(values);
  return {
    ...result.response,
    series: readSeries([...fromBlob(result.time, result.length)], values),
    ...(bands && { bands }),
    ...(column && { column }),
    ...(memberFigures && { memberFigures }),
  };
}
