import { StormRefusal } from "./refusal";
import { readWallClock, type StormWindow } from "./storm-window";

/**
 * The window of a form, from wall-clock times of the project's zone.
 * @throws StormRefusal beside the field that is wrong
 */
export function postedWindow(form: FormData, zone: string): StormWindow {
  const read = (field: keyof StormWindow) => {
    const text = form.get(field);
    const clock = readWallClock(typeof text === "string" ? text : "", zone);
    if ("problem" in clock) throw new StormRefusal(clock.problem, field);
    return clock.seconds;
  };
  return { startsAt: read("startsAt"), endsAt: read("endsAt") };
}
