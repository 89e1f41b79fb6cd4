/** A changed figure is written next to the old one and looked at before it is kept: `npx vitest run tests/figures -u`. */
import { describe, expect, it } from "vitest";
import { FIGURE_WIDTHS } from "~/figures/figure-context";
import { bandMark, driftArrow, spark } from "~/figures/small-marks";
import { everyFigure } from "./every-figure";
import * as storm from "./invented-storm";

/** One element a line: a difference can be read. */
const readable = (svg: string) => `${svg.replaceAll("><", ">\n<")}\n`;

describe.each(Object.entries(FIGURE_WIDTHS))("%s figures, %d px", (name, width) => {
  it.each(everyFigure(storm, storm.context({ width })).map((figure) => [figure.id, figure] as const))(
    "%s",
    async (id, figure) => {
      await expect(readable(figure.svg)).toMatchFileSnapshot(`snapshots/${id}-${name}.svg`);
    },
  );
});

describe("small marks", () => {
  const { units } = storm.context();
  it.each([
    ["spark", spark(storm.windSpeed10, "windSpeed10", units)],
    ["drift-arrow", driftArrow({ distance: 30_000, towards: 128, fullCircle: 40_000 }, units)],
    ["band-mark", bandMark({ value: 31.9, p10: 31.6, p90: 32.2, trigger: 32.5, from: 31, to: 33 }, "salinity", units)],
    ["band-mark-tick-only", bandMark({ value: 1.62, from: 0, to: 2 }, "stress", units)],
  ])("%s", async (id, mark) => {
    await expect(readable(mark.svg)).toMatchFileSnapshot(`snapshots/${id}.svg`);
  });
});
