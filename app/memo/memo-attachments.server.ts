import { responseCsv } from "~/estimates/response-csv";
import type { Tenant } from "~/db/scoped.server";
import { loadSeries } from "~/storms/load-series.server";
import { seriesCsv } from "~/storms/series-csv";
import type { PointedEstimate } from "./memo-estimates.server";
import type { Attachment } from "./render-pdf.server";

function bytes(text: string): Uint8Array {
  return new TextEncoder().encode(text);
}

function json(value: unknown): Uint8Array {
  return bytes(`${JSON.stringify(value, null, 2)}\n`);
}

/** File names that every system takes. */
function plainName(text: string): string {
  return (
    text
      .normalize("NFKD")
      .replace(/[^A-Za-z0-9]+/g, "-")
      .replace(/^-|-$/g, "")
      .toLowerCase() || "storm"
  );
}

async function stormSeries(tenant: Tenant, pointed: PointedEstimate[]): Promise<Attachment[]> {
  const storms = new Map(pointed.map(({ estimate, register }) => [estimate.stormId, register.storm.name]));
  const attachments: Attachment[] = [];
  for (const [number, [stormId, name]] of [...storms].entries()) {
    const series = await loadSeries(tenant, stormId);
    if (series.length === 0) continue;
    attachments.push({
      name: `inputs-${number + 1}-${plainName(name)}.csv`,
      type: "text/csv",
      description: `Series of ${name} as read, times in UTC`,
      bytes: bytes(seriesCsv(series)),
    });
  }
  return attachments;
}

function results({ code, register, response }: PointedEstimate): Attachment[] {
  if (!response) return [];
  const of = `estimate ${code}: ${register.box.name}, ${register.storm.name}`;
  return [
    {
      name: `response-${plainName(code)}.json`,
      type: "application/json",
      description: `Response of ${of}`,
      bytes: json(response),
    },
    {
      name: `response-${plainName(code)}.csv`,
      type: "text/csv",
      description: `Series of the response of ${of}`,
      bytes: bytes(responseCsv(response)),
    },
  ];
}

/** Every input by file and hash, every method by value and source: what is needed to compute the memo again. */
function manifest(pointed: PointedEstimate[]): Attachment {
  return {
    name: "manifest.json",
    type: "application/json",
    description: "Inputs with their SHA-256, methods and engine of every estimate",
    bytes: json({
      estimates: pointed.map(({ code, register, response, assumptions }) => ({
        code,
        inputs: response?.inputs ?? null,
        engine: response?.engine ?? null,
        method: response?.method ?? null,
        register,
        assumptions,
      })),
    }),
  };
}

/** The data that travels inside the memo's PDF. */
export async function memoAttachments(tenant: Tenant, pointed: PointedEstimate[]): Promise<Attachment[]> {
  if (pointed.length === 0) return [];
  return [...(await stormSeries(tenant, pointed)), ...pointed.flatMap(results), manifest(pointed)];
}
