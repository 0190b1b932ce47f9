import { birchMurnaghan } from "../../src/eos/birchMurnaghan.ts";
import { altshulerGruneisen, finiteStrainGruneisen, powerLawGruneisen } from "../../src/eos/thermal/gruneisenLaw.ts";
import { IsothermBasedEos } from "../../src/eos/thermal/isothermBasedEos.ts";
import { liquidMetal } from "../../src/eos/thermal/liquidMetal.ts";
import { debyeTerm, quadraticTerm } from "../../src/eos/thermal/thermalTerm.ts";
import { vinet } from "../../src/eos/vinet.ts";
import { constants, GPA } from "../../src/units/constants.ts";

const R = constants.gasConstant.value;
const IRON_MASS = 0.055845;

/** Magnesium silicates of Stixrude & Lithgow-Bertelloni 2011 (Geophys. J. Int. 184, 1180, Table A1). */
function silicate(v0: number, molarMass: number, atoms: number, k0: number, k0p: number, thermal: number[]) {
  const densityZero = molarMass / v0;
  const [debyeTemperature, gammaZero, qZero] = thermal;
  const law = finiteStrainGruneisen(gammaZero, qZero);
  return new IsothermBasedEos(
    birchMurnaghan({ order: 3, densityZero, bulkModulus: k0 * GPA, bulkModulusPrime: k0p }),
    300,
    [debyeTerm({ densityZero, gasConstant: (atoms * R) / molarMass, debyeTemperature, law })],
  );
}

export const forsterite = silicate(43.603e-6, 0.140691, 7, 127.9555, 4.21796, [809.1703, 0.99282, 2.10672]);
export const bridgmanite = silicate(24.445e-6, 0.100387, 5, 250.5264, 4.14, [905.9412, 1.56508, 1.10945]);

const feiDensity = IRON_MASS / 6.753e-6;
/** Fei et al. 2016, Geophys. Res. Lett. 43, 6837; K0, K0' from the abstract, the rest from memory. */
export const ironFei = new IsothermBasedEos(
  birchMurnaghan({ order: 3, densityZero: feiDensity, bulkModulus: 172.7 * GPA, bulkModulusPrime: 4.79 }),
  300,
  [
    debyeTerm({
      densityZero: feiDensity,
      gasConstant: R / IRON_MASS,
      debyeTemperature: 422,
      law: powerLawGruneisen(1.74, 0.78),
    }),
    quadraticTerm({ densityZero: feiDensity, coefficient: 0.07, exponent: 1.34 }),
  ],
);

const dewaeleDensity = IRON_MASS / 6.765e-6;
/** Dewaele et al. 2006, Phys. Rev. Lett. 97, 215504, from memory. */
export const ironDewaele = new IsothermBasedEos(
  vinet({ densityZero: dewaeleDensity, bulkModulus: 165 * GPA, bulkModulusPrime: 4.97 }),
  300,
  [
    debyeTerm({
      densityZero: dewaeleDensity,
      gasConstant: R / IRON_MASS,
      debyeTemperature: 417,
      law: altshulerGruneisen(1.875, 1.305, 3.289),
    }),
    quadraticTerm({ densityZero: dewaeleDensity, coefficient: (3 * R * 3.7e-5) / IRON_MASS, exponent: 1.87 }),
    quadraticTerm({ densityZero: dewaeleDensity, coefficient: (3 * R * 1.95e-4) / IRON_MASS, exponent: 1.339 }),
  ],
);

/**
 * Liquid iron. γ' is -0.13 kg/MJ and K_S'' -0.043 / GPa in the paper's abstract. c_V is that of the liquid at 1 bar and
 * 1811 K, from γ = α K_S/(ρ c_P) with α = 9.2e-5 / K of the same paper (from memory): c_P = 829, c_V = 643 J/(kg K).
 * Source  Anderson & Ahrens 1994, J. Geophys. Res. 99, 4273, doi:10.1029/93JB03158
 * Range   data to about 1000 GPa; the form turns over where `maxPressure` says
 */
export const liquidIron = liquidMetal({
  densityZero: 7019,
  temperatureZero: 1811,
  bulkModulus: 109.7e9,
  bulkModulusPrime: 4.66,
  bulkModulusSecond: -0.043e-9,
  gammaZero: 1.735,
  gammaPerEnergy: -0.13e-6,
  gammaExponent: -1.87,
  heatCapacity: 643,
});
