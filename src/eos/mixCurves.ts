import type { EosCurve } from "./curve.ts";
import { invertIncreasing } from "./invert.ts";
import { checkDensity, checkPressure } from "./range.ts";

export interface CurvePart {
  readonly curve: EosCurve;
  /** Share of the mass, > 0; the shares sum to 1. */
  readonly massFraction: number;
}

/** Densities are sought up to this pressure [Pa]; the centre of a white dwarf has less. */
const HIGHEST_PRESSURE = 1e20;

/**
 * An intimate mixture at one pressure whose volumes add: 1/ρ = Σ w_i / ρ_i(P). The coordinate is that of the first
 * part; the others are inverted at every evaluation, so put first the one that is dearest to invert.
 * Valid   where all parts are
 * Checked test/eos/mixCurves.test.ts
 */
export function mixCurves(parts: readonly CurvePart[]): EosCurve {
  return parts.length === 1 ? parts[0].curve : new MixedCurve(parts);
}

class MixedCurve implements EosCurve {
  readonly minPressure: number;
  readonly maxPressure: number;
  private readonly lead: EosCurve;
  private readonly leadFraction: number;
  private readonly others: readonly CurvePart[];
  private readonly scratch = new Float64Array(4);

  constructor([lead, ...others]: readonly CurvePart[]) {
    this.lead = lead.curve;
    this.leadFraction = lead.massFraction;
    this.others = others;
    const curves = [lead, ...others].map((part) => part.curve);
    this.minPressure = Math.max(...curves.map((curve) => curve.minPressure));
    this.maxPressure = Math.min(...curves.map((curve) => curve.maxPressure));
  }

  pressure(y: number): number {
    return this.lead.pressure(y);
  }

  density(y: number): number {
    const pressure = this.lead.pressure(y);
    let volume = this.leadFraction / this.lead.density(y);
    for (const { curve, massFraction } of this.others) {
      volume += massFraction / curve.density(curve.invert(pressure));
    }
    return 1 / volume;
  }

  slopes(y: number, out: Float64Array): void {
    const pressure = this.lead.pressure(y);
    const { scratch } = this;
    this.lead.slopes(y, out);
    const slope = out[0];
    let volume = this.leadFraction / this.lead.density(y);
    let weightedLogSlope = volume * out[2];
    // Specific enthalpies add like volumes; the first part's own is used, as it is finite even where density vanishes.
    let enthalpySlope = this.leadFraction * out[1];
    for (let i = 0; i < this.others.length; i++) {
      const { curve, massFraction } = this.others[i];
      const otherY = curve.invert(pressure);
      curve.slopes(otherY, scratch);
      const share = massFraction / curve.density(otherY);
      volume += share;
      enthalpySlope += slope * share;
      weightedLogSlope += scratch[0] > 0 ? (share * scratch[2] * slope) / scratch[0] : Number.POSITIVE_INFINITY;
    }
    out[1] = enthalpySlope;
    out[2] = weightedLogSlope / volume;
  }

  coordinate(pressure: number): number {
    checkPressure("mixture", this, pressure);
    return this.invert(pressure);
  }

  invert(pressure: number): number {
    return this.lead.invert(pressure);
  }

  coordinateAtDensity(density: number): number {
    const low = this.lead.coordinate(this.minPressure);
    const high = this.lead.coordinate(Math.min(this.maxPressure, HIGHEST_PRESSURE));
    checkDensity("mixture", density, this.density(low), this.density(high));
    const out = new Float64Array(4);
    const value = (y: number): number => this.density(y);
    const slope = (y: number): number => {
      this.slopes(y, out);
      return (out[2] * out[0]) / out[1];
    };
    return invertIncreasing({ value, slope }, density, { low, high, guess: Math.sqrt(low * high) || 0.5 * high });
  }
}
