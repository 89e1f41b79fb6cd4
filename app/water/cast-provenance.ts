import type { CastReading } from "~/readers/casts/cast-reading";
import type { Understood } from "~/readers/reading";

/** How a confirmed cast was read: kept beside the original, printed in the memo's register of inputs. */
export interface CastProvenance {
  formatLabel: string;
  /** Records of the file. */
  rows: number;
  /** ISO UTC; null where the file does not say. */
  time: string | null;
  latitude: number | null;
  longitude: number | null;
  half: "down" | "up";
  /** m */
  shallowest: number;
  deepest: number;
  /** m: of the layer, where a person set it; null where the method sheet's threshold finds it. */
  layerDepth: number | null;
  understood: Understood[];
  leftOut: string[];
  /** Whose answers these are, and when (ISO UTC). */
  confirmedBy: string;
  confirmedAt: string;
}

export function provenanceOf(
  { formatLabel, rows, time, latitude, longitude, half, samples, understood, leftOut }: CastReading,
  confirmed: Pick<CastProvenance, "layerDepth" | "confirmedBy" | "confirmedAt">,
): CastProvenance {
  return {
    formatLabel,
    rows,
    time,
    latitude,
    longitude,
    half,
    shallowest: samples.at(0)?.depth ?? 0,
    deepest: samples.at(-1)?.depth ?? 0,
    understood,
    leftOut,
    ...confirmed,
  };
}
