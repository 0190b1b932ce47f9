import { escapeHtml } from "./escape.ts";
import type { FigureSpec } from "./figureSpec.ts";
import { formatCount } from "./formatValue.ts";
import {
  curveColour,
  curveGroup,
  densityGroup,
  type MarkStyle,
  type MarkSymbol,
  verdictGroup,
  verdictStyle,
} from "./seriesStyle.ts";

/** The legend stands outside the diagram, so that it covers nothing; each entry is a button that hides its series. */
export function legendHtml(spec: FigureSpec): string {
  const curves = spec.curves.map(({ label }, i) => entry(curveGroup(i), lineSwatch(i), label));
  const planets = [...verdictEntries(spec), ...densityEntry(spec)];
  return `<div class="legend" role="group" aria-label="Legend: press an entry to hide or show it">
${list("Curves", curves)}${list("Planets", planets)}</div>`;
}

function list(title: string, entries: readonly string[]): string {
  if (entries.length === 0) return "";
  return `<div class="legend-part"><h3>${title}</h3><ul>${entries.join("")}</ul></div>\n`;
}

function entry(group: string, swatch: string, label: string): string {
  return `<li><button type="button" aria-pressed="true" data-group="${group}">${swatch}<span>${escapeHtml(label)}</span></button></li>`;
}

function verdictEntries({ marks, verdicts }: FigureSpec): string[] {
  const counts = new Map<number, number>();
  for (const { verdict } of marks) counts.set(verdict, (counts.get(verdict) ?? 0) + 1);
  return verdicts.flatMap((label, verdict) => {
    const count = counts.get(verdict);
    if (count === undefined) return [];
    return [entry(verdictGroup(verdict), markSwatch(verdictStyle(verdict)), `${label} (${formatCount(count)})`)];
  });
}

function densityEntry({ density }: FigureSpec): string[] {
  if (density === null) return [];
  const swatch = svg('<rect x="1" y="1" width="22" height="14" fill="var(--density-high)"/>');
  return [entry(densityGroup, swatch, `counted, not drawn one by one (${formatCount(density.total)})`)];
}

const lineSwatch = (curve: number): string =>
  svg(`<path d="M1 8H23" stroke="var(--${curveColour(curve)})" stroke-width="2.5"/>`);

const outlines: Readonly<Record<MarkSymbol, string>> = {
  square: "M7.5 3.5h9v9h-9z",
  circle: "M12 3a5 5 0 1 0 .01 0z",
  diamond: "M12 2l6 6l-6 6l-6-6z",
  "triangle-up": "M12 2.5l5.8 10h-11.6z",
  "triangle-down": "M12 13.5l5.8-10h-11.6z",
};

function markSwatch({ colour, symbol, open }: MarkStyle): string {
  const paint = open ? `fill="none" stroke="var(--${colour})" stroke-width="1.6"` : `fill="var(--${colour})"`;
  return svg(`<path d="${outlines[symbol]}" ${paint}/>`);
}

const svg = (content: string): string =>
  `<svg width="24" height="16" viewBox="0 0 24 16" aria-hidden="true">${content}</svg>`;
