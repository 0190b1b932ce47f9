import type { ColourRole } from "./palette.ts";

/** Symbol and colour of a verdict; both differ, so that neither sight nor print need tell colours apart. */
export interface MarkStyle {
  readonly colour: ColourRole;
  readonly symbol: MarkSymbol;
  readonly open: boolean;
}

export type MarkSymbol = "square" | "circle" | "diamond" | "triangle-up" | "triangle-down";

/** Makes symbols of one nominal size look alike. */
export const symbolScale: Readonly<Record<MarkSymbol, number>> = {
  square: 0.9,
  circle: 1,
  diamond: 1.05,
  "triangle-up": 1.3,
  "triangle-down": 1.3,
};

const symbols: readonly MarkSymbol[] = ["square", "circle", "diamond", "triangle-up", "triangle-down"];

/** Filled symbols first, then the same ones open. */
export function verdictStyle(verdict: number): MarkStyle {
  const kind = verdict % symbols.length;
  return {
    colour: `verdict-${(kind + 1) as 1 | 2 | 3 | 4 | 5}`,
    symbol: symbols[kind] as MarkSymbol,
    open: Math.floor(verdict / symbols.length) % 2 === 1,
  };
}

const curveColours = 8;

export function curveColour(curve: number): ColourRole {
  return `curve-${((curve % curveColours) + 1) as 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8}`;
}

/** Names that tie what is drawn to its entry in the legend. */
export const curveGroup = (curve: number): string => `curve-${curve}`;
export const verdictGroup = (verdict: number): string => `verdict-${verdict}`;
export const densityGroup = "density";
