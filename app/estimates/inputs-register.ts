/** Every input of an estimate by name, file and hash: shown on its page, printed in the memo, kept with its last run. */
import type { InputParts } from "./input-parts";
import type { MethodChoices, Position, TriggerLevel } from "~/ocean/scenario";
import type { RegisteredQuality } from "~/quality/register-quality";
import type { RecordProvenance } from "~/storms/provenance";
import type { StormTrack } from "~/storms/storm-track";
import type { CastProvenance } from "~/water/cast-provenance";

export interface RegisteredRecord {
  name: string;
  origin: "file" | "pasted" | "constant";
  sourceFileId: string | null;
  /** Null where there is no file. */
  fileName: string | null;
  sha256: string | null;
  provenance: RecordProvenance | null;
  /** Absent in runs of before series were tested. */
  id?: string;
}

export interface RegisteredWater {
  name: string;
  source: string;
  /** In situ, °C: of the layer, as are the next two. */
  temperature: number;
  salinity: number;
  salinityScale: "absolute" | "practical";
  /** m */
  layerDepth: number;
  belowTemperature: number | null;
  belowSalinity: number | null;
  /** The file behind it; absent where two layers were typed. */
  cast?: { levels: number; sourceFileId: string; fileName: string; sha256: string; provenance: CastProvenance };
}

export interface InputsRegister {
  box: {
    name: string;
    polygon: Position[];
    waterDepth: number | null;
    shoreNormal: number | null;
    distanceToShore: number | null;
    triggerLevels: TriggerLevel[];
  };
  storm: {
    name: string;
    /** Seconds since 1970-01-01T00:00:00Z. */
    startsAt: number | null;
    endsAt: number | null;
    records: RegisteredRecord[];
    /** Only where the storm stands on a cyclone's track. */
    track?: StormTrack;
    /** Absent in runs of before series were tested. */
    quality?: RegisteredQuality;
  };
  water: RegisteredWater;
  method: { name: string; version: number; choices: MethodChoices };
}

/** Kept with an estimate at the end of its run. */
export interface RunInputs {
  parts: InputParts | null;
  assumptions: string[];
  register: InputsRegister;
}
