import type { Position } from "~/ocean/scenario";
import type { ReadingProblem, Understood } from "../reading";

/** One polygon of a file. Rings are open (the first corner is not repeated), the outer anticlockwise as RFC 7946 wants. */
export interface ShapePolygon {
  name: string;
  outer: Position[];
  holes: Position[][];
}

export interface ShapeQuestion {
  key: "projection";
  needed: boolean;
  message: string;
  /** With the place where each puts the middle of the file. */
  options: { value: string; label: string; place: Position }[];
  answer?: string;
}

export interface ShapeAnswers {
  /** Projection of a shapefile that came without its .prj, as an authority's code. */
  projection?: string;
}

/** What a reader makes of a file of shapes: a pure function of bytes, file name and answers. */
export interface ShapeReading {
  kind: "shape";
  format: string;
  formatLabel: string;
  fileName: string;
  /** Features of the file, of whatever geometry. */
  rows: number;
  polygons: ShapePolygon[];
  summary: {
    polygons: number;
    holes: number;
    /** As written: a ring's repeated first corner counts. */
    vertices: number;
    /** West, south, east, north, as written; null without polygons. */
    bbox: [number, number, number, number] | null;
  };
  understood: Understood[];
  questions: ShapeQuestion[];
  problems: ReadingProblem[];
}
