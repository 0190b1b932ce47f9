import { describe, expect, test } from "vitest";
import type { MeasuredQuantity, QuantityName } from "../../src/planets/quantity.ts";
import { EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { readList } from "./readText.ts";

/** The mass of the only row of a list, in Earth masses. */
async function massOf(header: string, row: string, name: QuantityName = "mass"): Promise<Partial<MeasuredQuantity>> {
  const quantity = (await readList(`name,${header}\nAster b,${row}\n`)).rows[0]?.quantities[name];
  const inEarths = (size: number | undefined): number | undefined =>
    size === undefined ? undefined : Number((size / EARTH_MASS).toPrecision(12));
  return {
    kind: quantity?.kind,
    value: inEarths(quantity?.value),
    minus: inEarths(quantity?.minus),
    plus: inEarths(quantity?.plus),
    limitCoding: quantity?.limitCoding,
  };
}

const own = "mass_earth,mass_earth_minus,mass_earth_plus";
const flagged = "pl_bmasse,pl_bmasseerr1,pl_bmasseerr2,pl_bmasselim";

describe("every convention of the lists is exactly one kind", () => {
  test.each([
    ["errors as positive sizes", own, "5,1,2", { kind: "measured", value: 5, minus: 1, plus: 2 }],
    ["a signed lower error", flagged, "5,2,-1,0", { kind: "measured", minus: 1, plus: 2 }],
    ["a lower error positive by mistake", flagged, "5,2,1,0", { kind: "measured", minus: 1, plus: 2 }],
    ["one column for both sides", "mass_earth,mass_earth_err", "5,1", { kind: "measured", minus: 1, plus: 1 }],
    ["errors typed into the cell", "mass_earth", "5 +2 -1", { kind: "measured", minus: 1, plus: 2 }],
    ["no errors", own, "5,,", { kind: "no-uncertainty", value: 5 }],
    ["no error columns", "mass_earth", "5", { kind: "no-uncertainty", value: 5 }],
    ["the upper error only", own, "5,,2", { kind: "no-uncertainty", plus: 2 }],
    ["the lower error only", own, "5,1,", { kind: "no-uncertainty", minus: 1 }],
    ["errors of zero", own, "5,0,0", { kind: "no-uncertainty" }],
    ["one error of zero", own, "5,0,1", { kind: "no-uncertainty" }],
    ["errors written -1 for missing", own, "5,-1,-1", { kind: "no-uncertainty", minus: undefined }],
    ["flag 1", flagged, "5,,,1", { kind: "upper-limit", value: 5, limitCoding: "flag" }],
    ["flag -1", flagged, "5,,,-1", { kind: "lower-limit", value: 5, limitCoding: "flag" }],
    ["flag 1 beside errors", flagged, "5,1,-1,1", { kind: "upper-limit", minus: 1, plus: 1, limitCoding: "flag" }],
    ["flag 9, which means nothing", flagged, "5,1,-1,9", { kind: "no-uncertainty" }],
    ["flag <", flagged, "5,,,<", { kind: "upper-limit", limitCoding: "flag" }],
    ["flag >", flagged, "5,,,>", { kind: "lower-limit", limitCoding: "flag" }],
    ["flag upper", flagged, "5,1,-1,upper", { kind: "upper-limit", limitCoding: "flag" }],
    ["flag lower", flagged, "5,1,-1,Lower limit", { kind: "lower-limit", limitCoding: "flag" }],
    ["flag U", flagged, "5,,,U", { kind: "upper-limit", limitCoding: "flag" }],
    ["flag L", flagged, "5,,,L", { kind: "lower-limit", limitCoding: "flag" }],
    ["a flag that only begins like one", flagged, "5,1,-1,useful", { kind: "no-uncertainty" }],
    ["typed <", own, "<5,,", { kind: "upper-limit", value: 5, limitCoding: "typed" }],
    ["typed >", own, ">5,,", { kind: "lower-limit", value: 5, limitCoding: "typed" }],
    ["0.0 +0.15 -0.0", own, "0.0,0.0,0.15", { kind: "upper-limit", value: 0.15, limitCoding: "zero-with-error" }],
    ["infinite errors", own, "5,inf,inf", { kind: "upper-limit", value: 5, limitCoding: "infinite-error" }],
    ["errors that are no number", own, "5,nan,nan", { kind: "upper-limit", value: 5, limitCoding: "infinite-error" }],
    ["an infinite upper error", own, "5,1,inf", { kind: "lower-limit", minus: 1, limitCoding: "infinite-error" }],
    ["an infinite lower error", own, "5,inf,1", { kind: "upper-limit", plus: 1, limitCoding: "infinite-error" }],
    ["errors equal to the value", own, "5,5,5", { kind: "upper-limit", value: 5, limitCoding: "error-equals-value" }],
    ["from a relation", `${flagged},pl_bmassprov`, "5,,,0,M-R relationship", { kind: "from-relation" }],
    ["from a relation, with errors", `${own},mass_provenance`, "5,1,1,M-R relation", { kind: "from-relation" }],
    ["M sin i", `${flagged},pl_bmassprov`, "5,1,-1,0,Msini", { kind: "minimum", minus: 1 }],
    ["M sin i over sin i", `${flagged},pl_bmassprov`, "5,1,-1,0,Msin(i)/sin(i)", { kind: "measured" }],
    ["a mass", `${flagged},pl_bmassprov`, "5,1,-1,0,Mass", { kind: "measured" }],
    ["a method that contains the letters sin", `${own},mass_provenance`, "5,1,1,Microlensing", { kind: "measured" }],
    ["theoretical", `${own},mass_detection_type`, "5,1,1,Theoretical", { kind: "theoretical" }],
    ["M sin i repeated as the mass", `${own},minimum_mass_earth`, "5,1,1,5", { kind: "minimum" }],
    ["the same, without errors", `${own},minimum_mass_earth`, "5,,,5", { kind: "minimum" }],
    ["the same, edge-on", `${own},minimum_mass_earth,inclination_deg`, "5,1,1,5,89.5", { kind: "measured" }],
    ["the same, inclined", `${own},minimum_mass_earth,inclination_deg`, "5,1,1,5,45", { kind: "minimum" }],
    ["M sin i beside a mass", `${own},minimum_mass_earth`, "5,1,1,4.5", { kind: "measured" }],
    ["M sin i alone", "minimum_mass_earth,minimum_mass_earth_err", "5,1", { kind: "minimum", value: 5, plus: 1 }],
  ])("%s", async (_, header, row, expected) => {
    expect(await massOf(header, row)).toMatchObject(expected);
  });

  test("nan as an error is a missing one in a list that writes nan for missing values", async () => {
    const { rows } = await readList(`name,${own}\nA,nan,nan,nan\nB,5,nan,nan\n`);
    expect(rows[1]?.quantities.mass?.kind).toBe("no-uncertainty");
  });

  test("-1 as a lower error is a missing one in a list that writes -1 for missing values", async () => {
    const { rows } = await readList(`name,${own}\nA,-1,-1,-1\nB,5,-1,1\n`);
    expect(rows[1]?.quantities.mass).toMatchObject({ kind: "no-uncertainty", minus: undefined });
  });

  test("a metallicity of -1 does not make -1 a missing value", async () => {
    const { rows } = await readList(`name,${own},st_met\nA,5,-1,1,-1\n`);
    expect(rows[0]?.quantities.mass?.kind).toBe("measured");
  });

  test.each(["", "NULL", "nan", '""', "-1", "null", "-"])(
    "a value written %j is missing without an issue",
    async (text) => {
      const [row] = (await readList(`name,${own}\nA,${text},,\n`)).rows;
      expect(row).toMatchObject({ quantities: {}, issues: [] });
    },
  );
});

describe("what cannot be is an issue with its place, and the row stays", () => {
  test.each([
    ["text", "abc,1,1", "not-a-number", "mass_earth", "abc"],
    ["text in an error", "5,x,1", "not-a-number", "mass_earth_minus", "x"],
    ["a negative mass", "-5,1,1", "negative-mass", "mass_earth", "-5"],
    ["minus one with errors", "-1,0.1,0.1", "negative-mass", "mass_earth", "-1"],
    ["a mass of zero", "0,,", "zero-mass", "mass_earth", "0"],
    ["an infinite mass", "inf,,", "not-a-number", "mass_earth", "inf"],
    ["a hexadecimal number", "0x10,1,1", "not-a-number", "mass_earth", "0x10"],
    ["signs the wrong way round", "5,0.5,-0.7", "error-signs-swapped", "mass_earth_plus", "-0.7"],
  ])("%s", async (_, row, code, column, found) => {
    const list = await readList(`name,${own}\nAster b,${row}\n`);
    expect(list.rows).toHaveLength(1);
    expect(list.rows[0]?.issues).toMatchObject([{ code, found, origin: { file: "list", line: 2, column } }]);
  });

  test("a radius of zero", async () => {
    const [row] = (await readList("name,radius_earth\nA,0\n")).rows;
    expect(row).toMatchObject({ name: "A", quantities: {}, issues: [{ code: "zero-radius" }] });
  });

  test("an unknown limit flag", async () => {
    const [row] = (await readList(`name,${flagged}\nA,5,1,-1,9\n`)).rows;
    expect(row?.issues).toMatchObject([{ code: "unknown-limit-flag", found: "9" }]);
  });
});

test("every row comes out in order, its name and cells verbatim", async () => {
  const names = ["  Aster b", "Aster\u00a0b", "Aster  b", "", "<b>&amp;</b>", "β Brook"];
  const { rows } = await readList(`name,mass_earth\n${names.map((name, i) => `${name},${i + 1}`).join("\n")}\n`);
  expect(rows.map(({ name }) => name)).toEqual(names);
  expect(rows.map(({ row, line }) => [row, line])).toEqual(names.map((_, i) => [i + 1, i + 2]));
  expect(rows[0]?.cells).toEqual(["  Aster b", "1"]);
});

test("the Earth radius is the caller's choice", async () => {
  const radius = async (earthRadius: number) =>
    (await readList("name,radius_earth\nA,2\n", { earthRadius })).rows[0]?.quantities.radius?.value ?? 0;
  expectClose(await radius(6.371e6), 2 * 6.371e6, { rel: 1e-15, because: "one product" });
  expectClose(await radius(EARTH_RADIUS), 2 * 6.3781e6, { rel: 1e-15, because: "one product" });
});
