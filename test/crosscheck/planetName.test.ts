import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { foldCase, hostKey, nameKey } from "../../src/crosscheck/planetName.ts";

describe("nameKey", () => {
  test.each([
    ["Ostara-7b", "Ostara 7 b"],
    ["Ostara_007_b", "Ostara 7 b"],
    ["  Ostara \u00a0 7  b ", "Ostara 7 b"],
    ["OSTARA–7 b", "OSTARA 7 b"],
    ["Ostara&nbsp;7&#32;b", "Ostara 7 b"],
    ["&alpha; Vel b", "alpha Vel b"],
    ["α Vel b", "alpha Vel b"],
    ["alf Vel b", "alpha Vel b"],
    ["µ Vel b", "mu Vel b"],
    ["Mirel's Star b", "Mirels Star b"],
    ["Mirel&#x2019;s Star b", "Mirels Star b"],
    ["Vesta (AB) b", "Vesta AB b"],
    ["QX-12.01", "QX 12.01"],
    ["", ""],
    [" - ", ""],
    ["&#99999999999;", "99999999999"],
  ])("%j is %j", (name, key) => {
    expect(nameKey(name)).toBe(key);
  });

  test.each([
    ["Ostara 7 b", "Ostara 7 B"],
    ["Ostara 7 b", "Ostara 7 c"],
    ["Ostara 7 b", "Ostara 70 b"],
    ["QX+08 12 b", "QX-08 12 b"],
    ["Q2-18 b", "Q21-8 b"],
    ["QX 12.01", "QX 12.02"],
  ])("keeps %j and %j apart", (a, b) => {
    expect(nameKey(a)).not.toBe(nameKey(b));
  });

  test("of a key is the key itself, whatever the name", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary" }), (name) => {
        expect(nameKey(nameKey(name))).toBe(nameKey(name));
      }),
      { seed: 4, numRuns: 1000 },
    );
  });
});

test("foldCase ignores case", () => {
  expect(foldCase(nameKey("OSTARA-7 B"))).toBe(foldCase(nameKey("Ostara 7b")));
});

test.each([
  ["Ostara 7 b", "Ostara 7"],
  ["Ostara 7 B b", "Ostara 7 B"],
  ["Ostara 7", undefined],
  ["Ostara 7 B", undefined],
])("host of %j is %j", (key, host) => {
  expect(hostKey(key)).toBe(host);
});
