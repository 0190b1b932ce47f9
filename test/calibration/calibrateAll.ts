import { mkdirSync, writeFileSync } from "node:fs";
import { csvRecord } from "../../src/cli/csv.ts";
import { calibrateFamily } from "./calibrateFamily.ts";
import { calibrationFaults } from "./calibrationFaults.ts";
import { shippedFamilies, statedPriors } from "./families.ts";
import type { FractionCalibration } from "./fractionCalibration.ts";

/** Columns of the table that is written. */
const COLUMNS = {
  family: "family",
  component: "component",
  planets: "planets",
  chi_square: "chiSquare",
  degrees_of_freedom: "degreesOfFreedom",
  uniform_p: "uniformP",
  coverage_68: "coverage68",
  coverage_95: "coverage95",
} as const satisfies Record<string, keyof FractionCalibration>;

/** Calibrates all families, prints a table and writes output/calibration.csv; returns what is wrong. */
export function calibrateAll(planets: number): string[] {
  const found: FractionCalibration[] = [];
  console.log("family               component   planets  chi-square (df)        p   in 68 %   in 95 %");
  for (const family of [...shippedFamilies, statedPriors]) {
    const calibrations = calibrateFamily(family, planets);
    for (const calibration of calibrations) console.log(line(calibration));
    found.push(...calibrations);
  }
  mkdirSync("output", { recursive: true });
  const records = found.map((calibration) => csvRecord(Object.values(COLUMNS).map((key) => String(calibration[key]))));
  writeFileSync("output/calibration.csv", csvRecord(Object.keys(COLUMNS)) + records.join(""));
  return calibrationFaults(found);
}

function line({ family, component, planets, ...found }: FractionCalibration): string {
  return [
    family.padEnd(20),
    component.padEnd(10),
    String(planets).padStart(8),
    `${found.chiSquare.toFixed(1)} (${found.degreesOfFreedom})`.padStart(16),
    found.uniformP.toPrecision(2).padStart(8),
    found.coverage68.toFixed(4).padStart(9),
    found.coverage95.toFixed(4).padStart(9),
  ].join(" ");
}
