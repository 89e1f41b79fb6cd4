/** The same SVG in the PDF: drawn without a warning, all text in the product's own typeface. */
import { createRequire } from "node:module";
import PDFDocument from "pdfkit";
import drawSvg from "svg-to-pdfkit";
import { describe, expect, it } from "vitest";
import { printColours } from "~/figures/colours";
import { FONT_FAMILY } from "~/figures/plain-markup";
import { everyFigure } from "./every-figure";
import * as storm from "./invented-storm";

const face = createRequire(import.meta.url).resolve(
  "@fontsource/roboto-condensed/files/roboto-condensed-latin-400-normal.woff",
);

describe("a figure in print", () => {
  it.each(everyFigure(storm, storm.context()).map((figure) => [figure.id, figure] as const))(
    "%s is drawn without a warning, in Roboto Condensed alone",
    async (_, figure) => {
      const pdf = new PDFDocument({ size: "A4", compress: false });
      const chunks: Buffer[] = [];
      pdf.on("data", (chunk: Buffer) => chunks.push(chunk));
      const ended = new Promise((resolve) => pdf.on("end", resolve));
      pdf.registerFont(FONT_FAMILY, face);
      const warnings: string[] = [];
      drawSvg(pdf, printColours(figure.svg), 40, 40, {
        width: 480,
        height: (480 * figure.height) / figure.width,
        assumePt: true,
        warningCallback: (warning: string) => warnings.push(warning),
      });
      pdf.end();
      await ended;
      expect(warnings).toEqual([]);
      const fonts = [
        ...Buffer.concat(chunks)
          .toString("latin1")
          .matchAll(/\/BaseFont \/(\S+)/g),
      ].map((match) => match[1]);
      expect(fonts.length).toBeGreaterThan(0);
      for (const font of fonts) expect(font).toMatch(/^[A-Z]{6}\+RobotoCondensed-Regular$/);
    },
  );
});
