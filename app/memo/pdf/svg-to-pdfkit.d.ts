declare module "svg-to-pdfkit" {
  interface SvgOptions {
    width?: number;
    height?: number;
    preserveAspectRatio?: string;
    assumePt?: boolean;
    /** Name of a registered font. */
    fontCallback?: (family: string, bold: boolean, italic: boolean) => string;
    warningCallback?: (warning: string) => void;
  }
  export default function drawSvg(
    document: PDFKit.PDFDocument,
    svg: string,
    x: number,
    y: number,
    options?: SvgOptions,
  ): void;
}
