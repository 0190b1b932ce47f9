import type { LibraryFile } from "../../src/library/libraryFiles.ts";

/** Library files of warm materials, for tests. Parameters from the papers named, as the shipped files have them. */
const file = (path: string, content: unknown): LibraryFile => ({ path, text: JSON.stringify(content) });

/** Fei et al. 2016, Geophys. Res. Lett. 43, 6837. */
export const hcpIron = {
  phase: "hcp",
  eos: {
    form: "birch-murnaghan",
    order: 3,
    densityZeroKgM3: 8269.66,
    bulkModulusGPa: 172.7,
    bulkModulusPrime: 4.79,
  },
  thermal: {
    reference: "isotherm",
    temperatureK: 300,
    formula: "Fe",
    debyeTemperatureK: 422,
    gruneisen: { law: "power", gammaZero: 1.74, q: 0.78 },
    electronic: { coefficientJKgK2: 0.07, exponent: 1.34 },
  },
  calibratedToGPa: 300,
  source: { citation: "Fei et al. 2016" },
};

/** Anderson & Ahrens 1994, J. Geophys. Res. 99, 4273. */
export const liquidIron = {
  phase: "liquid",
  eos: {
    form: "birch-murnaghan",
    order: 4,
    densityZeroKgM3: 7019,
    bulkModulusGPa: 109.7,
    bulkModulusPrime: 4.66,
    bulkModulusSecondPerGPa: -0.043,
  },
  thermal: {
    reference: "isentrope",
    temperatureZeroK: 1811,
    gammaZero: 1.735,
    gammaPerEnergyKgJ: -1.3e-7,
    gammaExponent: -1.87,
    heatCapacityJKgK: 643,
  },
  calibratedToGPa: 1000,
  source: { citation: "Anderson & Ahrens 1994" },
};

/** MgSiO3 of Stixrude & Lithgow-Bertelloni 2011, Geophys. J. Int. 184, 1180. */
export const bridgmanite = {
  phase: "bridgmanite",
  eos: {
    form: "birch-murnaghan",
    order: 3,
    densityZeroKgM3: 4106.65,
    bulkModulusGPa: 250.5264,
    bulkModulusPrime: 4.14,
  },
  thermal: {
    reference: "isotherm",
    temperatureK: 300,
    formula: "MgSiO3",
    debyeTemperatureK: 905.9412,
    gruneisen: { law: "finite-strain", gammaZero: 1.56508, qZero: 1.10945 },
  },
  calibratedToGPa: 108,
  source: { citation: "Stixrude & Lithgow-Bertelloni 2011" },
};

/** The same phase at room temperature only. */
export const cold = ({ thermal: _, ...phase }: { thermal: unknown }): object => phase;

export const materialOf = (name: string, ...phases: unknown[]): LibraryFile =>
  file(`mine/materials/${name}.json`, { material: name, title: name, phases });

export const mantleOf = (name: string, magnesiumToSilicon: number, ironNumber: number): LibraryFile =>
  file(`mine/materials/${name}.json`, { material: name, title: name, mantle: { magnesiumToSilicon, ironNumber } });

export const waterOf = (name: string): LibraryFile =>
  file(`mine/materials/${name}.json`, { material: name, title: name, water: true });

export const compositionOf = (name: string, layers: unknown, rest: object = {}): LibraryFile =>
  file(`mine/${name}.json`, { composition: name, title: name, layers, ...rest });
