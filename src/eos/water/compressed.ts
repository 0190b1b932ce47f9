import type { EosCurve } from "../curve.ts";

/** Density [kg m^-3] and isothermal bulk modulus [Pa] on an isothermal curve at a pressure [Pa]. */
export function compressed(curve: EosCurve, pressure: number): { density: number; bulkModulus: number } {
  const y = curve.invert(pressure);
  const slopes = new Float64Array(4);
  curve.slopes(y, slopes);
  return { density: curve.density(y), bulkModulus: slopes[0] / slopes[2] };
}
