import { describe, expect, test } from "vitest";
import { type MatchOptions, matchLists } from "../../src/crosscheck/matchLists.ts";
import type { PlanetRow } from "../../src/planets/quantity.ts";
import { planetRow } from "./planetRow.ts";

type Place = readonly [ra: number, dec: number, period: number];
const at = ([rightAscension, declination, period]: Place) => ({ rightAscension, declination, period });
const named = (...names: string[]) => names.map((name, i) => planetRow({}, { name }, i + 1));
const placed = (name: string, place: Place) => planetRow(at(place), { name });

/** What was matched, in a form that reads well. */
function outcome(rows: readonly PlanetRow[], others: readonly PlanetRow[], options?: MatchOptions) {
  const { pairs, ambiguous, unmatched, unmatchedOther } = matchLists(rows, others, options);
  return {
    pairs: pairs.map(({ row, other, method }) => `${row.name} = ${other.name} by ${method}`),
    ambiguous: ambiguous.map(
      ({ row, candidates }) => `${row.name} ~ ${candidates.map(({ name }) => name).join(" | ")}`,
    ),
    unmatched: [...unmatched, ...unmatchedOther].map(({ name }) => name),
  };
}

const none = { pairs: [], ambiguous: [], unmatched: [] };

describe("matching by name", () => {
  test("sees through spelling", () => {
    expect(outcome(named("Ostara-07_b"), named("Ostara 7b"))).toEqual({
      ...none,
      pairs: ["Ostara-07_b = Ostara 7b by name"],
    });
  });

  test("ignores case where that is unambiguous", () => {
    expect(outcome(named("OSTARA 7 b"), named("Ostara 7 b"))).toEqual({
      ...none,
      pairs: ["OSTARA 7 b = Ostara 7 b by name-ignoring-case"],
    });
  });

  test("keeps planet and companion star apart where both are listed", () => {
    const { pairs } = outcome(named("Ostara 7 B", "Ostara 7 b"), named("Ostara 7 b", "Ostara 7 B"));
    expect(pairs).toEqual(["Ostara 7 B = Ostara 7 B by name", "Ostara 7 b = Ostara 7 b by name"]);
  });

  test("does not ignore case against the periods", () => {
    const [star, planet] = [placed("Ostara 7 B", [10, 10, 9000]), placed("Ostara 7 b", [10, 10, 3])];
    expect(outcome([star], [planet]).unmatched).toEqual(["Ostara 7 B", "Ostara 7 b"]);
  });

  test("uses aliases of rows and of the user", () => {
    const rows = [planetRow({}, { name: "QX 1 b", aliases: "Mirel 3 b; Tavi-5 b" })];
    expect(outcome(rows, named("Tavi 5 b")).pairs).toEqual(["QX 1 b = Tavi 5 b by alias"]);
    const aliases = new Map([["Sorel 9 b", "QX-1 b"]]);
    expect(outcome(rows, named("Sorel 9b"), { aliases }).pairs).toEqual(["QX 1 b = Sorel 9b by alias"]);
  });

  test("takes host and letter for a name", () => {
    const row = planetRow({}, { name: "", host: "Ostara 7", letter: "c" });
    expect(outcome([row], named("Ostara 7 c", "Ostara 7 b")).pairs).toEqual([" = Ostara 7 c by name"]);
  });

  test("takes a star's name for its only planet, not for one of several", () => {
    expect(outcome(named("Ostara-07"), named("Ostara 7 b")).pairs).toEqual(["Ostara-07 = Ostara 7 b by host"]);
    expect(outcome(named("Ostara-07"), named("Ostara 7 b", "Ostara 7 c")).ambiguous).toEqual([
      "Ostara-07 ~ Ostara 7 b | Ostara 7 c",
    ]);
  });

  test("tells a star's planets apart by period", () => {
    const planets = [placed("Ostara 7 b", [10, 10, 3]), placed("Ostara 7 c", [10, 10, 9])];
    expect(outcome([placed("Ostara-07", [80, 80, 9.01])], planets).pairs).toEqual(["Ostara-07 = Ostara 7 c by host"]);
  });

  test("reports a name that stands twice", () => {
    expect(outcome(named("Ostara 7 b"), named("Ostara 7 b", "Ostara-7b"))).toEqual({
      ...none,
      ambiguous: ["Ostara 7 b ~ Ostara 7 b | Ostara-7b"],
    });
  });

  test("reports two rows that claim one other", () => {
    expect(outcome(named("Ostara 7 b", "Ostara-7b"), named("Ostara 7 b"))).toEqual({
      ...none,
      ambiguous: ["Ostara 7 b ~ Ostara 7 b", "Ostara-7b ~ Ostara 7 b"],
    });
  });

  test("never matches empty names", () => {
    expect(outcome(named(""), named("")).unmatched).toEqual(["", ""]);
  });
});

describe("matching by position and period", () => {
  const row = placed("QX 1 b", [359.985, 60, 3.456]);

  test("pairs what names do not", () => {
    const other = placed("Tavi 5 b", [0.015, 60.001, 3.4561]);
    expect(outcome([row], [other]).pairs).toEqual(["QX 1 b = Tavi 5 b by position-and-period"]);
  });

  test("looks across the zones it sorts by", () => {
    const pairs = [0.9999, 1.0001].map((zone) => placed(`at ${zone}`, [20, zone / 60, 3]));
    expect(outcome(pairs.slice(0, 1), pairs.slice(1)).pairs).toHaveLength(1);
  });

  test.each<[string, Place]>([
    ["another period", [359.985, 60, 6.9]],
    ["two arc minutes away", [359.985, 60.0334, 3.456]],
  ])("leaves %s alone", (_, place) => {
    expect(outcome([row], [placed("Tavi 5 b", place)]).pairs).toEqual([]);
  });

  test("reports two candidates", () => {
    const others = [placed("Tavi 5 b", [359.985, 60, 3.456]), placed("Tavi 6 b", [359.985, 60, 3.457])];
    expect(outcome([row], others).ambiguous).toEqual(["QX 1 b ~ Tavi 5 b | Tavi 6 b"]);
  });
});
