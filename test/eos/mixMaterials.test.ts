import { describe, expect, test } from "vitest";
import { densityAt } from "../../src/eos/material.ts";
import { mixMaterials } from "../../src/eos/mixMaterials.ts";
import { stackPhases } from "../../src/eos/phaseStack.ts";
import { expectClose } from "../support/expectClose.ts";
import { earthMantle, GPA, iceVII, ironSmith, ironTfd, ironVinet, perovskite, slopesAt } from "./forms.ts";

const LAST = Number.POSITIVE_INFINITY;
const source = (citation: string) => ({ citation });

const metal = stackPhases("metal", "Metal", [
  { name: "m1", form: "vinet", curve: ironSmith, until: 1374 * GPA, calibratedTo: 1374 * GPA, source: source("A") },
  { name: "m2", form: "bridge", curve: "bridge", until: 11000 * GPA, calibratedTo: LAST, source: source("B") },
  { name: "m3", form: "thomas-fermi-dirac", curve: ironTfd, until: LAST, calibratedTo: LAST, source: source("C") },
]);
const rock = stackPhases("rock", "Rock", [
  { name: "r1", form: "birch-murnaghan", curve: iceVII, until: 23 * GPA, calibratedTo: 12 * GPA, source: source("D") },
  { name: "r2", form: "birch-murnaghan", curve: perovskite, until: LAST, calibratedTo: 260 * GPA, source: source("A") },
]);

describe("a mixture of materials", () => {
  const mixture = mixMaterials([
    { material: metal, massFraction: 0.3 },
    { material: rock, massFraction: 0.7 },
  ]);

  test("is named by its parts and has the phase boundaries of both", () => {
    expect(mixture.name).toBe("metal+rock");
    expect(mixture.title).toBe("30 % Metal + 70 % Rock");
    expect(mixture.phases.map(({ name }) => name)).toEqual(["m1+r1", "m1+r2", "m2+r2", "m3+r2"]);
    expect(mixture.phases.map(({ fromPressure }) => fromPressure / GPA)).toEqual([0, 23, 1374, 11000]);
    expect(mixture.phases.map(({ untilPressure }) => untilPressure / GPA)).toEqual([23, 1374, 11000, LAST]);
  });

  test("is calibrated where both parts are", () => {
    expect(mixture.phases.map(({ calibratedTo }) => calibratedTo / GPA)).toEqual([12, 260, 260, 260]);
  });

  test("names what it is mixed from, and its sources once", () => {
    expect(mixture.phases[0].components?.map(({ material, phase }) => `${material}/${phase.name}`)).toEqual([
      "metal/m1",
      "rock/r1",
    ]);
    expect(mixture.phases[1].source.citation).toBe("A");
    expect(mixture.phases[2].source.citation).toBe("B; A");
  });

  test("adds volumes in every phase", () => {
    for (const gpa of [0, 10, 23, 500, 1374, 5000, 20000]) {
      const pressure = gpa * GPA;
      const volume = 0.3 / densityAt(metal, pressure) + 0.7 / densityAt(rock, pressure);
      expectClose(densityAt(mixture, pressure), 1 / volume, { rel: 1e-12, because: "inversion of either part" });
    }
  });

  test("can be evaluated a little beyond its phases, as trial steps of an integrator do", () => {
    const { curve, fromPressure, untilPressure } = mixture.phases[2];
    for (const pressure of [0.99 * fromPressure, 1.01 * untilPressure]) {
      expect(slopesAt(curve, curve.invert(pressure)).every(Number.isFinite)).toBe(true);
    }
  });
});

test("a mixture of one material is that material", () => {
  expect(mixMaterials([{ material: rock, massFraction: 1 }])).toBe(rock);
});

test("a mixture with a material that begins above zero pressure begins there", () => {
  const late = stackPhases("late", "Late", [
    { name: "l", form: "thomas-fermi-dirac", curve: ironTfd, until: LAST, calibratedTo: LAST, source: source("C") },
  ]);
  const mixture = mixMaterials([
    { material: late, massFraction: 0.5 },
    { material: stackPhases("m", "M", [{ ...single, curve: earthMantle }]), massFraction: 0.5 },
  ]);
  expect(mixture.phases.map(({ fromPressure }) => fromPressure)).toEqual([ironTfd.minPressure]);
});

const single = { name: "s", form: "vinet", curve: ironVinet, until: LAST, calibratedTo: LAST, source: source("E") };
