/** Style sheet of pages with a diagram, its legend and its caption. */
export const figureStyle = `figure { margin: 0; }
.diagram { min-height: 27.5rem; margin-left: -0.4rem; }
@media (min-width: 48rem) { .diagram { min-height: 41.25rem; } }
@media (max-width: 47.99rem), print { .diagram .modebar { display: none; } }
@media print { .diagram { min-height: 0; margin-left: 0; } }

.legend { display: grid; gap: 0.35rem; margin: 0.5rem 0 1.25rem; font-size: 0.88rem; }
.legend-part { display: flex; gap: 0.75rem; align-items: flex-start; }
.legend h3 { margin: 0; flex: 0 0 4rem; font-size: inherit; line-height: 1.6rem; color: var(--ink-soft); }
.legend ul { display: flex; flex-wrap: wrap; gap: 0.15rem 0.9rem; margin: 0; padding: 0; max-width: none; list-style: none; }
.legend button {
  display: inline-flex; gap: 0.4rem; align-items: center; min-height: 1.6rem; padding: 0 0.15rem;
  border: 0; background: none; color: inherit; font: inherit; text-align: left; cursor: pointer;
}
.legend svg { flex: none; }
.legend button[aria-pressed="false"] svg { opacity: 0.3; }
.legend button[aria-pressed="false"] span { color: var(--ink-soft); text-decoration: line-through; }
@media (max-width: 40rem) { .legend-part { flex-direction: column; gap: 0.1rem; } .legend h3 { flex: none; } }

figcaption { font-size: 0.92rem; }
.warnings {
  max-width: none; margin: 0 0 1rem; padding: 0.65rem 1rem; border-left: 4px solid var(--warning); background: var(--panel);
}
.warnings h3 { margin: 0 0 0.2rem; color: var(--warning); }
.warnings ul { max-width: 62rem; }
.caption-columns { display: grid; grid-template-columns: repeat(auto-fit, minmax(min(24rem, 100%), 1fr)); gap: 0 2.5rem; }
dl > div { margin-bottom: 0.45rem; }
dt code { color: var(--ink-soft); margin-left: 0.2rem; }
dd { margin: 0; color: var(--ink-soft); }
.remark { color: var(--ink-soft); }
`;
