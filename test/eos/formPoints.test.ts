import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { type BirchMurnaghanParameters, birchMurnaghan } from "../../src/eos/birchMurnaghan.ts";
import type { EosCurve } from "../../src/eos/curve.ts";
import type { FiniteStrainParameters } from "../../src/eos/finiteStrain.ts";
import { type HolzapfelParameters, holzapfel } from "../../src/eos/holzapfel.ts";
import { type KeaneParameters, keane } from "../../src/eos/keane.ts";
import { thomasFermiDirac } from "../../src/eos/thomasFermiDirac.ts";
import { vinet } from "../../src/eos/vinet.ts";
import { expectClose } from "../support/expectClose.ts";
import { densityAtGPa, GPA, slopesAt } from "./forms.ts";

/** Points at 50 digits from the textbook formulas: test/fixtures/eos/makeFormPoints.py. */
interface Case {
  readonly form: string;
  readonly parameters: Readonly<Record<string, number>>;
  readonly points: readonly { pressureGPa: number; densityKgM3: string; logSlope: string }[];
}

const cases: Case[] = JSON.parse(readFileSync("test/fixtures/eos/formPoints.json", "utf8"));

const makers: Readonly<Record<string, (parameters: unknown) => EosCurve>> = {
  vinet: (parameters) => vinet(parameters as FiniteStrainParameters),
  "birch-murnaghan": (parameters) => birchMurnaghan(parameters as BirchMurnaghanParameters),
  holzapfel: (parameters) => holzapfel(parameters as HolzapfelParameters),
  keane: (parameters) => keane(parameters as KeaneParameters),
  "thomas-fermi-dirac": (parameters) => thomasFermiDirac(parameters as { formula: string }),
};

describe.each(cases)("$form $parameters", ({ form, parameters, points }) => {
  const curve = makers[form](parameters);

  test.each(points)("density at $pressureGPa GPa", ({ pressureGPa, densityKgM3 }) => {
    const because = "required of every form; the reference has 20 digits";
    expectClose(densityAtGPa(curve, pressureGPa), Number(densityKgM3), { rel: 1e-12, because });
  });

  test.each(points)("compressibility at $pressureGPa GPa", ({ pressureGPa, logSlope }) => {
    const pressure = pressureGPa * GPA;
    const [slope, , logDensitySlope] = slopesAt(curve, curve.coordinate(pressure));
    const because = "rounding of the coordinate, amplified where the slope is small against its terms";
    expectClose((pressure * logDensitySlope) / slope, Number(logSlope), { rel: 1e-9, because });
  });
});

test("all cases are there", () => {
  expect(cases.map(({ form }) => form)).toHaveLength(10);
});
