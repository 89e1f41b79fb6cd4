/** How uncertain the answer is, and which inputs make it so. */
import { presentUncertainty, type FactorView } from "~/estimates/present-uncertainty";
import type { Uncertainty } from "~/ocean/response";
import { formatRange } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";
import type { Block } from "../document";
import type { MemoEstimate, MemoInput } from "../memo-input";
import { cell, column, paragraph } from "./section";

/** Members, seed and what each figure depends on, an estimate after the other; says so where no ensemble ran. */
export function sensitivityBlocks({ estimates, units }: MemoInput): Block[] {
  return [
    ...estimates.flatMap((estimate) => {
      const { uncertainty } = estimate.response;
      return uncertainty ? spreadBlocks(estimate, uncertainty, units) : [paragraph(unranged(estimate))];
    }),
    ...factorBlocks(estimates),
  ];
}

function unranged({ code }: MemoEstimate): string {
  return `Estimate ${code} was run without an ensemble: its figures carry no range, and nothing is known here of what they depend on most.`;
}

function spreadBlocks({ code, shore }: MemoEstimate, uncertainty: Uncertainty, units: UnitChoices): Block[] {
  const { ensemble, failures, effects, tooFew } = presentUncertainty(uncertainty, shore);
  const text = [
    `Estimate ${code}. ${ensemble} The members are a Latin hypercube over the inputs below, all varied at once.`,
    ...failures,
    ...(tooFew === null ? [] : [tooFew]),
  ].join(" ");
  if (effects.length === 0) return [paragraph(text)];
  return [
    paragraph(text),
    {
      kind: "table",
      caption: `What the figures of estimate ${code} depend on. Range: the input named, alone through its own.`,
      columns: [column("Figure"), column("Moved most by"), column("Range"), column("Spread over all members")],
      rows: effects.map(({ label, sentence, tornado: { bars, quantity } }) => [
        cell(label),
        cell(bars[0].factor),
        cell(formatRange(bars[0].low.value, bars[0].high.value, quantity, units)),
        cell(sentence),
      ]),
    },
  ];
}

/** What was varied: one table for all estimates of which it is the same. */
function factorBlocks(estimates: readonly MemoEstimate[]): Block[] {
  const codesOf = new Map<string, string[]>();
  const factorsOf = new Map<string, FactorView[]>();
  for (const { code, shore, response } of estimates) {
    if (!response.uncertainty) continue;
    const { factors } = presentUncertainty(response.uncertainty, shore);
    const key = JSON.stringify(factors);
    codesOf.set(key, [...(codesOf.get(key) ?? []), code]);
    factorsOf.set(key, factors);
  }
  return [...factorsOf].map(([key, factors]) => factorTable(factors, codesOf.get(key) ?? []));
}

function factorTable(factors: readonly FactorView[], codes: readonly string[]): Block {
  return {
    kind: "table",
    caption: `Inputs varied in ${codes.length === 1 ? "estimate" : "estimates"} ${codes.join(", ")}.`,
    columns: [column("Input"), column("Range"), column("Where the range comes from")],
    rows: factors.map(({ name, range, basis, failed }) => [
      cell(name),
      cell(failed === "" ? range : `${range}. ${failed}`),
      cell(basis),
    ]),
  };
}
