/** Beyond the darkest (0) and the brightest Bond albedo known, Venus's 0.76 (from memory). */
const HIGHEST_ALBEDO = 0.8;

/** No redistribution of heat at all: f = 8/3 for the day side's effective temperature (Cowan & Agol 2011, from memory). */
const NO_REDISTRIBUTION = 8 / 3;

/** Lowest and highest ratio of an equilibrium temperature to that of a black planet with full redistribution. */
export const temperatureRange: readonly [lowest: number, highest: number] = [
  (1 - HIGHEST_ALBEDO) ** 0.25,
  NO_REDISTRIBUTION ** 0.25,
];
