import { kml } from "@tmcw/togeojson";
import { DOMParser } from "@xmldom/xmldom";
import type { ProblemList } from "../problem-list";
import { nameOf, type RawShapes } from "./raw-shapes";

/** Whether a text looks like KML. */
export function isKml(text: string): boolean {
  return /^\uFEFF?\s*(?:<\?xml|<!--|<!DOCTYPE|<kml)/.test(text) && (/<kml[\s>]/.test(text) || /<!ENTITY/.test(text));
}

/**
 * Takes KML apart. Declarations of entities are refused unread, since they can swell to any size; links to other
 * documents are not followed.
 * @returns null where it is none; `problems` says why
 * @see OGC KML 2.2
 */
export function kmlShapes(text: string, problems: ProblemList): RawShapes | null {
  if (/<!(?:DOCTYPE|ENTITY)/i.test(text)) {
    problems.add(
      "error",
      "entities",
      "the document declares entities or a document type, which a KML of shapes has no use for",
      "Export the shapes anew; nothing of this file was expanded.",
    );
    return null;
  }
  let wrong: string | null = null;
  const parser = new DOMParser({
    onError: (level, message) => {
      if (level !== "warning") wrong ??= message;
    },
  });
  try {
    const document = parser.parseFromString(text, "text/xml");
    if (wrong === null) {
      if (document.getElementsByTagName("NetworkLink").length > 0) {
        problems.add(
          "note",
          "networkLink",
          "links to other documents",
          "They were not followed: give those files themselves.",
        );
      }
      // The library asks for the browser's own document type, of which it uses what this one has.
      const { features } = kml(document as unknown as Document);
      const own = features.filter(({ properties }) => properties?.["@geometry-type"] !== "groundoverlay");
      if (own.length < features.length) {
        problems.add(
          "note",
          "groundOverlay",
          "pictures laid over the ground",
          "They are no shapes, and were left out.",
        );
      }
      return {
        features: own.map(({ properties, geometry }) => ({ name: nameOf(properties), geometry })),
        understood: [{ what: "Coordinates", taken: "longitude, latitude, WGS 84", confidence: "by the format" }],
        questions: [],
      };
    }
  } catch (error) {
    wrong ??= error instanceof Error ? error.message : "it cannot be parsed";
  }
  problems.add(
    "error",
    "badKml",
    `the XML is not well formed: ${wrong.slice(0, 200)}`,
    "Export the shapes anew as KML.",
  );
  return null;
}
