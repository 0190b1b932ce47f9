import { readFileSync } from "node:fs";
import type { DensityTable } from "../../src/interior/densityTable.ts";

/** Dziewonski & Anderson 1981, Phys. Earth Planet. Inter. 25, 297, Table I. */
export const prem = JSON.parse(readFileSync(new URL("../fixtures/interior/prem.json", import.meta.url), "utf8"));

/** The polynomials of PREM sampled every `stepKm`, both sides of every discontinuity. */
export function samplePrem(stepKm: number): DensityTable {
  const radius: number[] = [];
  const density: number[] = [];
  for (const [, bottom, top, coefficients] of prem.layers as [string, number, number, number[]][]) {
    const count = Math.ceil((top - bottom) / stepKm);
    for (let i = 0; i <= count; i++) {
      const km = bottom + ((top - bottom) * i) / count;
      radius.push(km * 1e3);
      density.push(1e3 * coefficients.reduce((sum, c, k) => sum + c * (km / prem.radiusKm) ** k, 0));
    }
  }
  return { radius, density };
}
