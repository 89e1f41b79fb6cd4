import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import type { Figure } from "~/figures/figure";
import { FigureView } from "./figure-view";

function figure(rows: number, width = 640): Figure {
  return {
    id: "series-salinity",
    title: "Surface salinity",
    caption: "Surface salinity. 2026-11-03 00:00 to 2026-11-08 00:00 UTC.",
    alt: 'Surface salinity, lowest 31.9 g/kg at "the worst" hour.',
    width,
    height: 100,
    svg: `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} 100"><path d="M0,0"/></svg>`,
    table: {
      columns: [
        { name: "time (UTC)", unit: "" },
        { name: "surface salinity", unit: "g/kg", decimals: 2 },
      ],
      rows: Array.from({ length: rows }, (_, index) => [`row ${index}`, index === 1 ? null : 31.94567]),
    },
  };
}

describe("FigureView", () => {
  it("names the drawing for those who cannot see it, and numbers the caption", () => {
    const page = renderToStaticMarkup(<FigureView figure={figure(3)} number={2} heading="h3" />);
    expect(page).toContain('role="img" aria-label="Surface salinity, lowest 31.9 g/kg at &quot;the worst&quot; hour."');
    expect(page).toContain("Figure 2. </span>Surface salinity.");
    expect(page).toContain(">Surface salinity</h3>");
  });

  it("shows the numbers rounded, with units and gaps named", () => {
    const page = renderToStaticMarkup(<FigureView figure={figure(3)} />);
    expect(page).toContain("Table, 3 rows");
    expect(page).toContain("31.95</td>");
    expect(page).toContain("no value</td>");
    expect(page).toContain("(g/kg)</span></th>");
  });

  it("shows at most 200 rows and says where the others are", () => {
    const page = renderToStaticMarkup(<FigureView figure={figure(4000)} csvHref="/numbers.csv" />);
    expect(page.match(/<tr>/g)).toHaveLength(201);
    expect(page).toContain("The first 200 of 4000 rows.");
    expect(page).toContain('<a href="/numbers.csv">All rows as CSV</a>');
  });

  it("offers without scripts only what the server can give", () => {
    expect(renderToStaticMarkup(<FigureView figure={figure(3)} />)).not.toMatch(/<button|<a /);
    expect(renderToStaticMarkup(<FigureView figure={figure(3)} csvHref="/numbers.csv" />)).toContain(
      'href="/numbers.csv"',
    );
  });

  it("gives a telephone the figure that was made for it, and only one of the two to each", () => {
    const page = renderToStaticMarkup(<FigureView figure={figure(3)} narrow={figure(3, 340)} />);
    expect(page).toMatch(/class="hidden sm:block[^"]*"><svg [^>]*width="640"/);
    expect(page).toMatch(/class="sm:hidden[^"]*"><svg [^>]*width="340"/);
  });
});
