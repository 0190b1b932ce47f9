import { describe, expect, test } from "vitest";
import { choosePublications, type PublicationRule } from "../../src/crosscheck/choosePublication.ts";
import { EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetRow } from "./planetRow.ts";

const name = "Ostara 1 b";
const publications = [
  planetRow({ mass: [5, 1], radius: [1.6, 0.2] }, { name, reference: "Tern & Wren 2012" }, 1),
  planetRow({ mass: [6, 1], radius: [1.7, 0.1] }, { name: "Ostara-01b", preferred: "1", reference: "Wren 2019" }, 2),
  planetRow({ mass: [5.5, 0.2], radius: [1.8, 0.1] }, { name, publicationDate: "2021-05" }, 3),
];
const single = planetRow({ radius: [2, 0.1] }, { name: "Ostara 2 b" }, 4);

const choose = (rule: PublicationRule, rows = publications) => choosePublications([...rows, single], rule);

describe("one row a planet", () => {
  test.each<[PublicationRule, number, string]>([
    ["preferred", 2, "preferred of 3"],
    ["newest", 3, "newest of 3 (2021-05)"],
    ["most-precise", 3, "most precise of 3"],
    ["combine", 1, "combined from rows 1, 2, 3"],
  ])("%s", (rule, row, choice) => {
    const [first, second] = choose(rule);
    expect([first?.row.row, first?.choice, first?.from.length]).toEqual([row, choice, 3]);
    expect([second?.row, second?.choice]).toEqual([single, "only publication"]);
  });

  test.each<[PublicationRule, string]>([
    ["preferred", "first of 2, none is marked as preferred"],
    ["newest", "first of 2, none is dated"],
    ["most-precise", "first of 2, none has errors"],
  ])("%s says so where nothing decides", (rule, choice) => {
    const [first] = choose(rule, [planetRow({ mass: 1 }, { name }, 1), planetRow({ mass: 2 }, { name }, 2)]);
    expect([first?.row.row, first?.choice]).toEqual([1, choice]);
  });

  test("rows without a name stay apart", () => {
    const nameless = [planetRow({}, { name: "" }, 1), planetRow({}, { name: "" }, 2)];
    expect(choosePublications(nameless, "newest")).toHaveLength(2);
  });
});

describe("combining", () => {
  /** Weights 25, 100, 100: mean 392/225, error 1/15 by hand; χ² = 0.888 is below n − 1, so the error stays. */
  test("is the weighted mean", () => {
    const radius = choose("combine")[0]?.row.quantities.radius;
    expectClose((radius?.value ?? 0) / EARTH_RADIUS, (25 * 1.6 + 100 * 1.7 + 100 * 1.8) / 225, {
      rel: 1e-12,
      because: "round-off",
    });
    expectClose((radius?.plus ?? 0) / EARTH_RADIUS, 1 / 15, { rel: 1e-12, because: "round-off" });
  });

  test("enlarges the error of values that disagree", () => {
    const rows = [planetRow({ radius: [1, 0.1] }, { name }, 1), planetRow({ radius: [2, 0.1] }, { name }, 2)];
    const radius = choose("combine", rows)[0]?.row.quantities.radius;
    // χ² = 50, so √50 times 0.1/√2.
    expectClose((radius?.minus ?? 0) / EARTH_RADIUS, 0.5, { rel: 1e-12, because: "round-off" });
  });

  test("keeps a limit where nothing is measured", () => {
    const limit = { kind: "upper-limit" } as const;
    const rows = [1, 2].map((row) => planetRow({ mass: [7, undefined, limit] }, { name }, row));
    expect(choose("combine", rows)[0]?.row.quantities.mass?.kind).toBe("upper-limit");
  });
});
