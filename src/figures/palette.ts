/**
 * Colours by role, for a light and a dark page; the style sheet turns them into custom properties, which the drawing
 * reads back. Found by a search that kept every pair of verdict colours, and of neighbouring curve colours, apart in
 * OKLab for normal, protanopic, deuteranopic and tritanopic sight.
 * Checked by test/figures/palette.test.ts.
 */
export type ColourRole =
  | "paper"
  | "panel"
  | "ink"
  | "ink-soft"
  | "rule"
  | "grid"
  | "accent"
  | "warning"
  | "density-low"
  | "density-high"
  | `curve-${1 | 2 | 3 | 4 | 5 | 6 | 7 | 8}`
  | `verdict-${1 | 2 | 3 | 4 | 5}`;

export type Palette = Readonly<Record<ColourRole, string>>;

export const lightPalette: Palette = {
  paper: "#ffffff",
  panel: "#f4f5f3",
  ink: "#1d2326",
  "ink-soft": "#535c60",
  rule: "#c9cfcd",
  grid: "#e6e9e7",
  accent: "#1f5c63",
  warning: "#8f4a00",
  "density-low": "rgba(29,35,38,0.08)",
  "density-high": "rgba(29,35,38,0.6)",
  "curve-1": "#80504f",
  "curve-2": "#be8976",
  "curve-3": "#3c2a07",
  "curve-4": "#5b6515",
  "curve-5": "#34a3a6",
  "curve-6": "#0a314a",
  "curve-7": "#4c50b0",
  "curve-8": "#a284ac",
  "verdict-1": "#490145",
  "verdict-2": "#702200",
  "verdict-3": "#4c9f9e",
  "verdict-4": "#1c2da0",
  "verdict-5": "#af8a1f",
};

export const darkPalette: Palette = {
  paper: "#14181d",
  panel: "#1c2228",
  ink: "#e8ebe9",
  "ink-soft": "#a9b2b5",
  rule: "#3a444a",
  grid: "#262d33",
  accent: "#8fd0d2",
  warning: "#f2b36b",
  "density-low": "rgba(232,235,233,0.08)",
  "density-high": "rgba(232,235,233,0.6)",
  "curve-1": "#f28291",
  "curve-2": "#a45c21",
  "curve-3": "#fce46d",
  "curve-4": "#a1af88",
  "curve-5": "#427971",
  "curve-6": "#beedff",
  "curve-7": "#84a5fc",
  "curve-8": "#85628f",
  "verdict-1": "#cd9dc7",
  "verdict-2": "#f88a06",
  "verdict-3": "#9bfbeb",
  "verdict-4": "#4e77ee",
  "verdict-5": "#f8ee2b",
};

/** How a palette enters a style sheet. */
export function customProperties(palette: Palette): string {
  return Object.entries(palette)
    .map(([role, colour]) => `--${role}:${colour};`)
    .join("");
}
