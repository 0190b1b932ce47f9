/** Style sheet of pages with tables to sort and filter. */
export const explorerStyle = `.controls { display: flex; flex-wrap: wrap; gap: 0.6rem 1.2rem; margin: 0.75rem 0 0.4rem; }
.controls label { display: grid; gap: 0.15rem; font-size: 0.88rem; color: var(--ink-soft); flex: 0 1 auto; min-width: 0; }
.controls label:last-child { flex: 1 1 12rem; max-width: 24rem; }
.controls select, .controls input {
  min-height: 2rem; max-width: 100%; padding: 0.2rem 0.4rem; border: 1px solid var(--ink-soft); border-radius: 3px;
  background: var(--paper); color: var(--ink); font: inherit;
}
.pager { display: flex; flex-wrap: wrap; gap: 0.5rem; align-items: center; font-size: 0.88rem; }
.pager button {
  min-height: 1.9rem; padding: 0.1rem 0.7rem; border: 1px solid var(--ink-soft); border-radius: 3px;
  background: none; color: inherit; font: inherit; cursor: pointer;
}
.pager button:disabled { color: var(--ink-soft); border-color: var(--rule); cursor: default; }
.explorer thead button {
  padding: 0; border: 0; background: none; color: inherit; font: inherit; text-align: inherit; cursor: pointer;
}
.explorer thead button::after { content: " ↕"; color: var(--ink-soft); }
.explorer th[aria-sort="ascending"] button::after { content: " ↑"; color: inherit; }
.explorer th[aria-sort="descending"] button::after { content: " ↓"; color: inherit; }
@media print { .controls, .pager button { display: none; } .explorer thead button::after { content: ""; } }
`;
