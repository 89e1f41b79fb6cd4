import type { Cast } from "~/db/models/cast.server";
import type { Tenant } from "~/db/scoped.server";
import { castProfile } from "~/figures/cast-profile";
import type { Figure } from "~/figures/figure";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { serverPlotDocument } from "~/figures/plot-document.server";
import type { CastAnswers, CastReading } from "~/readers/casts/cast-reading";
import { UnreadableFile } from "~/readers/reading";
import { StormRefusal } from "~/storms/refusal";
import { formatPosition } from "~/area/format-coordinates";
import { formatTime } from "~/units/format-time";
import type { UnitChoices } from "~/units/unit-choices";
import { describeReading, levelsIn, mayConfirm } from "./confirm-cast.server";
import type { CastDescription, CastLevels } from "./describe-cast";
import { presentCast, type PresentedCast } from "./present-cast";
import { readStoredCast } from "./stored-cast.server";
import { gramsPerKilogram } from "./water-density";

/** The figure for the page and for a telephone; a table longer than this is left to the file itself. */
export interface CastFigures {
  wide: Figure;
  narrow: Figure;
}

const MOST_TABLE_ROWS = 600;

export function castFigures(
  { depth, temperature, salinity, salinityScale }: CastLevels,
  { sigma0, layers }: CastDescription,
  shared: { zone: string; units: UnitChoices },
): CastFigures {
  const data = {
    depth,
    temperature,
    salinity: Float64Array.from(salinity, (value) => gramsPerKilogram(value, salinityScale)),
    density: sigma0.map((value) => 1000 + value),
    layers,
  };
  const draw = (width: number): Figure => {
    const figure = castProfile(data, { ...shared, document: serverPlotDocument(), width });
    return depth.length <= MOST_TABLE_ROWS ? figure : { ...figure, table: { columns: [], rows: [] } };
  };
  return { wide: draw(FIGURE_WIDTHS.page), narrow: draw(FIGURE_WIDTHS.narrow) };
}

export interface CastSheet {
  cast: PresentedCast;
  figures: CastFigures | null;
  ready: boolean;
  /** What the source of the column's numbers may be called. */
  proposedSource: string;
}

/** Everything a cast's sheet shows. */
export async function castSheet(
  tenant: Tenant,
  cast: Cast,
  shared: { zone: string; units: UnitChoices },
): Promise<CastSheet> {
  const reading = await readStoredCast(tenant, cast);
  const usable = reading.samples.length > 1;
  const description = usable ? describeReading(reading, cast.provenance?.layerDepth ?? null) : null;
  return {
    cast: presentCast(reading, description, shared.zone, shared.units),
    figures: description && castFigures(levelsIn(reading), description, shared),
    ready: mayConfirm(reading),
    proposedSource: sourceOf(cast.name, reading, shared.zone),
  };
}

/** The questions as they stand on the sheet now. */
export async function castQuestions(tenant: Tenant, cast: Cast): Promise<CastReading["questions"]> {
  return (await readStoredCast(tenant, cast)).questions;
}

function sourceOf(name: string, { time, latitude, longitude }: CastReading, zone: string): string {
  const where = latitude === null || longitude === null ? "" : ` at ${formatPosition([longitude, latitude])}`;
  const when = time === null ? "" : ` of ${formatTime(time, zone)}`;
  return `Cast${when}${where} (${name})`;
}

/**
 * Keeps other answers for a cast and reads it again.
 * @throws StormRefusal where these answers leave nothing to read; the former ones stay
 */
export async function changeCastAnswers(tenant: Tenant, cast: Cast, answers: CastAnswers): Promise<void> {
  try {
    await readStoredCast(tenant, cast, answers);
    await tenant.casts.update(cast.id, { answers });
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    throw new StormRefusal([
      "With these answers nothing can be read:",
      ...error.problems.map(({ message }) => message),
    ]);
  }
}
