import { MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

/** What is usual in some months of the year, in the channel's unit. */
export interface Season {
  /** 1 to 12, both included; `fromMonth` after `toMonth` goes over the turn of the year. */
  fromMonth: number;
  toMonth: number;
  low: number;
  high: number;
}

const MILLISECONDS = 1000;

function holds({ fromMonth, toMonth }: Season, month: number): boolean {
  return fromMonth <= toMonth ? month >= fromMonth && month <= toMonth : month >= fromMonth || month <= toMonth;
}

/**
 * Climatology: a value beyond what its season knows is suspect, never bad; not evaluated in months that no season holds.
 * @param time seconds since 1970-01-01T00:00:00Z; months are those of UTC
 * @param values NaN where missing
 * @param seasons the first that holds a month is taken
 * @returns 1, 2, 3 or 9 for each value
 * Source: QARTOD wind manual, test 5.
 */
export function climatology(time: ArrayLike<number>, values: ArrayLike<number>, seasons: readonly Season[]): Flags {
  const ofMonth = Array.from({ length: 12 }, (_, index) => seasons.find((season) => holds(season, index + 1)));
  return Uint8Array.from(values, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    const season = ofMonth[new Date(time[k] * MILLISECONDS).getUTCMonth()];
    if (!season) return NOT_EVALUATED;
    return value < season.low || value > season.high ? SUSPECT : PASS;
  });
}
