import { describe, expect, test } from "vitest";
import { rules } from "../../../src/crosscheck/rules.ts";
import { runRules } from "../../../src/crosscheck/runRules.ts";
import { EARTH_MASS, EARTH_RADIUS } from "../../../src/units/constants.ts";
import { listCases } from "./listCases.ts";
import { physicsCases } from "./physicsCases.ts";
import { relationCases } from "./relationCases.ts";

/** Roughly the pure iron of Seager et al. 2007 (from memory). */
const ironRadius = (mass: number) => 0.77 * EARTH_RADIUS * (mass / EARTH_MASS) ** 0.27;

const cases = [...relationCases, ...physicsCases, ...listCases];

describe("the list of rules", () => {
  test("has no id twice and a case for every rule", () => {
    const ids = rules.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(cases.map(({ rule }) => rule).sort()).toEqual([...ids].sort());
  });

  test("states claim, formula and source of every rule", () => {
    for (const { id, claim, formula, source } of rules) {
      expect([id, claim, formula, source].every((text) => text.trim() !== "")).toBe(true);
      expect(id).toMatch(/^[a-z]+(-[a-z]+)*$/);
    }
  });
});

describe.each(cases)("$rule", ({ rule: id, fires, silent }) => {
  const rule = rules.filter((candidate) => candidate.id === id);

  test.each(fires)("fires: $why", ({ rows, severity }) => {
    const found = runRules(rows, { ironRadius }, rule).find(({ row }) => row === rows[0]);
    expect(found?.severity).toBe(severity);
    expect(found?.explanation).not.toBe("");
    expect(found?.remedy).not.toBe("");
  });

  test.each(silent)("silent: $why", ({ rows }) => {
    expect(runRules(rows, { ironRadius }, rule)).toEqual([]);
  });
});
