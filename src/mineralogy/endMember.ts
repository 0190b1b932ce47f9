import { birchMurnaghan } from "../eos/birchMurnaghan.ts";
import type { Source } from "../eos/material.ts";
import { finiteStrainGruneisen, type GruneisenLaw } from "../eos/thermal/gruneisenLaw.ts";
import { IsothermBasedEos } from "../eos/thermal/isothermBasedEos.ts";
import { debyeTerm } from "../eos/thermal/thermalTerm.ts";
import { constants, GPA } from "../units/constants.ts";
import { atomTotal, molarMass } from "./formula.ts";

/** Pure mineral of a solid solution, at 300 K and zero pressure, in the units it is published in. */
export interface EndMember {
  readonly name: string;
  /** Formula unit that the volume belongs to. */
  readonly formula: string;
  readonly volumeCm3PerMol: number;
  readonly bulkModulusGPa: number;
  readonly bulkModulusPrime: number;
  readonly debyeTemperatureK: number;
  readonly gammaZero: number;
  readonly qZero: number;
  readonly source: Source;
}

export const REFERENCE_TEMPERATURE = 300;

/**
 * Third-order Birch–Murnaghan isotherm with Debye vibrations whose θ follows finite strain, as the parameters were
 * fitted.
 * Source  Stixrude & Lithgow-Bertelloni 2011, Geophys. J. Int. 184, 1180
 * Checked test/mineralogy/endMember.test.ts
 */
export function endMemberEos(member: EndMember): IsothermBasedEos {
  const { debyeTemperatureK, gammaZero, qZero } = member;
  return debyeSolid(member, debyeTemperatureK, finiteStrainGruneisen(gammaZero, qZero));
}

/** Third-order Birch–Murnaghan isotherm at 300 K with Debye vibrations that follow the given law. */
export function debyeSolid(
  solid: Pick<EndMember, "formula" | "volumeCm3PerMol" | "bulkModulusGPa" | "bulkModulusPrime">,
  debyeTemperature: number,
  law: GruneisenLaw,
): IsothermBasedEos {
  const mass = molarMass(solid.formula);
  const densityZero = mass / (solid.volumeCm3PerMol * 1e-6);
  const cold = birchMurnaghan({
    order: 3,
    densityZero,
    bulkModulus: solid.bulkModulusGPa * GPA,
    bulkModulusPrime: solid.bulkModulusPrime,
  });
  const gasConstant = (atomTotal(solid.formula) * constants.gasConstant.value) / mass;
  const vibrations = debyeTerm({ densityZero, gasConstant, debyeTemperature, law });
  return new IsothermBasedEos(cold, REFERENCE_TEMPERATURE, [vibrations]);
}
