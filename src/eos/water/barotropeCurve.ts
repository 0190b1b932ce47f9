import { invertIncreasing } from "../invert.ts";
import { checkDensity, checkPressure } from "../range.ts";
import type { WarmCurve } from "../thermal/warmCurve.ts";
import type { BarotropePiece } from "./barotropePiece.ts";

/**
 * Density along consecutive pieces as an equation of state, in the coordinate y = P + shift [Pa]. The state functions are
 * not called again: a right-hand side costs one logarithm, one exponential and two short series.
 * Beyond its ends the curve goes on with its last slope, so that a trial step past a boundary stays finite.
 * Checked error and slopes against the state functions: test/eos/water/barotrope.test.ts
 */
export function barotropeCurve(
  pieces: readonly BarotropePiece[],
  shift: number,
  minPressure: number,
  maxPressure: number,
): WarmCurve {
  const lowest = pieces[0].from;
  const highest = pieces[pieces.length - 1].until;

  const within = (x: number): number => Math.min(Math.max(x, lowest), highest);
  const pieceAt = (x: number): BarotropePiece => {
    let i = 0;
    while (i < pieces.length - 1 && x > pieces[i].until) i++;
    return pieces[i];
  };
  const logDensity = (x: number): number => {
    const inside = within(x);
    const polynomial = pieceAt(inside).logDensity;
    const value = polynomial.value(inside);
    return x === inside ? value : value + polynomial.slope(inside) * (x - inside);
  };
  const logDensitySlope = (x: number): number => {
    const inside = within(x);
    return pieceAt(inside).logDensity.slope(inside);
  };

  const curve: WarmCurve = {
    minPressure,
    maxPressure,
    pressure: (y) => y - shift,
    density: (y) => Math.exp(logDensity(Math.log(y))),
    temperature(y) {
      const inside = within(Math.log(y));
      return pieceAt(inside).temperature.value(inside);
    },
    slopes(y, out) {
      const x = Math.log(y);
      out[0] = 1;
      out[1] = Math.exp(-logDensity(x));
      out[2] = logDensitySlope(x) / y;
      out[3] = 0;
    },
    coordinate(pressure) {
      checkPressure("water", curve, pressure);
      return pressure + shift;
    },
    invert: (pressure) => pressure + shift,
    coordinateAtDensity(density) {
      const [low, high] = [minPressure + shift, maxPressure + shift];
      checkDensity("water", density, curve.density(low), curve.density(high));
      const f = {
        value: (y: number) => logDensity(Math.log(y)),
        slope: (y: number) => logDensitySlope(Math.log(y)) / y,
      };
      return invertIncreasing(f, Math.log(density), { low, high, guess: 0.5 * (low + high) });
    },
  };
  return curve;
}
