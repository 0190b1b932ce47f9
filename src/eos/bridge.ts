import { InputError } from "../errors.ts";
import { GPA } from "../units/constants.ts";
import { CubicHermite } from "./cubicHermite.ts";
import type { EosCurve } from "./curve.ts";
import { invertIncreasing } from "./invert.ts";
import { checkDensity, checkPressure } from "./range.ts";

/**
 * Joins two curves that never meet: one cubic of ln ρ over ln P from `lower` at `fromPressure` to `upper` at
 * `untilPressure` [Pa], with the density and the slope of each at its end, so that ρ(P) is C1 throughout.
 * The coordinate is pressure [Pa].
 *
 * It claims nothing about the substance between; it is there so that a planet can be integrated across the gap.
 * Throws  InputError `bridge-not-monotone` where the ends force density to fall or the cubic to overshoot (slopes of
 *         more than three secants: Fritsch & Carlson 1980, SIAM J. Numer. Anal. 17, 238, doi:10.1137/0717021)
 * Checked test/eos/bridge.test.ts
 */
export function bridge(lower: EosCurve, upper: EosCurve, fromPressure: number, untilPressure: number): EosCurve {
  const from = logPoint(lower, fromPressure);
  const until = logPoint(upper, untilPressure);
  const secant = (until.density - from.density) / (until.pressure - from.pressure);
  const limit = 3 * secant;
  if (!(untilPressure > fromPressure && secant > 0 && from.slope <= limit && until.slope <= limit)) {
    throw new InputError(
      "bridge-not-monotone",
      `no monotone bridge leads from ${Math.exp(from.density).toPrecision(6)} kg/m3 at ${fromPressure / GPA} GPa to ` +
        `${Math.exp(until.density).toPrecision(6)} kg/m3 at ${untilPressure / GPA} GPa ` +
        `(d ln ρ/d ln P ${from.slope.toPrecision(3)} and ${until.slope.toPrecision(3)} at its ends, ` +
        `${secant.toPrecision(3)} between); let it end at a higher pressure.`,
      { column: "untilGPa", found: String(untilPressure / GPA) },
    );
  }
  const logDensity = new CubicHermite(
    [from.pressure, until.pressure],
    [from.density, until.density],
    [from.slope, until.slope],
  );
  return new BridgeCurve(logDensity, fromPressure, untilPressure);
}

/** ln P, ln ρ and d ln ρ/d ln P of a curve. */
function logPoint(curve: EosCurve, pressure: number): { pressure: number; density: number; slope: number } {
  const y = curve.coordinate(pressure);
  const slopes = new Float64Array(4);
  curve.slopes(y, slopes);
  return {
    pressure: Math.log(pressure),
    density: Math.log(curve.density(y)),
    slope: (pressure * slopes[2]) / slopes[0],
  };
}

class BridgeCurve implements EosCurve {
  readonly minPressure: number;
  readonly maxPressure: number;
  private readonly logDensity: CubicHermite;

  constructor(logDensity: CubicHermite, fromPressure: number, untilPressure: number) {
    this.logDensity = logDensity;
    this.minPressure = fromPressure;
    this.maxPressure = untilPressure;
  }

  pressure(y: number): number {
    return y;
  }

  density(y: number): number {
    return Math.exp(this.logDensity.value(Math.log(y)));
  }

  slopes(y: number, out: Float64Array): void {
    const logPressure = Math.log(y);
    out[0] = 1;
    out[1] = Math.exp(-this.logDensity.value(logPressure));
    out[2] = this.logDensity.slope(logPressure) / y;
    out[3] = 0;
  }

  coordinate(pressure: number): number {
    checkPressure("bridge", this, pressure);
    return pressure;
  }

  invert(pressure: number): number {
    return pressure;
  }

  coordinateAtDensity(density: number): number {
    const { minPressure, maxPressure, logDensity } = this;
    checkDensity("bridge", density, this.density(minPressure), this.density(maxPressure));
    const f = { value: (x: number) => logDensity.value(x), slope: (x: number) => logDensity.slope(x) };
    const low = Math.log(minPressure);
    const high = Math.log(maxPressure);
    return Math.exp(invertIncreasing(f, Math.log(density), { low, high, guess: 0.5 * (low + high) }));
  }
}
