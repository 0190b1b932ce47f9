import { customProperties, darkPalette, lightPalette } from "./palette.ts";

/** Style sheet that every page shares: text, tables, light, dark and print. */
export const pageStyle = `:root { color-scheme: light dark; ${customProperties(lightPalette)} }
@media (prefers-color-scheme: dark) { :root { ${customProperties(darkPalette)} } }
@media print { :root { color-scheme: light; ${customProperties(lightPalette)} } }

* { box-sizing: border-box; }
html { -webkit-text-size-adjust: 100%; }
body {
  margin: 0 auto; padding: 2.25rem clamp(0.9rem, 3vw, 2.5rem) 4rem; max-width: 82rem;
  background: var(--paper); color: var(--ink);
  font: 1rem/1.55 "Source Sans 3", "Noto Sans", "Segoe UI", "Liberation Sans", "Helvetica Neue", Arial, sans-serif;
  overflow-wrap: anywhere;
}
h1, h2, h3 { line-height: 1.2; font-weight: 600; text-wrap: balance; }
h1 { font-size: clamp(1.45rem, 1.1rem + 1.4vw, 2rem); margin: 0 0 0.4rem; letter-spacing: -0.01em; }
h2 { font-size: 1.2rem; margin: 2.75rem 0 0.75rem; }
h3 { font-size: 0.95rem; margin: 1.4rem 0 0.4rem; }
p, ul, dl { margin: 0.4rem 0; max-width: 46rem; }
ul { padding-left: 1.1rem; }
a { color: var(--accent); }
code, pre { font-family: "Source Code Pro", "Noto Sans Mono", "Liberation Mono", Consolas, monospace; font-size: 0.88em; }
pre { margin: 0.4rem 0; padding: 0.6rem 0.8rem; background: var(--panel); white-space: pre-wrap; border-radius: 3px; }
.lead { color: var(--ink-soft); max-width: 62rem; margin-bottom: 0.75rem; text-wrap: pretty; }
:focus-visible { outline: 2px solid var(--accent); outline-offset: 2px; }

.table-region {
  max-height: min(38rem, 80vh); overflow: auto; border: 1px solid var(--rule); border-radius: 3px;
}
.table-region.long { content-visibility: auto; contain-intrinsic-size: auto 38rem; }
table { border-collapse: separate; border-spacing: 0; width: 100%; font-size: 0.88rem; line-height: 1.35; }
caption { text-align: left; padding: 0.6rem 0; color: var(--ink-soft); }
caption span { position: sticky; left: 0; display: inline-block; max-width: min(46rem, 88vw); padding: 0 0.75rem; }
th, td { padding: 0.38rem 0.75rem; text-align: left; vertical-align: top; overflow-wrap: normal; }
tbody th {
  position: sticky; left: 0; min-width: 6rem; max-width: 14rem; background: var(--paper);
  font-weight: 600; overflow-wrap: anywhere;
}
td { overflow-wrap: anywhere; }
.sentence { min-width: 13rem; }
thead th {
  position: sticky; top: 0; background: var(--panel); font-weight: 600; vertical-align: bottom;
  border-bottom: 1px solid var(--rule);
}
thead th:first-child { left: 0; z-index: 1; }
tbody tr + tr > * { border-top: 1px solid var(--grid); }
.number { text-align: right; font-variant-numeric: tabular-nums; white-space: nowrap; }
thead .number { white-space: normal; min-width: 5rem; }
.unit { font-weight: 400; color: var(--ink-soft); }

@media print {
  @page { margin: 15mm; }
  body { padding: 0; max-width: none; font-size: 9.5pt; }
  .table-region { max-height: none; overflow: visible; border: 0; }
  .table-region.long { content-visibility: visible; }
  table { font-size: 7.5pt; }
  table th, table td { padding: 0.15rem 0.35rem; min-width: 0; overflow-wrap: break-word; }
  thead th, tbody th { position: static; }
  tr, figure { break-inside: avoid; }
  h2, h3 { break-after: avoid; }
}
`;
