import { fluidLimits } from "./fluidDensity.ts";
import { CRITICAL_PRESSURE, CRITICAL_TEMPERATURE } from "./iapws95Coefficients.ts";
import {
  meltingPressureIh,
  meltingPressureIII,
  meltingPressureV,
  meltingPressureVI,
  meltingPressureVII,
  sublimationPressure,
} from "./meltingCurves.ts";
import { saturation } from "./saturation.ts";

export type WaterPhaseName =
  | "vapour"
  | "liquid"
  | "supercritical"
  | "ice-Ih"
  | "ice-II"
  | "ice-III"
  | "ice-V"
  | "ice-VI"
  | "ice-VII";

/** The pressure [Pa] at which `below` turns into `above`, as a function of temperature in [coldest, warmest) [K]. */
export interface WaterBoundary {
  readonly below: WaterPhaseName;
  readonly above: WaterPhaseName;
  readonly coldest: number;
  readonly warmest: number;
  pressure(temperature: number): number;
}

interface Point {
  readonly temperature: number;
  readonly pressure: number;
}
const point = (temperature: number, pressureMPa: number): Point => ({ temperature, pressure: pressureMPa * 1e6 });

/**
 * Triple points. Those with liquid: IAPWS R14-08(2011), Table 1. Ih-II-III and II-III-V: Bridgman 1912, Proc. Am. Acad.
 * 47, 441 (from memory). II-V-VI, and the places of the two cold lines at 130 K: reviews of the phase diagram (from
 * memory, about 5 K and 50 MPa). VI-VII-VIII: Pistorius et al. 1968, J. Chem. Phys. 48, 5509 (from memory).
 */
export const triplePoints = {
  solidLiquidGas: point(273.16, 611.657e-6),
  IhIIILiquid: point(251.165, 208.566),
  IIIVLiquid: point(256.164, 350.1),
  VVILiquid: point(273.31, 632.4),
  VIVIILiquid: point(355, 2216),
  IhIIIII: point(238.55, 212.9),
  IIIIIV: point(248.85, 344),
  IIVVI: point(218, 620),
  VIVIIVIII: point(278, 2100),
} as const;

/** Where the sublimation equation ends [K]. */
export const COLDEST = 50;
/** Ih-II: slope 0.81 MPa/K (entropy -3.2 J/mol/K over volume -3.9 cm^3/mol, Eisenberg & Kauzmann 1969, from memory). */
const COLD_Ih_II = point(COLDEST, 212.9 - 0.81 * (238.55 - COLDEST));
/** II-VI and VI-VIII: straight from the triple point through 130 K. */
const COLD_II_VI = point(COLDEST, 800 + ((130 - COLDEST) * (800 - 620)) / (218 - 130));
const COLD_VI_VII = point(COLDEST, 1500 - ((130 - COLDEST) * (2100 - 1500)) / (278 - 130));

function curve(
  below: WaterPhaseName,
  above: WaterPhaseName,
  coldest: number,
  warmest: number,
  pressure: (temperature: number) => number,
): WaterBoundary {
  return { below, above, coldest, warmest, pressure };
}

/** Solid-solid lines are straight between triple points, as measured ones nearly are. */
function line(below: WaterPhaseName, above: WaterPhaseName, cold: Point, warm: Point): WaterBoundary {
  const slope = (warm.pressure - cold.pressure) / (warm.temperature - cold.temperature);
  return curve(below, above, cold.temperature, warm.temperature, (t) => cold.pressure + slope * (t - cold.temperature));
}

const t = triplePoints;
const hottest = fluidLimits.maxTemperature;

/** Every boundary once. At any temperature a phase has at most one upper boundary, so the phases form a chain. */
export const waterBoundaries: readonly WaterBoundary[] = [
  curve("vapour", "ice-Ih", COLDEST, t.solidLiquidGas.temperature, sublimationPressure),
  curve("vapour", "liquid", t.solidLiquidGas.temperature, CRITICAL_TEMPERATURE, (T) => saturation(T).pressure),
  curve("vapour", "supercritical", CRITICAL_TEMPERATURE, hottest, () => CRITICAL_PRESSURE),
  curve("ice-Ih", "liquid", t.IhIIILiquid.temperature, t.solidLiquidGas.temperature, meltingPressureIh),
  curve("liquid", "ice-III", t.IhIIILiquid.temperature, t.IIIVLiquid.temperature, meltingPressureIII),
  curve("liquid", "ice-V", t.IIIVLiquid.temperature, t.VVILiquid.temperature, meltingPressureV),
  curve("liquid", "ice-VI", t.VVILiquid.temperature, t.VIVIILiquid.temperature, meltingPressureVI),
  curve("liquid", "ice-VII", t.VIVIILiquid.temperature, CRITICAL_TEMPERATURE, meltingPressureVII),
  curve("supercritical", "ice-VII", CRITICAL_TEMPERATURE, hottest, hotMeltingPressure),
  line("ice-Ih", "ice-II", COLD_Ih_II, t.IhIIIII),
  line("ice-Ih", "ice-III", t.IhIIIII, t.IhIIILiquid),
  line("ice-III", "ice-II", t.IhIIIII, t.IIIIIV),
  line("ice-II", "ice-V", t.IIVVI, t.IIIIIV),
  line("ice-III", "ice-V", t.IIIIIV, t.IIIVLiquid),
  line("ice-II", "ice-VI", COLD_II_VI, t.IIVVI),
  line("ice-V", "ice-VI", t.IIVVI, t.VVILiquid),
  line("ice-VI", "ice-VII", COLD_VI_VII, t.VIVIIVIII),
  line("ice-VI", "ice-VII", t.VIVIIVIII, t.VIVIILiquid),
];

const MELTING_END = 715;
const FRANK_PRESSURE = 1.253e9;

/**
 * Melting of ice VII where R14-08 ends: the Simon curve of Frank, Fei & Hu 2004 (from memory), P = a + 1.253 GPa
 * (T/355 K)^3, shifted to join at 715 K and 20.6 GPa. Published curves differ by 20 % in temperature there.
 */
function hotMeltingPressure(temperature: number): number {
  if (temperature <= MELTING_END) return meltingPressureVII(temperature);
  const beyond = (temperature / 355) ** 3 - (MELTING_END / 355) ** 3;
  return meltingPressureVII(MELTING_END) + FRANK_PRESSURE * beyond;
}
