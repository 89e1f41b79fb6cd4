/** Responses are kept once for each organisation, input hash and engine version; their series as blobs beside them. */
import { isoTime } from "./build-scenario";
import type { Tenant } from "~/db/scoped.server";
import { fromBlob, toBlob } from "~/db/typed-array.server";
import { SERIES_UNITS, type Response, type ResponseSeries, type SeriesName } from "~/ocean/response";
import { epochSeconds } from "~/units/format-time";

export type ResponseWithoutSeries = Omit<Response, "series">;

export interface ResultKey {
  inputHash: string;
  engineVersion: string;
}

const SERIES_NAMES = Object.keys(SERIES_UNITS) as SeriesName[];

/** Stores a response whose times are ISO 8601; one that is there already stays as it is. */
export async function storeResult(tenant: Tenant, response: Response): Promise<void> {
  const { series, ...rest } = response;
  await tenant.write(async (inner) => {
    const { inputs: inputHash, engine: engineVersion } = response;
    if (await inner.results.first({ where: { inputHash, engineVersion }, without: ["response", "time"] })) return;
    const { id: resultId } = await inner.results.create({
      inputHash,
      engineVersion,
      response: rest,
      length: series.time.length,
      time: toBlob(series.time.map(epochSeconds)),
    });
    for (const name of SERIES_NAMES) {
      const values = series[name];
      await inner.resultSeries.create({
        resultId,
        name,
        unit: SERIES_UNITS[name],
        length: values.length,
        values: toBlob(values),
      });
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

/** The whole response, as it was stored; null where there is none. */
export async function readResponse(tenant: Tenant, { inputHash, engineVersion }: ResultKey): Promise<Response | null> {
  const result = await tenant.results.first({ where: { inputHash, engineVersion } });
  if (!result) return null;
  const rows = await tenant.resultSeries.list({ where: { resultId: result.id } });
  const series = Object.fromEntries(rows.map(({ name, values, length }) => [name, [...fromBlob(values, length)]]));
  return {
    ...result.response,
    series: { time: [...fromBlob(result.time, result.length)].map(isoTime), ...series } as ResponseSeries,
  };
}
