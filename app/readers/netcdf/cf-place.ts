import type { ProblemList } from "../problem-list";
import type { ReadingAnswers, ReadingQuestion, Understood } from "../reading";
import { bilinearCells, isBeyond, nearCells, type Cell, type NearCell } from "./cf-cells";
import type { FilePlace, Space } from "./cf-space";
import { distanceKm, positionFromText, positionLabel, type LatLon } from "./position";

/** Which cells of a file are read, and what is said about it. */
export interface PlaceChoice {
  /** Null while it is not known which; then nothing is read. */
  cells: Cell[] | null;
  understood: Understood[];
  questions: ReadingQuestion[];
}

/** What tells sea from land, where the file has it. */
export interface SeaTest {
  /** As `the land mask “lsm”`. */
  by: string;
  isSea: (cell: Cell) => boolean;
}

/** A wind of one place stands for what is near it. Common practice, no source. */
const FAR_KM = 50;

const HERE: Cell = { indices: new Map(), weight: 1, position: { latitude: NaN, longitude: NaN } };

/** Settles from where in the file values are taken: by the answer, by what the file holds, or with a question. */
export function choosePlace(space: Space, answers: ReadingAnswers, sea: SeaTest, problems: ProblemList): PlaceChoice {
  if (space.kind === "places") return chooseStation(space, answers, problems);
  if (space.kind === "grid" || space.kind === "curved") return chooseCells(space, answers, sea, problems);
  return { cells: [HERE], understood: placeStated(space, answers, problems), questions: [] };
}

function placeStated(space: Space, answers: ReadingAnswers, problems: ProblemList): Understood[] {
  const wanted = positionFromText(answers.place ?? "");
  if (space.kind === "fixed") {
    if (wanted !== null) warnWhereFar(distanceKm(space, wanted), "the file’s only place", problems);
    return [{ what: "Place", taken: positionLabel(space), confidence: "stated in the file" }];
  }
  if (space.kind !== "moving") return [];
  const { latitudes, longitudes } = space;
  const at = (index: number): LatLon => ({ latitude: latitudes[index] ?? NaN, longitude: longitudes[index] ?? NaN });
  const start = latitudes.findIndex((value, index) => !Number.isNaN(value + (longitudes[index] ?? NaN)));
  let farthest = 0;
  for (let index = Math.max(0, start); index < latitudes.length; index += 1) {
    const away = distanceKm(at(start), at(index));
    if (away > farthest) farthest = away;
  }
  if (farthest > FAR_KM) {
    problems.add(
      "warning",
      "placeMoves",
      `the place moves by up to ${Math.round(farthest)} km from where it began`,
      "Take it as one place only for the hours near the study box.",
    );
  }
  if (wanted !== null) warnWhereFar(distanceKm(at(start), wanted), "where the file’s place began", problems);
  const taken = `${positionLabel(at(start))}, moving by up to ${Number(farthest.toFixed(1))} km`;
  return [{ what: "Place", taken, confidence: "stated in the file" }];
}

function warnWhereFar(distance: number, what: string, problems: ProblemList): void {
  if (!(distance > FAR_KM)) return;
  problems.add(
    "warning",
    "placeFar",
    `${what} lies ${Math.round(distance)} km from the place asked for`,
    "Say in the memo that the record is from elsewhere, or bring one from nearer.",
  );
}

function chooseStation(
  space: Extract<Space, { kind: "places" }>,
  answers: ReadingAnswers,
  problems: ProblemList,
): PlaceChoice {
  const { places, dimension } = space;
  const answer = answers.place;
  const question: ReadingQuestion = {
    key: "place",
    needed: true,
    message: `The file holds ${places.length} places. Which one is the record from?`,
    options: places.map((place) => ({ value: valueOf(place), label: labelOf(place) })),
    ...(answer === undefined ? {} : { answer }),
  };
  const found = answer === undefined ? null : stationAt(places, answer);
  if (found === null) {
    if (answer !== undefined) reportUnknown(answer, problems);
    return { cells: null, understood: [], questions: [question] };
  }
  warnWhereFar(found.distance, `“${labelOf(found.place)}”, the nearest place of the file,`, problems);
  const away = found.distance > 0 ? `, ${Number(found.distance.toFixed(1))} km from where was asked` : "";
  const cell: Cell = { indices: new Map([[dimension, found.place.index]]), weight: 1, position: found.place };
  return {
    cells: [cell],
    understood: [{ what: "Place", taken: `${labelOf(found.place)}${away}`, confidence: "answered" }],
    questions: [{ ...question, needed: false }],
  };
}

function stationAt(places: readonly FilePlace[], answer: string): { place: FilePlace; distance: number } | null {
  const named = places.find((place) => valueOf(place) === answer || place.name === answer);
  if (named !== undefined) return { place: named, distance: 0 };
  const wanted = positionFromText(answer);
  if (wanted === null) return null;
  const nearest = places
    .map((place) => ({ place, distance: distanceKm(place, wanted) }))
    .filter(({ distance }) => !Number.isNaN(distance))
    .sort((a, b) => a.distance - b.distance)[0];
  return nearest ?? null;
}

function hasPosition({ latitude, longitude }: FilePlace): boolean {
  return !Number.isNaN(latitude) && !Number.isNaN(longitude);
}

/** A position where there is one, since it stays the same place whatever the order of the file. */
function valueOf(place: FilePlace): string {
  return hasPosition(place)
    ? `${Number(place.latitude.toFixed(5))},${Number(place.longitude.toFixed(5))}`
    : place.name || `${place.index + 1}`;
}

function labelOf(place: FilePlace): string {
  const name = place.name || `place ${place.index + 1}`;
  return hasPosition(place) ? `${name} (${positionLabel(place)})` : name;
}

function reportUnknown(answer: string, problems: ProblemList): void {
  problems.add(
    "error",
    "unknownPlace",
    `“${answer}” is no place of the file`,
    "Give latitude and longitude in decimal degrees, such as 44.5,-63.4, or choose one of the list.",
  );
}

type GridSpace = Extract<Space, { kind: "grid" | "curved" }>;

function chooseCells(space: GridSpace, answers: ReadingAnswers, sea: SeaTest, problems: ProblemList): PlaceChoice {
  const answer = answers.place;
  const place: ReadingQuestion = {
    key: "place",
    needed: true,
    message: `The file is a grid, ${extentOf(space)}. At which place is the record wanted? Give latitude and longitude in decimal degrees.`,
    ...(answer === undefined ? {} : { answer }),
  };
  const wanted = answer === undefined ? null : positionFromText(answer);
  const near = wanted === null ? [] : nearCells(space, wanted);
  const nearest = near[0];
  const outside = nearest !== undefined && isBeyond(near);
  if (wanted === null || nearest === undefined || outside) {
    if (outside) {
      problems.add(
        "error",
        "placeOutsideGrid",
        `the place lies ${Math.round(nearest.distance)} km outside the file’s grid, ${extentOf(space)}`,
        "Give a place within it, or a file that covers the study box.",
      );
    } else if (answer !== undefined) reportUnknown(answer, problems);
    return { cells: null, understood: [], questions: [place] };
  }
  const chosen = cellsAt(space, wanted, near, answers.gridMethod ?? "nearestSea", sea, problems);
  return { ...chosen, questions: [{ ...place, needed: false }, methodQuestion(answers)] };
}

function methodQuestion(answers: ReadingAnswers): ReadingQuestion {
  return {
    key: "gridMethod",
    needed: false,
    message: "How is the value at the place taken from the grid?",
    options: [
      { value: "nearestSea", label: "The nearest cell of sea" },
      { value: "bilinear", label: "Between the four cells about it, by distance" },
    ],
    suggestion: "nearestSea",
    ...(answers.gridMethod === undefined ? {} : { answer: answers.gridMethod }),
  };
}

function cellsAt(
  space: GridSpace,
  wanted: LatLon,
  near: readonly NearCell[],
  method: "nearestSea" | "bilinear",
  sea: SeaTest,
  problems: ProblemList,
): Pick<PlaceChoice, "cells" | "understood"> {
  const four = method === "bilinear" ? bilinearCells(space, wanted) : null;
  if (four !== null && four.every(sea.isSea)) {
    const taken = `${positionLabel(wanted)}, between ${four.length} cells by distance`;
    return { cells: four, understood: [{ what: "Place", taken, confidence: "answered" }] };
  }
  if (method === "bilinear") {
    problems.add(
      "warning",
      "notBilinear",
      "the place is not between four cells of sea",
      "The nearest cell of sea was taken instead.",
    );
  }
  const found = near.find(sea.isSea);
  if (found === undefined) {
    problems.add(
      "error",
      "noSeaCell",
      `no cell of sea lies within ${near.length} cells of the place, by ${sea.by}`,
      "Give a place farther out, or a file with a finer grid.",
    );
    return { cells: null, understood: [] };
  }
  const skipped = near.indexOf(found);
  const passed = skipped === 0 ? "" : `; ${skipped} nearer of land passed over, by ${sea.by}`;
  const taken = `the cell at ${positionLabel(found.position)}, ${Number(found.distance.toFixed(1))} km from the place${passed}`;
  return { cells: [found], understood: [{ what: "Place", taken, confidence: "answered" }] };
}

function extentOf({ latitudes, longitudes }: GridSpace): string {
  const end = (values: Float64Array, pick: "min" | "max") =>
    values.reduce(
      (most, value) => (Number.isNaN(value) ? most : Math[pick](most, value)),
      pick === "min" ? Infinity : -Infinity,
    );
  const range = (values: Float64Array) =>
    [end(values, "min"), end(values, "max")].map((value) => Number(value.toFixed(3))).join(" to ");
  return `latitudes ${range(latitudes)}, longitudes ${range(longitudes)}`;
}
