import { describe, expect, test } from "vitest";
import { compareLists } from "../../src/crosscheck/compareLists.ts";
import { matchLists } from "../../src/crosscheck/matchLists.ts";
import { pairColumns, pairRecords } from "../../src/crosscheck/pairRecords.ts";
import { expectClose } from "../support/expectClose.ts";
import { randomNumbers } from "./inventedList.ts";
import { planetRow, type Written } from "./planetRow.ts";

const lists = (radii: readonly (readonly [Written, Written])[]) =>
  [0, 1].map((list) => radii.map((pair, i) => planetRow({ radius: pair[list] as Written }, {}, i + 1)));

function compare(radii: readonly (readonly [Written, Written])[]) {
  const [rows = [], others = []] = lists(radii);
  const match = matchLists(rows, others);
  return { match, comparison: compareLists(match.pairs) };
}

describe("tension", () => {
  test("uses the errors that face each other", () => {
    const { comparison } = compare([
      [
        [2, [0.3, 9]],
        [1, [9, 0.4]],
      ],
    ]);
    expectClose(comparison.tensions[0]?.tensionSigma ?? 0, 2, { rel: 1e-12, because: "1 / hypot(0.3, 0.4)" });
  });

  test("is not formed with limits or without errors", () => {
    const limit: Written = [3, undefined, { kind: "upper-limit" }];
    const { comparison } = compare([
      [[2, 0.1], limit],
      [2, [1, 0.1]],
    ]);
    expect(comparison.tensions.map(({ tensionSigma }) => tensionSigma)).toEqual([undefined, undefined]);
    expect(comparison.pulls).toEqual([]);
  });
});

describe("pulls", () => {
  const normalPairs = (count: number, quoted: number) => {
    const random = randomNumbers(17);
    const normal = () => Math.sqrt(-2 * Math.log(random())) * Math.cos(2 * Math.PI * random());
    return Array.from({ length: count }, (): [Written, Written] => [
      [50 + normal(), quoted],
      [50 + normal(), quoted],
    ]);
  };

  test("of honest errors are normal deviates", () => {
    const [pull] = compare(normalPairs(1000, 1)).comparison.pulls;
    // Eight in a thousand agree within 0.01 sigma by chance and pass for quotations.
    expect(pull?.count).toBeGreaterThan(980);
    expect(Math.abs(pull?.chiSquareSigma ?? 9)).toBeLessThan(3);
    expect(pull?.fractionBeyond3Sigma).toBeLessThan(0.01);
  });

  test.each([
    [0.5, 10],
    [2, -10],
  ])("show errors %f times the true ones", (quoted, sigma) => {
    const [pull] = compare(normalPairs(1000, quoted)).comparison.pulls;
    expect(Math.sign(sigma) * (pull?.chiSquareSigma ?? 0)).toBeGreaterThan(Math.abs(sigma));
  });

  test("χ² of 18.307 with 10 pairs is as rare as 1.645 sigma (the 5 % point of published tables)", () => {
    const pull = Math.sqrt(18.307 / 10);
    const pairs = Array.from({ length: 10 }, (): [Written, Written] => [
      [10, Math.SQRT1_2],
      [10 + pull, Math.SQRT1_2],
    ]);
    const [summary] = compare(pairs).comparison.pulls;
    expectClose(summary?.chiSquareSigma ?? 0, 1.645, {
      rel: 0.01,
      because: "error of the Wilson–Hilferty approximation",
    });
  });

  test("leave out one value quoted twice", () => {
    const [pull] = compare([
      [
        [2, 0.1],
        [2.0004, 0.1002],
      ],
      [
        [2, 0.1],
        [2.1, 0.1],
      ],
    ]).comparison.pulls;
    expect(pull).toMatchObject({ count: 1, identical: 1 });
  });
});

test("verdicts that depend on the source", () => {
  const [rows = [], others = []] = lists([
    [1, 3],
    [1, 1.1],
  ]);
  const { pairs } = matchLists(rows, others);
  const classify = ({ quantities }: (typeof rows)[number]) => ((quantities.radius?.value ?? 0) > 1e7 ? "gas" : "rock");
  expect(
    compareLists(pairs, classify).verdicts.map(({ verdict, verdictOther, moved }) => [verdict, verdictOther, moved]),
  ).toEqual([
    ["rock", "gas", true],
    ["rock", "rock", false],
  ]);
});

test("records hold every pair and every row left over", () => {
  const rows = [planetRow({ radius: [2, 0.1] }, {}, 1), planetRow({}, { name: "only here b" }, 2)];
  const others = [planetRow({ radius: [3, 0.1] }, {}, 1), planetRow({}, { name: "only there b" }, 2)];
  const match = matchLists(rows, others);
  const records = pairRecords(match, compareLists(match.pairs));
  expect(records.flatMap((record) => Object.keys(record)).filter((key) => !pairColumns.some((column) => column === key))).toEqual([]);
  expect(records.map(({ name, name_other, match: method, quantity }) => [name, name_other, method, quantity])).toEqual([
    ["Ostara 1 b", "Ostara 1 b", "name", "radius_earth"],
    ["only here b", undefined, "only-first", undefined],
    [undefined, "only there b", "only-second", undefined],
  ]);
  expectClose(Number(records[0]?.value), 2, { rel: 1e-12, because: "there and back through SI" });
});
