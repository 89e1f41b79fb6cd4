/** Draws sheets of placed items, and ties each to its node in the structure tree. */
import drawSvg from "svg-to-pdfkit";
import { type FigureToken, PRINT_COLOURS, printColours } from "~/figures/colours";
import { type Coverage, faceName, FACE_FILES } from "./faces";
import type { Item, LineColour, Sheet, StructNode } from "./sheet";
import { FACE_FAMILY, nameFaces } from "./svg-text";
import type { TaggedPdf } from "./tagged-pdf.server";
import type { Segment } from "./typeset";

type TextItem = Extract<Item, { kind: "text" }>;
type SvgItem = Extract<Item, { kind: "svg" }>;

/** Draws all sheets and closes the structure tree. */
export function drawSheets(pdf: TaggedPdf, sheets: readonly Sheet[], covers: Coverage): void {
  const tree = new StructTree(pdf);
  const outline = new Outline(pdf);
  for (const { items } of sheets) {
    pdf.addPage();
    for (const item of items) drawItem(pdf, item, tree, outline, covers);
  }
  tree.close();
}

function drawItem(pdf: TaggedPdf, item: Item, tree: StructTree, outline: Outline, covers: Coverage): void {
  switch (item.kind) {
    case "text":
      return drawText(pdf, item, tree);
    case "svg":
      return drawFigure(pdf, item, tree, covers);
    case "hollow":
      tree.element(item.node);
      return;
    case "bookmark":
      return outline.add(item.title, item.level);
    case "line":
      return artifact(pdf, () => {
        pdf.lineWidth(item.weight).strokeColor(hex(item.colour)).lineCap("butt");
        pdf.moveTo(item.x1, item.y1).lineTo(item.x2, item.y2).stroke();
      });
  }
}

function artifact(pdf: TaggedPdf, draw: () => void): void {
  pdf.markContent("Artifact", { type: "Layout" });
  draw();
  pdf.endMarkedContent();
}

function drawText(pdf: TaggedPdf, item: TextItem, tree: StructTree): void {
  const draw = (segments: readonly Segment[]) => {
    for (const segment of segments)
      pdf
        .font(segment.face)
        .fontSize(segment.size)
        .fillColor(hex(segment.colour))
        .text(segment.text, item.x + segment.x, item.baseline - segment.rise, {
          lineBreak: false,
          baseline: "alphabetic",
        });
  };
  const { node } = item;
  if (node === null) {
    pdf.markContent("Artifact", { type: "Pagination" });
    draw(item.segments);
    pdf.endMarkedContent();
    return;
  }
  for (const group of byLink(item.segments)) {
    const link = group[0]!.link;
    if (link === undefined) tree.mark(node, () => draw(group));
    else drawLink(pdf, tree, node, link, item, group, () => draw(group));
  }
}

function drawLink(
  pdf: TaggedPdf,
  tree: StructTree,
  node: StructNode,
  address: string,
  item: TextItem,
  group: readonly Segment[],
  draw: () => void,
): void {
  const first = group[0]!;
  const last = group.at(-1)!;
  const element = pdf.struct("Link");
  tree.element(node).add(element);
  const content = pdf.markStructureContent("Link");
  draw();
  pdf.endMarkedContent();
  element.add(content);
  const x = item.x + first.x;
  const options = { structParent: element, Contents: Object(address) as string };
  pdf.link(x, item.baseline - first.size, last.x + last.width - first.x, first.size * 1.25, address, options);
  // pdfkit notes the sheet of a link when its element is written, so it must be written before the next sheet.
  element.end();
}

/** Neighbours that share an address, or have none. */
function byLink(segments: readonly Segment[]): Segment[][] {
  const groups: Segment[][] = [];
  for (const segment of segments) {
    const last = groups.at(-1);
    if (last && last[0]!.link === segment.link) last.push(segment);
    else groups.push([segment]);
  }
  return groups;
}

function drawFigure(pdf: TaggedPdf, item: SvgItem, tree: StructTree, covers: Coverage): void {
  const { x, y, width, height } = item;
  const svg = nameFaces(printColours(item.svg), covers);
  const draw = () => {
    pdf.save();
    drawSvg(pdf, svg, x, y, {
      width,
      height,
      preserveAspectRatio: "xMinYMin meet",
      assumePt: true,
      fontCallback: faceOfFamily,
    });
    pdf.restore();
  };
  if (item.node === null) artifact(pdf, draw);
  else tree.mark(item.node, draw, [x, y, x + width, y + height]);
}

function faceOfFamily(family: string, bold: boolean, italic: boolean): string {
  const named = family.startsWith(FACE_FAMILY) ? family.slice(FACE_FAMILY.length) : "";
  if (!FACE_FILES.has(named)) return faceName("latin", { bold, italic });
  const styled = named.replace("-400-normal", `-${bold ? "700" : "400"}-${italic ? "italic" : "normal"}`);
  return FACE_FILES.has(styled) ? styled : named;
}

/** Elements come into being with their first content, so that their order is the order of reading. */
class StructTree {
  private readonly elements = new Map<StructNode, PDFKit.PDFStructureElement>();
  private readonly roots: PDFKit.PDFStructureElement[] = [];
  constructor(private readonly pdf: TaggedPdf) {}

  element(node: StructNode, bbox?: [number, number, number, number]): PDFKit.PDFStructureElement {
    const known = this.elements.get(node);
    if (known) return known;
    const parent = node.parent === null ? null : this.element(node.parent);
    const element = this.pdf.struct(node.type, {
      ...(node.alt ? { alt: node.alt } : {}),
      ...(node.scope ? { scope: node.scope } : {}),
      ...(bbox ? { bbox } : {}),
    });
    this.elements.set(node, element);
    // An element that hangs on nothing would keep the file from ever being finished.
    if (parent) parent.add(element);
    else {
      this.pdf.addStructure(element);
      this.roots.push(element);
    }
    return element;
  }

  mark(node: StructNode, draw: () => void, bbox?: [number, number, number, number]): void {
    const element = this.element(node, bbox);
    const content = this.pdf.markStructureContent(node.type);
    draw();
    this.pdf.endMarkedContent();
    element.add(content);
  }

  close(): void {
    for (const root of this.roots) root.end();
  }
}

class Outline {
  private section: PDFKit.PDFOutline | undefined;
  constructor(private readonly pdf: TaggedPdf) {}

  add(title: string, level: 1 | 2): void {
    if (level === 2 && this.section) this.section.addItem(title);
    else this.section = this.pdf.outline.addItem(title, { expanded: false });
  }
}

function hex(colour: LineColour): string {
  return PRINT_COLOURS[colour satisfies FigureToken];
}
