import type { UnitChoices } from "~/units/unit-choices";
import { toDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import { estimateCode, sheetLabel } from "./estimate-code";
import { stateSentence } from "./estimate-state";
import { FIGURE_IDS, headlineFigure, QUANTITY_OF, type FigureId } from "./headline-figures";
import type { Ledger } from "./load-ledger.server";
import { figureCsv } from "~/figures/figure-csv";
import type { FigureColumn } from "~/figures/figure";

export interface LedgerCsvContext {
  jobNumber: string;
  units: UnitChoices;
  zone: string;
}

const COLUMN_NAMES: Record<FigureId, string> = {
  surfaceSalinity: "lowest surface salinity",
  surfaceTemperature: "change of surface temperature",
  netDisplacement: "net displacement",
  peakDrift: "peak drift",
  peakStress: "peak wind stress",
  transportAcross: "transport across the shore, positive offshore (east without a shore)",
  transportAlong: "transport along the shore, positive to the right looking offshore (north without a shore)",
  layerDepth: "layer depth at the end",
  densityStep: "density step below the layer",
};

/** The ledger as CSV: a line for every box and storm, in the organisation's units, with what each number stands on. */
export function ledgerCsv(ledger: Ledger, { jobNumber, units, zone }: LedgerCsvContext): string {
  const figureColumns = FIGURE_IDS.flatMap((id): FigureColumn[] => {
    const { unit } = displayUnit(QUANTITY_OF[id], units);
    const name = COLUMN_NAMES[id];
    return [
      { name, unit },
      { name: `${name}, p10`, unit },
      { name: `${name}, p50`, unit },
      { name: `${name}, p90`, unit },
    ];
  });
  const rows = ledger.boxes.flatMap((box) =>
    ledger.storms.map(({ storm }) => {
      const cell = ledger.cells.find(({ estimate }) => estimate.studyBoxId === box.id && estimate.stormId === storm.id);
      const headline = cell?.response?.headline;
      const context = { units, zone, shore: box.shoreNormal !== null };
      const water = ledger.columns.find(({ id }) => id === cell?.estimate.waterColumnId);
      const sheet = ledger.sheets.find(({ id }) => id === cell?.estimate.methodSheetId);
      return [
        box.name,
        storm.name,
        cell ? estimateCode(jobNumber, cell.estimate.number) : "",
        cell ? stateSentence(cell.state) : "not run",
        water?.name ?? "",
        sheet ? sheetLabel(sheet) : "",
        ...FIGURE_IDS.flatMap((id) => {
          if (!headline) return [null, null, null, null];
          const figure = headlineFigure(id, headline, context);
          const shown = (value: number | null | undefined) =>
            value === null || value === undefined ? null : toDisplay(value, figure.quantity, units);
          return [shown(figure.si), shown(figure.band?.p10), shown(figure.band?.p50), shown(figure.band?.p90)];
        }),
        headline?.netDisplacement.towards ?? null,
        headline?.peakDrift.towards ?? null,
        cell?.response?.engine ?? "",
        cell?.response?.inputs ?? "",
      ];
    }),
  );
  return figureCsv({
    columns: [
      ...["study box", "storm", "estimate", "state", "water column", "method sheet"].map((name) => ({
        name,
        unit: "",
      })),
      ...figureColumns,
      { name: "net displacement towards", unit: "degrees true" },
      { name: "peak drift towards", unit: "degrees true" },
      { name: "engine", unit: "" },
      { name: "inputs, SHA-256", unit: "" },
    ],
    rows,
  });
}
