import { Temporal } from "temporal-polyfill";

export type LocalTime =
  | { kind: "one"; utc: number }
  /** The clock shows this time twice (summer time ends): `utc` is the earlier, `later` the later. */
  | { kind: "twice"; utc: number; later: number }
  /** The clock never shows this time (summer time begins). */
  | { kind: "never" };

export interface Zone {
  /** As shown to people. */
  name: string;
  /** From clock seconds (as if UTC) to UTC seconds. */
  toUtc: (clock: number) => LocalTime;
}

const FIXED = /^(?:UTC|GMT)?\s*([+-])(\d{1,2})(?::?(\d{2}))?$/i;

/**
 * A zone by its name: `UTC`, a fixed offset (`+05:30`, `UTC-3`), or an IANA name (`America/New_York`).
 * @returns null where no such zone is known
 */
export function zoneByName(name: string): Zone | null {
  const text = name.trim().replace(/\u2212/g, "-");
  if (/^(?:utc|gmt|z|zulu)$/i.test(text)) return fixedZone("UTC", 0);
  const fixed = FIXED.exec(text);
  if (fixed) {
    const hours = Number(fixed[2]);
    const minutes = Number(fixed[3] ?? 0);
    if (hours > 14 || minutes > 59) return null;
    const sign = fixed[1] === "-" ? -1 : 1;
    const label = `${fixed[1]}${String(hours).padStart(2, "0")}:${String(minutes).padStart(2, "0")}`;
    return fixedZone(label, sign * (hours * 3600 + minutes * 60));
  }
  if (!/^[A-Za-z][A-Za-z0-9_+-]*(?:\/[A-Za-z0-9_+-]+)*$/.test(text)) return null;
  try {
    const probe = new Temporal.ZonedDateTime(0n, text);
    return ianaZone(probe.timeZoneId);
  } catch {
    return null;
  }
}

function fixedZone(name: string, offset: number): Zone {
  return { name, toUtc: (clock) => ({ kind: "one", utc: clock - offset }) };
}

const DAY = 86400;

/** Days on which the clock does not change, nearly all, need one look-up. */
function ianaZone(id: string): Zone {
  const offsetOfDay = new Map<number, number | null>();
  return {
    name: id,
    toUtc: (clock) => {
      const day = Math.floor(clock / DAY);
      let offset = offsetOfDay.get(day);
      if (offset === undefined) {
        offset = steadyOffset(id, day * DAY);
        offsetOfDay.set(day, offset);
      }
      return offset === null ? lookUp(id, clock) : { kind: "one", utc: clock - offset };
    },
  };
}

function steadyOffset(id: string, dayStart: number): number | null {
  const first = lookUp(id, dayStart);
  const last = lookUp(id, dayStart + DAY - 1);
  if (first.kind !== "one" || last.kind !== "one") return null;
  const offset = dayStart - first.utc;
  return dayStart + DAY - 1 - last.utc === offset ? offset : null;
}

function lookUp(id: string, clock: number): LocalTime {
  const whole = Math.floor(clock);
  const date = new Date(whole * 1000);
  const wall = new Temporal.PlainDateTime(
    date.getUTCFullYear(),
    date.getUTCMonth() + 1,
    date.getUTCDate(),
    date.getUTCHours(),
    date.getUTCMinutes(),
    date.getUTCSeconds(),
  );
  const earlier = wall.toZonedDateTime(id, { disambiguation: "earlier" });
  const later = wall.toZonedDateTime(id, { disambiguation: "later" });
  const fraction = clock - whole;
  const utc = earlier.epochMilliseconds / 1000 + fraction;
  if (earlier.epochMilliseconds === later.epochMilliseconds) return { kind: "one", utc };
  if (!earlier.toPlainDateTime().equals(wall)) return { kind: "never" };
  return { kind: "twice", utc, later: later.epochMilliseconds / 1000 + fraction };
}
