import { describe, expect, it } from "vitest";
import type { PairRecord } from "../../src/crosscheck/pairRecords.ts";
import { type ComparisonPage, comparisonPage } from "../../src/figures/comparisonPage.ts";
import { hostileNames } from "./inventedSurvey.ts";

const pair: PairRecord = {
  name: "Ostara 1 b",
  name_other: "Ostara 01b",
  match: "name",
  quantity: "mass_earth",
  value: 5,
  minus: 0.5,
  plus: 0.5,
  value_other: 6,
  tension_sigma: -1.234,
  row: 1,
  row_other: 7,
  choice: "newest of 3 (2020)",
};
const pull = { count: 12, identical: 1, mean: 0.1, chiSquare: 24, chiSquareSigma: 2.1, fractionBeyond3Sigma: 0.083 };
const compared = {
  other: "other.csv",
  summary: "1 pairs",
  records: [pair],
  pulls: [{ ...pull, quantity: "mass_earth" }],
  moved: [{ name: "Ostara 1 b", verdict: "iron-silicate", verdictOther: "undecided" }],
};
const made = { version: "0.0.0", earthRadius: "1 Earth radius = 6378.1 km", command: "bulkwright crosscheck a b" };
const page: ComparisonPage = { list: "first.csv", comparisons: [compared], notes: [], made };

/** The rows of a data block as texts. */
function rowsOf(html: string, id: string): string[][] {
  const [, json = ""] = new RegExp(`id="${id}">(.*?)</script>`).exec(html) ?? [];
  const { texts, rows } = JSON.parse(json) as { texts: string[]; rows: number[][] };
  return rows.map((row) => row.map((place) => texts[place] ?? ""));
}

describe("comparisonPage", () => {
  it("has pairs with their errors, pulls, and verdicts that moved", async () => {
    const html = await comparisonPage(page);
    expect(rowsOf(html, "pairs-0-data")).toEqual([
      [
        "Ostara 1 b",
        "Ostara 01b",
        "name",
        "mass_earth",
        "5.00 ± 0.50",
        "6",
        "−1.23",
        "",
        "",
        "1: newest of 3 (2020)",
        "7",
      ],
    ]);
    expect(html).toContain("<bdi>8.3</bdi>");
    expect(html).toContain("1 planets with another verdict in each list");
  });

  it("leaves out empty tables, and gives every other list a section of its own", async () => {
    const html = await comparisonPage({ ...page, comparisons: [{ ...compared, pulls: [], moved: [] }, compared] });
    expect(html.match(/<h2>Against/g)).toHaveLength(2);
    expect(html.match(/id="(pulls|moved)-\d"/g)).toEqual(['id="pulls-1"', 'id="moved-1"']);
  });

  it("shows hostile text as text alone", async () => {
    const all = hostileNames.join(" ");
    const record = Object.fromEntries(Object.keys(pair).map((key) => [key, all])) as PairRecord;
    const moved = [{ name: all, verdict: all, verdictOther: all }];
    const pulls = [{ ...pull, quantity: all }];
    const hostile = { other: all, summary: all, records: [record], pulls, moved };
    const html = await comparisonPage({
      list: all,
      comparisons: [hostile],
      notes: [],
      made: { ...made, command: all },
    });
    const elements = (text: string) => [...new Set(text.match(/<\/?[a-z!][a-z0-9-]*/gi))].sort();
    expect(elements(html)).toEqual(elements(await comparisonPage(page)));
    expect(html.match(/<script/g)).toHaveLength(2);
  });
});
