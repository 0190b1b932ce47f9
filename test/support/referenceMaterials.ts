import { birchMurnaghan } from "../../src/eos/birchMurnaghan.ts";
import { constantDensity } from "../../src/eos/constantDensity.ts";
import type { EosCurve } from "../../src/eos/curve.ts";
import type { Phase } from "../../src/eos/material.ts";
import { modifiedPolytrope } from "../../src/eos/modifiedPolytrope.ts";
import { vinet } from "../../src/eos/vinet.ts";
import type { Composition, Layer } from "../../src/library/composition.ts";
import { GPA } from "../../src/units/constants.ts";

export const vinetOf = (densityZero: number, kGPa: number, kPrime: number): EosCurve =>
  vinet({ densityZero, bulkModulus: kGPa * GPA, bulkModulusPrime: kPrime });

export const birchOf = (densityZero: number, kGPa: number, kPrime: number): EosCurve =>
  birchMurnaghan({ order: 3, densityZero, bulkModulus: kGPa * GPA, bulkModulusPrime: kPrime });

export const polytropeOf = (densityZero: number, coefficient: number, exponent: number): EosCurve =>
  modifiedPolytrope({ densityZero, coefficient, exponent });

/** The classical polytrope P = K ρ^(1 + 1/index). */
export const classicalPolytrope = (index: number, K: number): EosCurve =>
  polytropeOf(0, K ** (-index / (index + 1)), index / (index + 1));

/** A stack of curves with the pressures [GPa] between them. */
export function stack(...parts: (EosCurve | number)[]): Phase[] {
  const curves = parts.filter((part) => typeof part !== "number");
  const limits = [0, ...parts.filter((part) => typeof part === "number"), Number.POSITIVE_INFINITY];
  return curves.map((curve, i) => ({
    name: `phase-${i + 1}`,
    form: "test",
    curve,
    fromPressure: limits[i] * GPA,
    untilPressure: limits[i + 1] * GPA,
    calibratedTo: Number.POSITIVE_INFINITY,
    source: { citation: "test" },
  }));
}

const perovskite = birchMurnaghan({
  order: 4,
  densityZero: 4100,
  bulkModulus: 247 * GPA,
  bulkModulusPrime: 3.97,
  bulkModulusSecond: -0.016 / GPA,
});

/** The materials of test/fixtures/interior/structure-reference.csv. */
export const referenceMaterials: Record<string, Phase[]> = {
  "fe-vinet": stack(vinetOf(8300, 156.2, 6.08)),
  "fe-bm3": stack(birchOf(7050, 201, 4)),
  "mantle-bm3": stack(birchOf(3980, 206, 4)),
  "pv-bm4": stack(perovskite),
  "ice-bm3": stack(birchOf(1460, 23.7, 4.15)),
  "silicate-3phase": stack(birchOf(3220, 125, 5), 23, perovskite, 125, vinetOf(4260, 203, 5.35)),
  "fe-poly": stack(polytropeOf(8300, 0.00349, 0.528)),
  "sil-poly": stack(polytropeOf(4100, 0.00161, 0.541)),
  "h2o-poly": stack(polytropeOf(1460, 0.00311, 0.513)),
};

export const uniform = (density: number): Phase[] => stack(constantDensity({ density }));

export function layer(name: string, phases: readonly Phase[], massFraction: number): Layer {
  return { name, massFraction, material: { name, title: name, phases } };
}

/** A composition of `[material, fraction]` pairs, centre to surface; materials by reference name or as phases. */
export function planetOf(layers: [string | readonly Phase[], number][], pressurePa = 0): Composition {
  return {
    name: "test-planet",
    title: "test planet",
    surface: { pressurePa, temperatureK: 300 },
    layers: layers.map(([material, massFraction], i) =>
      typeof material === "string"
        ? layer(material, referenceMaterials[material], massFraction)
        : layer(`layer-${i + 1}`, material, massFraction),
    ),
  };
}
