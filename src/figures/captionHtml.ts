import { escapeHtml } from "./escape.ts";
import type { FigureCaption, FigureSource } from "./figureSpec.ts";
import { howMadeHtml } from "./howMade.ts";

/** Warnings first, then what a reader needs to trust the figure and to make it again. */
export function captionHtml(caption: FigureCaption): string {
  return `<figcaption>
${warnings(caption.warnings)}${caption.notes.map((note) => `<p>${escapeHtml(note)}</p>\n`).join("")}<div class="caption-columns">
<section><h3>Compositions</h3>
<dl>${caption.compositions.map(compositionHtml).join("")}</dl></section>
<section><h3>Equations of state</h3>
<ul>${caption.sources.map(sourceHtml).join("")}</ul></section>
</div>
<h3>How this page was made</h3>
${howMadeHtml(caption)}
</figcaption>`;
}

function warnings(texts: readonly string[]): string {
  if (texts.length === 0) return "";
  const items = texts.map((text) => `<li>${escapeHtml(text)}</li>`).join("");
  return `<div class="warnings" role="note" aria-label="Before reading off a number"><h3>Before reading off a number</h3><ul>${items}</ul></div>\n`;
}

function compositionHtml({ name, title, layers }: FigureCaption["compositions"][number]): string {
  return `<div><dt>${escapeHtml(title)} <code>${escapeHtml(name)}</code></dt><dd>${escapeHtml(layers)}</dd></div>`;
}

function sourceHtml({ subject, citation, doi, note }: FigureSource): string {
  const link = doi ? `, ${doiHtml(doi)}` : "";
  const remark = note ? ` <span class="remark">(${escapeHtml(note)})</span>` : "";
  return `<li><b>${escapeHtml(subject)}</b>: ${escapeHtml(citation)}${link}${remark}</li>`;
}

/** A link only where the text has the shape of a DOI; a user's file may hold anything. */
function doiHtml(doi: string): string {
  const text = `doi:${escapeHtml(doi)}`;
  return /^10\.\d{4,9}\/\S+$/.test(doi) ? `<a href="https://doi.org/${encodeURI(doi)}">${text}</a>` : text;
}
