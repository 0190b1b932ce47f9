import { describe, expect, test } from "vitest";
import { birchMurnaghan } from "../../src/eos/birchMurnaghan.ts";
import { constantDensity } from "../../src/eos/constantDensity.ts";
import type { EosCurve } from "../../src/eos/curve.ts";
import { findCrossing } from "../../src/eos/findCrossing.ts";
import { densityAt, phaseAt } from "../../src/eos/material.ts";
import { type PhaseSpec, stackPhases } from "../../src/eos/phaseStack.ts";
import { tabulated } from "../../src/eos/tabulated.ts";
import { thomasFermiDirac } from "../../src/eos/thomasFermiDirac.ts";
import { vinet } from "../../src/eos/vinet.ts";
import { expectClose } from "../support/expectClose.ts";
import { densityAtGPa, GPA, iceVII, ironSmith, ironTfd, ironVinet, perovskite, postPerovskiteSakai } from "./forms.ts";

const LAST = Number.POSITIVE_INFINITY;
const phase = (name: string, curve: PhaseSpec["curve"], until: PhaseSpec["until"], calibrated = LAST): PhaseSpec => ({
  name,
  form: curve === "bridge" ? "bridge" : "test",
  curve,
  until,
  calibratedTo: calibrated,
  source: { citation: "invented" },
});
const dense = (density: number): EosCurve => constantDensity({ density });

describe("where published forms meet Thomas–Fermi–Dirac [GPa]", () => {
  // Crossings and closest approaches computed for this project by an independent program; parameters as there.
  const third = (density: number, modulus: number, bulkModulusPrime: number): EosCurve =>
    birchMurnaghan({ order: 3, densityZero: density, bulkModulus: modulus * GPA, bulkModulusPrime });
  const silicate = thomasFermiDirac({ formula: "MgSiO3" });
  const water = thomasFermiDirac({ formula: "H2O" });
  test.each<[string, EosCurve, EosCurve, number, number]>([
    ["Fei et al. 2016", third(55.845e3 / 6.753, 172.7, 4.79), ironTfd, 300, 8516],
    ["Crystals 2025", third(55.845e3 / 6.756, 174.7, 4.79), ironTfd, 1374, 8151],
    ["post-perovskite of SLB 2011", third(100.387e3 / 24.419, 231.2, 4), silicate, 144, 4757],
    ["post-perovskite of Sakai et al. 2016", postPerovskiteSakai, silicate, 300, 3380],
    ["ice VII of Hemley et al. 1987", iceVII, water, 128, 10610],
    ["ice VII of Frank et al. 2004", third(18.015e3 / 12.4, 21.1, 4.4), water, 60, 4587],
  ])("%s", (_, lower, upper, from, expected) => {
    const crossing = findCrossing(lower, upper, from * GPA);
    expectClose(crossing / GPA, expected, { rel: 6e-4, because: "four digits, and curves that meet at a small angle" });
    const [below, above] = [lower, upper].map((curve) => curve.density(curve.coordinate(crossing)));
    expectClose(below, above, { rel: 1e-13, because: "bisection to the last bit of pressure" });
  });

  const refit = vinet({ densityZero: 55.845e3 / 6.753, bulkModulus: 151.6 * GPA, bulkModulusPrime: 5.845 });
  const dewaele = vinet({ densityZero: 55.845e3 / 6.765, bulkModulus: 165 * GPA, bulkModulusPrime: 4.97 });
  test.each<[string, EosCurve, EosCurve, RegExp]>([
    ["Seager et al. 2007", ironVinet, ironTfd, /0\.24\d % at 2\.[34]\d+e\+4 GPa/],
    ["perovskite of Karki et al. 2000", perovskite, silicate, /0\.63\d % at 8[56]\d\d GPa/],
    ["Smith et al. 2018", ironSmith, ironTfd, /8\.[45]\d % at/],
    ["Vinet fit of Crystals 2025", refit, ironTfd, /7\.[67]\d % at/],
    ["Dewaele et al. 2006", dewaele, ironTfd, /26\.\d % at/],
  ])("%s never does, and the closest approach is told", (_, lower, upper, closest) => {
    expect(() => findCrossing(lower, upper, 300 * GPA)).toThrowError(
      expect.objectContaining({ code: "phases-never-cross", message: expect.stringMatching(closest) }),
    );
  });

  test("a phase that is the lighter one already has nothing to come down to", () => {
    expect(() => findCrossing(dense(1000), dense(2000), GPA)).toThrowError(
      expect.objectContaining({ code: "phases-never-cross" }),
    );
  });

  test("the lowest of several crossings counts, and only beyond the data", () => {
    const wavy = tabulated(
      [0, 10, 20, 40, 60, 100].map((gpa, i) => ({
        pressure: gpa * GPA,
        density: [1000, 1300, 1310, 1320, 1950, 1960][i],
      })),
    );
    const straight = tabulated([0, 100].map((gpa) => ({ pressure: gpa * GPA, density: 1000 * 2 ** (gpa / 100) })));
    const first = findCrossing(wavy, straight, GPA);
    expect(first).toBeGreaterThan(30 * GPA);
    expect(first).toBeLessThan(45 * GPA);
    const beyond = findCrossing(wavy, straight, 65 * GPA);
    expect(beyond).toBeGreaterThan(90 * GPA);
    const specs = [phase("wavy", wavy, "crossing", 65 * GPA), phase("straight", straight, LAST)];
    expect(stackPhases("s", "S", specs).phases[0].untilPressure).toBe(beyond);
  });
});

describe("a stack of phases", () => {
  const stack = stackPhases("invented", "Invented", [
    phase("light", dense(1000), 10 * GPA, 5 * GPA),
    phase("middle", ironVinet, 1374 * GPA, 330 * GPA),
    phase("bridge", "bridge", 23770 * GPA),
    phase("top", ironTfd, LAST),
  ]);

  test("places each phase where the one before ends", () => {
    expect(stack.phases.map(({ fromPressure }) => fromPressure / GPA)).toEqual([0, 10, 1374, 23770]);
    expect(stack.phases.map(({ untilPressure }) => untilPressure / GPA)).toEqual([10, 1374, 23770, LAST]);
  });

  test("keeps where data end; a bridge has none", () => {
    expect(stack.phases.map(({ calibratedTo }) => calibratedTo / GPA)).toEqual([5, 330, 1374, LAST]);
  });

  test("phaseAt takes the denser phase on a boundary", () => {
    const nameAt = (gpa: number): string => phaseAt(stack, gpa * GPA).name;
    expect([0, 9.999, 10, 1373, 1374, 30000].map(nameAt)).toEqual([
      "light",
      "light",
      "middle",
      "middle",
      "bridge",
      "top",
    ]);
  });

  test("densityAt is the density of that phase", () => {
    expect(densityAt(stack, 5 * GPA)).toBe(1000);
    expect(densityAt(stack, 500 * GPA)).toBe(densityAtGPa(ironVinet, 500));
    expect(() => densityAt(stack, -1)).toThrowError(expect.objectContaining({ code: "eos-pressure-range" }));
  });

  test("begins where its first form does", () => {
    const late = tabulated([
      { pressure: 2 * GPA, density: 1000 },
      { pressure: 3 * GPA, density: 1100 },
    ]);
    const [only] = stackPhases("late", "Late", [phase("table", late, LAST)]).phases;
    expect(only.fromPressure).toBe(2 * GPA);
    expect(only.untilPressure).toBe(LAST);
  });

  test("crosses over where densities meet, without a step", () => {
    const ice = stackPhases("ice", "Ice", [
      phase("vii", iceVII, "crossing", 128 * GPA),
      phase("top", thomasFermiDirac({ formula: "H2O" }), LAST),
    ]);
    const boundary = ice.phases[1].fromPressure;
    expect(ice.phases[0].untilPressure).toBe(boundary);
    const below = iceVII.density(iceVII.coordinate(boundary));
    expectClose(densityAt(ice, boundary), below, { rel: 1e-13, because: "found to the last bit" });
  });
});

describe("a stack that cannot be", () => {
  test.each<[string, PhaseSpec[]]>([
    ["density-falls", [phase("heavy", dense(2000), GPA), phase("light", dense(1000), LAST)]],
    ["phase-order", [phase("a", dense(1000), 2 * GPA), phase("b", dense(1000), GPA), phase("c", dense(1000), LAST)]],
    ["phase-beyond-form", [phase("a", perovskite, 30000 * GPA), phase("b", dense(1e6), LAST)]],
    ["phase-beyond-form", [phase("a", dense(1000), 0.1 * GPA), phase("b", ironTfd, LAST)]],
    ["phases-never-cross", [phase("a", ironSmith, "crossing", 1400 * GPA), phase("b", ironTfd, LAST)]],
    ["phases-never-cross", [phase("a", iceVII, "crossing", 128 * GPA)]],
    ["bridge-ends", [phase("a", dense(1000), GPA), phase("bridge", "bridge", 2 * GPA)]],
    ["bridge-ends", [phase("bridge", "bridge", 2 * GPA), phase("a", dense(1000), LAST)]],
    [
      "bridge-ends",
      [phase("a", dense(1000), GPA), phase("bridge", "bridge", "crossing"), phase("b", dense(1000), LAST)],
    ],
    [
      "bridge-not-monotone",
      [phase("a", ironVinet, 330 * GPA), phase("bridge", "bridge", 400 * GPA), phase("b", ironTfd, LAST)],
    ],
  ])("%s, with the phase named", (code, specs) => {
    expect(() => stackPhases("bad", "Bad", specs)).toThrowError(
      expect.objectContaining({ code, message: expect.stringMatching(/^phase "/) }),
    );
  });
});
