/** Makes an SVG's text drawable where each face holds one script only. */
import { escapeXml } from "~/figures/plain-markup";
import { type Coverage, faceName, splitByFace } from "./faces";

/** Marks a family name that is a face of its own. */
export const FACE_FAMILY = "face:";

const TEXT_ELEMENT = /<text\b[^>]*>[\s\S]*?<\/text>/g;

/** All that an SVG's text elements say, entities read. */
export function textOfSvg(svg: string): string {
  const elements = svg.match(TEXT_ELEMENT) ?? [];
  return elements.map((element) => decode(element.replace(/<[^>]*>/g, ""))).join(" ");
}

/** Wraps what the plain latin face lacks in a `tspan` that names the face which has it. */
export function nameFaces(svg: string, covers: Coverage): string {
  const latin = faceName("latin", { bold: false, italic: false });
  return svg.replace(TEXT_ELEMENT, (element) =>
    element.replace(/>([^<]+)</g, (_, text: string) => {
      const stretches = splitByFace(decode(text), { bold: false, italic: false }, covers);
      const parts = stretches.map((stretch) =>
        stretch.face === latin
          ? escapeXml(stretch.text)
          : `<tspan font-family="${FACE_FAMILY}${stretch.face}">${escapeXml(stretch.text)}</tspan>`,
      );
      return `>${parts.join("")}<`;
    }),
  );
}

const ENTITIES: Record<string, string> = { amp: "&", lt: "<", gt: ">", quot: '"', apos: "'" };

function decode(text: string): string {
  return text.replace(/&(?:#(\d+)|#x([\da-f]+)|(\w+));/gi, (whole, decimal?: string, hex?: string, name?: string) => {
    if (decimal) return String.fromCodePoint(Number(decimal));
    if (hex) return String.fromCodePoint(parseInt(hex, 16));
    return ENTITIES[name ?? ""] ?? whole;
  });
}
