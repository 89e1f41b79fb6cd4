/** How the numbers came about: parameters, equations, assumptions, limits. */
import type { MethodSource } from "~/ocean/method-source";
import type { MethodEntry, MethodUsed } from "~/ocean/response";
import { methodSources } from "~/ocean/sources";
import type { Block, ReferenceItem } from "../document";
import { parameterName, parameterValue, printedNumbers } from "../method-words";
import { equationRuns } from "../equation-runs";
import type { MemoInput } from "../memo-input";
import { cell, column } from "./section";

export function methodBlocks(input: MemoInput, references: readonly ReferenceItem[]): Block[] {
  return [
    ...parameterBlocks(input),
    ...methodsOf(input).map((method, index) => equation(method, index + 1, references)),
    ...assumptionBlocks(input),
  ];
}

/** The methods of all estimates, each once. */
function methodsOf({ estimates }: MemoInput): MethodSource[] {
  const methods = estimates.flatMap(({ response }) => methodSources(response));
  return [...new Map(methods.map((method) => [method.id, method])).values()];
}

/** Every citation once, in the order in which the methods are told. */
export function referencesOf(input: MemoInput): ReferenceItem[] {
  const items = new Map<string, ReferenceItem>();
  for (const { id, citation, doi } of methodsOf(input))
    if (citation !== "" && !items.has(citation))
      items.set(citation, { id, text: citation, ...(doi ? { link: `https://doi.org/${doi}` } : {}) });
  return [...items.values()];
}

/** One table for all estimates that share their method, so that a reader sees at once whether they do. */
function parameterBlocks({ estimates }: MemoInput): Block[] {
  const groups = new Map<string, { codes: string[]; method: MethodUsed }>();
  for (const { code, response } of estimates) {
    const key = JSON.stringify(response.method);
    const group = groups.get(key);
    if (group) group.codes.push(code);
    else groups.set(key, { codes: [code], method: response.method });
  }
  return [...groups.values()].map(({ codes, method }): Block => {
    const entries = Object.entries(method) as [string, MethodEntry][];
    return {
      kind: "table",
      caption: `Laws and parameters of ${codes.length === 1 ? "estimate" : "estimates"} ${codes.join(", ")}.`,
      columns: [
        column("Law or parameter"),
        column("Value", "", "right"),
        column("Unit"),
        column("Origin"),
        column("Source"),
      ],
      rows: entries.map(([key, { value, unit, origin, source }]) => [
        cell(parameterName(key)),
        cell(parameterValue(value)),
        cell(unit === "1" ? "" : unit),
        cell(origin),
        cell(source),
      ]),
    };
  });
}

function equation(method: MethodSource, number: number, references: readonly ReferenceItem[]): Block {
  const reference = references.findIndex(({ text }) => text === method.citation);
  const source = [
    reference >= 0 ? `Source: [${reference + 1}], ${method.provenance}.` : `Source: ${method.provenance}.`,
    method.validRange ? printedNumbers(`Valid range: ${method.validRange}.`) : "",
    printedNumbers(method.remark),
  ];
  return {
    kind: "equation",
    number,
    name: method.title,
    runs: equationRuns(method.equation),
    symbols: method.symbols.map(({ symbol, meaning, unit }) => ({
      symbol: equationRuns(symbol),
      meaning: printedNumbers(meaning),
      unit: unit === "1" ? "" : unit,
    })),
    source: source.filter((part) => part !== "").join(" "),
  };
}

function assumptionBlocks({ assumptions }: MemoInput): Block[] {
  if (assumptions.length === 0) return [];
  return [
    {
      kind: "table",
      caption: "Assumptions.",
      columns: [column("No.", "", "right"), column("Assumption"), column("Basis"), column("Effect on the result")],
      rows: assumptions.map(({ statement, basis, effect }, index) => [
        cell(String(index + 1)),
        cell(statement),
        cell(basis),
        cell(effect),
      ]),
    },
  ];
}

export function limitBlocks({ limits }: MemoInput): Block[] {
  return limits.length > 0 ? [{ kind: "list", items: limits.map(cell) }] : [];
}
