/**
 * One phase's equation of state as a smooth curve P(y), ρ(y) over a coordinate y of the form's own choosing.
 *
 * Every form has a coordinate in which it is explicit: compression (ρ/ρ0)^(1/3) for the finite-strain forms, a power
 * of pressure for the others. The structure equations are written in y, so a planet is integrated without inverting
 * the equation of state anywhere but at layer and phase boundaries.
 *
 * Contract: y > 0 grows strictly with pressure, is finite at every pressure from `minPressure` to `maxPressure`, and
 * a relative step in it is a fair measure of error. P = 0 belongs to the range unless `minPressure` > 0.
 */
export interface EosCurve {
  /** Lowest pressure the form can be evaluated at [Pa]; 0 for most. */
  readonly minPressure: number;
  /** Pressure where the form itself breaks, e.g. turns over [Pa]; Infinity if it never does. */
  readonly maxPressure: number;
  /** Temperature [K], where the curve follows one. */
  temperature?(y: number): number;
  /** Pressure [Pa]. */
  pressure(y: number): number;
  /** Density [kg m^-3]. */
  density(y: number): number;
  /**
   * Writes four slopes at y into `out`, in this order:
   *   [0] dP/dy   [1] (dP/dy)/ρ, the slope of specific enthalpy, finite even where ρ and dP/dy vanish
   *   [2] d ln ρ/dy   [3] d ln(dP/dy)/dy   (the last two may be infinite where ρ vanishes)
   * Called at every right-hand side: allocates nothing, throws nothing.
   */
  slopes(y: number, out: Float64Array): void;
  /**
   * The y at a pressure [Pa].
   * Throws ModelRangeError `eos-pressure-range` outside [minPressure, maxPressure]; never clamps, never returns NaN.
   */
  coordinate(pressure: number): number;
  /**
   * The same without the check of range, for rounding and trial steps that end just beyond it; where no y has the
   * pressure the number returned means nothing and may be NaN.
   */
  invert(pressure: number): number;
  /** The y at a density [kg m^-3]. Throws ModelRangeError `eos-density-range` where the form has no such density. */
  coordinateAtDensity(density: number): number;
}
