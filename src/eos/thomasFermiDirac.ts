import type { EosCurve } from "./curve.ts";
import { parseFormula } from "./elements.ts";
import { invertIncreasing } from "./invert.ts";
import { checkDensity, checkPressure } from "./range.ts";
import { type ElementFit, fitElement } from "./salpeterZapolskyFit.ts";

/** Pressure at which ζ = Z^(-2/3): 9.524e13 dyn/cm² [Pa]. */
const PRESSURE_UNIT = 9.524e12;

/**
 * ρ x0³ / (A Z): 3.886 g/cm³ as published [kg m^-3]. It holds the mass of hydrogen; with the modern atomic mass unit it
 * would be 3.855. Copies with 3.866 circulate: a misprint.
 */
const DENSITY_UNIT = 3886;

/**
 * Thomas–Fermi–Dirac equation of state of cold matter, with the correlation energy of the paper. For each element, with
 * ζ = (P / 9.524e12 Pa)^(1/5) Z^(-2/3):
 *   ρ = 3.886 g/cm³ · A Z / x0(ζ)³,   x0 = [1 + exp(-α ζ) Σ β_k ζ^k] / (ζ + φ)
 * Volumes of the elements of a compound add. The coordinate is y = (P / 9.524e12 Pa)^(1/5), in which density is smooth.
 * Source  Salpeter & Zapolsky 1967, Phys. Rev. 158, 876, eqs 43 and 45 and table 1, doi:10.1103/PhysRev.158.876
 *         (from transcriptions, checked against a direct solution of the TFD equation)
 * Valid   P >= `minPressure`, 0.24 GPa or less, below which the fit's density falls with pressure; within about 2 % of the
 *         exact TFD density from 1e4 to 1e7 GPa; cold matter is not TFD below about 1e3 GPa, and Z = 1 is outside the fit
 *         although it gives a number
 * Throws  InputError `formula`
 * Checked test/eos/thomasFermiDirac.test.ts, formPoints.test.ts (50 digits), everyForm.test.ts
 */
export function thomasFermiDirac(parameters: { readonly formula: string }): EosCurve {
  return new ThomasFermiDiracCurve(parameters.formula);
}

class ThomasFermiDiracCurve implements EosCurve {
  readonly minPressure: number;
  readonly maxPressure = Number.POSITIVE_INFINITY;
  private readonly fits: readonly ElementFit[];
  /** d(specific volume)/dy, left by the last call of `volume`. */
  private volumeSlope = 0;

  constructor(formula: string) {
    const parts = parseFormula(formula);
    const weight = parts.reduce((sum, { element, count }) => sum + count * element.atomicWeight, 0);
    this.fits = parts.map(({ element, count }) =>
      fitElement(element.atomicNumber, count / (element.atomicNumber * weight * DENSITY_UNIT)),
    );
    this.minPressure = this.pressure(this.leastDensePoint());
  }

  pressure(y: number): number {
    const y2 = y * y;
    return PRESSURE_UNIT * y2 * y2 * y;
  }

  density(y: number): number {
    return 1 / this.volume(y);
  }

  slopes(y: number, out: Float64Array): void {
    const volume = this.volume(y);
    const y2 = y * y;
    const slope = 5 * PRESSURE_UNIT * y2 * y2;
    out[0] = slope;
    out[1] = slope * volume;
    out[2] = -this.volumeSlope / volume;
    out[3] = 4 / y;
  }

  coordinate(pressure: number): number {
    checkPressure("thomas-fermi-dirac", this, pressure);
    return this.invert(pressure);
  }

  invert(pressure: number): number {
    return (pressure / PRESSURE_UNIT) ** 0.2;
  }

  coordinateAtDensity(density: number): number {
    const low = this.coordinate(this.minPressure);
    checkDensity("thomas-fermi-dirac", density, this.density(low), Number.POSITIVE_INFINITY);
    const value = (y: number): number => this.density(y);
    const slope = (y: number): number => {
      const volume = this.volume(y);
      return -this.volumeSlope / (volume * volume);
    };
    return invertIncreasing({ value, slope }, density, { low, high: Number.POSITIVE_INFINITY, guess: 1 });
  }

  /** The fit lets density fall with pressure below a few tenths of a GPa at most: where that ends, by bisection. */
  private leastDensePoint(): number {
    let low = 0;
    let high = 1;
    for (let middle = 0.5; middle !== low && middle !== high; middle = 0.5 * (low + high)) {
      this.volume(middle);
      if (this.volumeSlope >= 0) low = middle;
      else high = middle;
    }
    return high;
  }

  /** Specific volume [m³ kg^-1]. */
  private volume(y: number): number {
    let volume = 0;
    let volumeSlope = 0;
    for (let i = 0; i < this.fits.length; i++) {
      const fit = this.fits[i];
      const { b1, b2, b3, b4, b5 } = fit;
      const z = fit.scale * y;
      const decay = Math.exp(-fit.alpha * z);
      const sum = fit.b0 + z * (b1 + z * (b2 + z * (b3 + z * (b4 + z * b5))));
      const sumSlope = b1 + z * (2 * b2 + z * (3 * b3 + z * (4 * b4 + z * 5 * b5)));
      const inverse = 1 / (z + fit.phi);
      const x = (1 + decay * sum) * inverse;
      const xSlope = (decay * (sumSlope - fit.alpha * sum) - x) * inverse;
      volume += fit.share * x * x * x;
      volumeSlope += fit.share * 3 * x * x * xSlope * fit.scale;
    }
    this.volumeSlope = volumeSlope;
    return volume;
  }
}
