import { useMemo, useSyncExternalStore } from "react";

const NAMES = ["paper", "ink", "quiet", "hairline", "land", "sea", "shore", "drift"] as const;

/** The product's colours as the map's canvas needs them: resolved, as hexadecimal. */
export type MapColours = Record<(typeof NAMES)[number], `#${string}`>;

/** Reads the colours from the page's style sheet, and again when the system turns dark or light. */
export function useMapColours(): MapColours {
  const dark = useSyncExternalStore(watchScheme, isDark);
  return useMemo(() => readColours(dark), [dark]);
}

function scheme(): MediaQueryList {
  return window.matchMedia("(prefers-color-scheme: dark)");
}

function isDark(): boolean {
  return scheme().matches;
}

function watchScheme(onChange: () => void): () => void {
  const query = scheme();
  query.addEventListener("change", onChange);
  return () => query.removeEventListener("change", onChange);
}

function readColours(dark: boolean): MapColours {
  const style = getComputedStyle(document.documentElement);
  const spare = dark ? "#9aa8b2" : "#55636f";
  const colour = (name: string): `#${string}` => {
    const value = style.getPropertyValue(`--${name}`).trim();
    return /^#[0-9a-f]{6}$/i.test(value) ? (value as `#${string}`) : spare;
  };
  return Object.fromEntries(NAMES.map((name) => [name, colour(name)])) as MapColours;
}
