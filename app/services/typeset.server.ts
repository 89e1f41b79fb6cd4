import katex from "katex";

const set = new Map<string, string>();

/**
 * An equation as MathML, which browsers draw with the page's own colours and screen readers read aloud.
 * @param tex one of the engine's own equations, never a visitor's text
 * @throws Error where the TeX cannot be read: a fault of the engine's source entry, which a test finds
 */
export function mathMarkup(tex: string): string {
  const known = set.get(tex);
  if (known !== undefined) return known;
  const drawn = katex.renderToString(tex, { displayMode: true, output: "mathml", strict: "error", trust: false });
  // Styles within the markup are gaps only, which the page's own style sheet sets: its policy allows no others.
  const markup = drawn.replaceAll(/ style="[^"]*"/g, "");
  set.set(tex, markup);
  return markup;
}
