import { PRINT_COLOURS, printColours } from "./colours";
import type { Figure } from "./figure";
import { escapeXml } from "./plain-markup";

/** The figure for a page: as wide as it was made or as there is room, named for those who cannot see it. */
export function pageSvg(figure: Figure): string {
  return figure.svg.replace(
    "<svg ",
    `<svg role="img" aria-label="${escapeXml(figure.alt)}" width="${figure.width}" height="${figure.height}" ` +
      `style="display:block;max-width:100%;height:auto" `,
  );
}

/** The figure as a file of its own: print colours on white, title and description inside. */
export function fileSvg(figure: Figure): string {
  const ground = `<rect width="${figure.width}" height="${figure.height}" fill="${PRINT_COLOURS.paper}"/>`;
  const named = `<title>${escapeXml(figure.title)}</title><desc>${escapeXml(`${figure.caption} ${figure.alt}`)}</desc>`;
  const sized = figure.svg.replace("<svg ", `<svg width="${figure.width}" height="${figure.height}" `);
  return `<?xml version="1.0" encoding="UTF-8"?>\n${printColours(sized.replace(">", `>${named}${ground}`))}\n`;
}
