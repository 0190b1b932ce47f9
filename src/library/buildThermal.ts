import type { EosCurve } from "../eos/curve.ts";
import { meltingCurves } from "../eos/melting/meltingCurves.ts";
import { type MeltingCurve, meltingDepression, meltingPressure } from "../eos/melting/meltingTemperature.ts";
import {
  altshulerGruneisen,
  finiteStrainGruneisen,
  type GruneisenLaw,
  powerLawGruneisen,
} from "../eos/thermal/gruneisenLaw.ts";
import { IsothermBasedEos } from "../eos/thermal/isothermBasedEos.ts";
import { liquidMetal } from "../eos/thermal/liquidMetal.ts";
import type { ThermalEos } from "../eos/thermal/thermalState.ts";
import { debyeTerm, quadraticTerm } from "../eos/thermal/thermalTerm.ts";
import { InputError } from "../errors.ts";
import { coreAlloyEos } from "../mineralogy/coreAlloy.ts";
import { atomTotal, molarMass } from "../mineralogy/formula.ts";
import { constants, GPA } from "../units/constants.ts";
import type { EosKeys } from "./forms.ts";
import type { AlloyKeys, FreezingKeys, GruneisenKeys, ThermalKeys } from "./thermalSchemas.ts";

/** The equation of state with temperature of a phase: its reference curve and its thermal keys. */
export function buildThermalEos(reference: EosCurve, eos: EosKeys, keys: ThermalKeys): ThermalEos {
  return keys.reference === "isotherm" ? onIsotherm(reference, keys) : onIsentrope(eos, keys);
}

function onIsentrope(eos: EosKeys, keys: Extract<ThermalKeys, { reference: "isentrope" }>): ThermalEos {
  if (eos.form !== "birch-murnaghan" || eos.order !== 4) {
    throw new InputError(
      "thermal-isentrope",
      `the isentrope of a liquid metal is a Birch–Murnaghan form of order 4; this phase has the form ${eos.form}.`,
      { column: "form", found: eos.form },
    );
  }
  return liquidMetal({
    densityZero: eos.densityZeroKgM3,
    temperatureZero: keys.temperatureZeroK,
    bulkModulus: eos.bulkModulusGPa * GPA,
    bulkModulusPrime: eos.bulkModulusPrime,
    bulkModulusSecond: eos.bulkModulusSecondPerGPa / GPA,
    gammaZero: keys.gammaZero,
    gammaPerEnergy: keys.gammaPerEnergyKgJ,
    gammaExponent: keys.gammaExponent,
    heatCapacity: keys.heatCapacityJKgK,
  });
}

function onIsotherm(cold: EosCurve, keys: Extract<ThermalKeys, { reference: "isotherm" }>): ThermalEos {
  const { formula, debyeTemperatureK, gruneisen, anharmonic, electronic, temperatureK } = keys;
  const densityZero = cold.density(cold.coordinate(0));
  const gasConstant = (atomTotal(formula) * constants.gasConstant.value) / molarMass(formula);
  const quadratic = [anharmonic, electronic].filter((term) => term !== undefined);
  return new IsothermBasedEos(cold, temperatureK, [
    debyeTerm({ densityZero, gasConstant, debyeTemperature: debyeTemperatureK, law: gruneisenLaw(gruneisen) }),
    ...quadratic.map(({ coefficientJKgK2, exponent }) =>
      quadraticTerm({ densityZero, coefficient: coefficientJKgK2, exponent }),
    ),
  ]);
}

function gruneisenLaw(keys: GruneisenKeys): GruneisenLaw {
  switch (keys.law) {
    case "finite-strain":
      return finiteStrainGruneisen(keys.gammaZero, keys.qZero);
    case "power":
      return powerLawGruneisen(keys.gammaZero, keys.q);
    case "altshuler":
      return altshulerGruneisen(keys.gammaZero, keys.gammaInfinity, keys.beta);
  }
}

/** A metal with what is dissolved in it. */
export function alloyed(iron: ThermalEos, keys: AlloyKeys): ThermalEos {
  if ("densityDeficit" in keys) {
    const { densityDeficit: deficit, derivedFromPrem } = keys;
    return coreAlloyEos(iron, { kind: "density-deficit", deficit, derivedFromPrem });
  }
  const { nickel = 0, sulphur = 0, silicon = 0, oxygen = 0 } = keys;
  return coreAlloyEos(iron, { kind: "elements", nickel, sulphur, silicon, oxygen });
}

const curvesByName: Readonly<Record<string, MeltingCurve>> = Object.fromEntries(
  Object.values(meltingCurves).map((curve) => [curve.name, curve]),
);

/** Pressure [Pa] at which a liquid freezes, as a function of temperature [K]. */
export function freezingPressure({ curve, ironMoleFraction = 1 }: FreezingKeys): (temperature: number) => number {
  const melting = curvesByName[curve];
  const depression = meltingDepression(ironMoleFraction);
  return (temperature) => meltingPressure(melting, temperature / depression);
}
