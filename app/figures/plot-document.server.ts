import { parseHTML } from "linkedom";

/** A document for Observable Plot to draw in where there is no browser. Cheap: one for each figure is fine. */
export function serverPlotDocument(): Document {
  return parseHTML("<!doctype html><html><body></body></html>").document;
}
