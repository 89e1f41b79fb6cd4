import { isAirportText, readAirportText } from "./airport-text";
import { isBuoyText, readBuoyText } from "./buoy-text";
import { readDelimited } from "./delimited";
import { isHourlyText, readHourlyText } from "./hourly-text";
import type { ProblemList } from "./problem-list";
import type { ReadingAnswers, SeriesReading } from "./reading";
import type { SourceFile } from "./source-file";

export interface Recogniser {
  id: string;
  recognises: (source: SourceFile) => boolean;
  read: (source: SourceFile, answers: ReadingAnswers, problems: ProblemList) => SeriesReading;
}

/** Formats of text in the order they are tried: a particular one before the one that takes any table. */
export const TEXT_RECOGNISERS: readonly Recogniser[] = [
  { id: "buoyText", recognises: isBuoyText, read: readBuoyText },
  { id: "hourlyText", recognises: isHourlyText, read: readHourlyText },
  { id: "airportText", recognises: isAirportText, read: readAirportText },
  { id: "delimited", recognises: () => true, read: readDelimited },
];
