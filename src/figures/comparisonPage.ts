import type { PairRecord } from "../crosscheck/pairRecords.ts";
import type { PullSummary } from "../crosscheck/pulls.ts";
import { escapeHtml } from "./escape.ts";
import { type ExplorableTable, explorer } from "./explorer.ts";
import { explorerStyle } from "./explorerStyle.ts";
import { exploreTables } from "./exploreTables.ts";
import { formatCount } from "./formatValue.ts";
import { type HowMade, howMadeHtml } from "./howMade.ts";
import { pageHtml } from "./page.ts";
import { type PageTable, tableHtml } from "./table.ts";

/** A list held against another one. */
export interface ComparedWith {
  readonly other: string;
  /** How many pairs and rows left over, in a sentence. */
  readonly summary: string;
  readonly records: readonly PairRecord[];
  /** Quantities under their display names. */
  readonly pulls: readonly (Omit<PullSummary, "quantity"> & { readonly quantity: string })[];
  readonly moved: readonly MovedVerdict[];
}

export interface MovedVerdict {
  readonly name: string;
  readonly verdict: string;
  readonly verdictOther: string;
}

export interface ComparisonPage {
  readonly list: string;
  readonly comparisons: readonly ComparedWith[];
  readonly notes: readonly string[];
  readonly made: HowMade;
}

/**
 * A list against one or several others, as one self-contained page.
 * Checked by test/figures/comparisonPage.test.ts.
 */
export async function comparisonPage({ list, comparisons, notes, made }: ComparisonPage): Promise<string> {
  const title = `${list} against ${comparisons.map(({ other }) => other).join(", ")}`;
  const parts = comparisons.map((comparison, i) => ({ ...comparison, pairs: explorer(pairTable(comparison, i)) }));
  return pageHtml({
    title,
    style: explorerStyle,
    body: `<main>
<h1>${escapeHtml(title)}</h1>
${notes.map((note) => `<p>${escapeHtml(note)}</p>`).join("\n")}
${parts.map((part, i) => comparisonHtml(part, i, part.pairs.html)).join("\n")}
<section><h2>How this page was made</h2>
${howMadeHtml(made)}</section>
</main>`,
    data: Object.assign({}, ...parts.map(({ pairs }) => pairs.data)),
    scripts: [`(${exploreTables})();`],
  });
}

function comparisonHtml({ other, summary, pulls, moved }: ComparedWith, i: number, pairs: string): string {
  const tables = [
    ...(pulls.length > 0 ? ["<h3>Are the quoted errors believable?</h3>", tableHtml(pullTable(pulls, i))] : []),
    ...(moved.length > 0 ? ["<h3>Verdicts that depend on the list</h3>", tableHtml(movedTable(moved, i))] : []),
  ];
  return `<section><h2>Against ${escapeHtml(other)}</h2>
<p class="lead">${escapeHtml(summary)}</p>
${tables.join("\n")}
<h3>Pairs, quantity by quantity</h3>
${pairs}</section>`;
}

function pullTable(pulls: ComparedWith["pulls"], i: number): PageTable {
  return {
    id: `pulls-${i}`,
    caption:
      "Differences over their combined errors. Believable errors give a chi-square near the number of pairs; one of many sigma above it means errors too small, below it errors too large or values in common",
    columns: [
      { title: "Quantity" },
      { title: "Pairs", numeric: true, digits: 9 },
      { title: "Identical, left out", numeric: true, digits: 9 },
      { title: "Mean pull", numeric: true, digits: 3 },
      { title: "Chi-square", numeric: true },
      { title: "Chi-square off by", unit: "sigma", numeric: true, digits: 3 },
      { title: "Beyond 3 sigma", unit: "%, 0.27 expected", numeric: true, digits: 3 },
    ],
    rows: pulls.map((pull) => [
      pull.quantity,
      pull.count,
      pull.identical,
      pull.mean,
      pull.chiSquare,
      pull.chiSquareSigma,
      100 * pull.fractionBeyond3Sigma,
    ]),
  };
}

function movedTable(moved: readonly MovedVerdict[], i: number): PageTable {
  return {
    id: `moved-${i}`,
    caption: `${formatCount(moved.length)} planets with another verdict in each list`,
    columns: [{ title: "Planet" }, { title: "Verdict" }, { title: "Verdict by the other list" }],
    rows: moved.map(({ name, verdict, verdictOther }) => [name, verdict, verdictOther]),
  };
}

function pairTable({ records }: ComparedWith, i: number): ExplorableTable {
  return {
    id: `pairs-${i}`,
    noun: "lines",
    caption: "Every quantity of every pair, then the rows left over; a heading sorts",
    columns: [
      { title: "Planet" },
      { title: "In the other list" },
      { title: "Match", isChoice: true },
      { title: "Quantity", isChoice: true },
      { title: "Value", numeric: true },
      { title: "Other value", numeric: true },
      { title: "Tension", unit: "sigma", numeric: true, digits: 3 },
      { title: "Verdict", isChoice: true },
      { title: "Other verdict", isChoice: true },
      { title: "Row", wide: true },
      { title: "Other row", wide: true },
    ],
    rows: records.map((record) => [
      record.name ?? null,
      record.name_other ?? null,
      record.match ?? null,
      record.quantity ?? null,
      estimate(record.value, record.minus, record.plus),
      estimate(record.value_other, record.minus_other, record.plus_other),
      record.tension_sigma ?? null,
      record.verdict ?? null,
      record.verdict_other ?? null,
      rowText(record.row, record.choice),
      rowText(record.row_other, record.choice_other),
    ]),
  };
}

type Cell = PairRecord[keyof PairRecord];

function estimate(value: Cell, minus: Cell, plus: Cell) {
  const size = (cell: Cell) => (typeof cell === "number" ? cell : null);
  return typeof value === "number" ? { value, minus: size(minus), plus: size(plus) } : null;
}

const rowText = (row: Cell, choice: Cell) => (row === undefined ? null : [row, choice].filter(Boolean).join(": "));
