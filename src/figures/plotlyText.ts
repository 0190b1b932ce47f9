import { visibleText } from "./visibleText.ts";

/**
 * Untrusted text for Plotly, which reads a small HTML of its own, entities, TeX between dollar signs and, in the
 * drawing script, colour names. Every character but letters, digits and a few harmless signs becomes a numeric
 * entity, which Plotly turns back exactly once.
 */
export function plotlyText(text: string): string {
  return visibleText(text).replace(/[^\p{L}\p{M}\p{N} .,]/gu, (character) => `&#${character.codePointAt(0)};`);
}

const charactersPerLine = 46;
const linesPerItem = 4;

/** Lines of a hover label, long ones wrapped, endless ones cut; the first stands out. */
export function hoverText([title = "", ...lines]: readonly string[]): string {
  const head = wrap(title).map((line) => `<b>${plotlyText(line)}</b>`);
  const rest = lines.flatMap(wrap).map(plotlyText);
  return [...head, ...rest].join("<br>");
}

function wrap(text: string): string[] {
  const lines: string[] = [];
  let rest = [...text];
  while (rest.length > charactersPerLine && lines.length < linesPerItem - 1) {
    const space = rest.lastIndexOf(" ", charactersPerLine);
    const end = space > charactersPerLine / 2 ? space : charactersPerLine;
    lines.push(rest.slice(0, end).join(""));
    rest = rest.slice(rest[end] === " " ? end + 1 : end);
  }
  const last = rest.length > charactersPerLine ? [...rest.slice(0, charactersPerLine - 1), "…"] : rest;
  return [...lines, last.join("")];
}
