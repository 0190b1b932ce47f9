import { G } from "../units/constants.ts";
import type { MeasuredQuantity, QuantityKind, QuantityName } from "./quantity.ts";

type Row = Partial<Record<QuantityName, MeasuredQuantity>>;

/** Fills in what a row does not give but its other columns imply. `hasColumn`: the list gives the quantity itself. */
export function deriveQuantities(row: Row, hasColumn: (name: QuantityName) => boolean): void {
  const fill = (name: QuantityName, derived: MeasuredQuantity | undefined): void => {
    if (row[name] === undefined && derived !== undefined) row[name] = derived;
  };
  if (!hasColumn("radius")) fill("radius", radiusFromRatio(row));
  if (!hasColumn("starDensity")) fill("starDensity", starDensityFromTransit(row));
  if (!hasColumn("mass") && !hasColumn("minimumMass")) {
    fill("minimumMass", minimumMassFromVelocity(row));
    if (row.minimumMass !== undefined) fill("mass", massFromMinimum(row.minimumMass, row.inclination));
  }
  if (row.minimumMass !== undefined) fill("mass", { ...row.minimumMass, kind: "minimum", derivedFrom: "minimum mass" });
}

/** A factor of a product, with the power it enters by. */
interface Factor {
  readonly quantity: MeasuredQuantity;
  readonly power: number;
}

/** R = (R/R*) R*. */
function radiusFromRatio({ radiusRatio, starRadius }: Row): MeasuredQuantity | undefined {
  if (radiusRatio === undefined || starRadius === undefined) return undefined;
  const value = radiusRatio.value * starRadius.value;
  const factors = [
    { quantity: radiusRatio, power: 1 },
    { quantity: starRadius, power: 1 },
  ];
  return product(value, factors, "radius ratio and stellar radius");
}

/**
 * ρ* = 3π (a/R*)³ / (G P²), for a circular orbit and a planet of negligible mass.
 * Source  Seager & Mallén-Ornelas 2003, ApJ 585, 1038, eq. 9
 */
function starDensityFromTransit({ scaledAxis, period }: Row): MeasuredQuantity | undefined {
  if (scaledAxis === undefined || period === undefined) return undefined;
  const value = (3 * Math.PI * scaledAxis.value ** 3) / (G * period.value ** 2);
  const factors = [
    { quantity: scaledAxis, power: 3 },
    { quantity: period, power: -2 },
  ];
  return product(value, factors, "scaled axis and period");
}

const MASS_ITERATIONS = 100;

/**
 * m sin i = K √(1 − e²) (P / 2πG)^(1/3) (M* + m)^(2/3), with m = m sin i in the last factor; that understates it by less
 * than a third of m/M*. Without an eccentricity, or with a limit of it only, the orbit counts as circular.
 * Source  Lovis & Fischer 2010, in Exoplanets (Seager ed.), eq. 14 (from memory)
 */
function minimumMassFromVelocity(row: Row): MeasuredQuantity | undefined {
  const { velocityAmplitude: amplitude, period, starMass, eccentricity } = row;
  if (amplitude === undefined || period === undefined || starMass === undefined) return undefined;
  const isCircular = eccentricity === undefined || eccentricity.kind === "upper-limit" || !(eccentricity.value < 1);
  const shape = isCircular ? 1 : Math.sqrt(1 - eccentricity.value ** 2);
  const scale = amplitude.value * shape * Math.cbrt(period.value / (2 * Math.PI * G));
  let mass = 0;
  for (let i = 0; i < MASS_ITERATIONS; i++) {
    const next = scale * (starMass.value + mass) ** (2 / 3);
    if (Math.abs(next - mass) <= 1e-15 * next) break;
    mass = next;
  }
  const factors = [
    { quantity: amplitude, power: 1 },
    { quantity: starMass, power: 2 / 3 },
    { quantity: period, power: 1 / 3 },
  ];
  return product(
    mass,
    factors,
    `velocity amplitude, period and stellar mass${isCircular ? ", for a circular orbit" : " and eccentricity"}`,
  );
}

/** Within this of edge-on, the error of an inclination that has none does not matter. */
const EDGE_ON_COSINE = 0.02;

/** m = (m sin i) / sin i where the inclination is known; otherwise a minimum mass is all there is. */
function massFromMinimum(
  minimum: MeasuredQuantity,
  inclination: MeasuredQuantity | undefined,
): MeasuredQuantity | undefined {
  const sine = Math.sin(inclination?.value ?? 0);
  if (inclination === undefined || !(sine > 0)) return undefined;
  const value = minimum.value / sine;
  const cotangent = Math.abs(Math.cos(inclination.value)) / sine;
  const side = (own: number | undefined, angle: number | undefined): number | undefined =>
    own === undefined ? undefined : value * Math.hypot(own / minimum.value, cotangent * (angle ?? 0));
  const isSure = inclination.kind === "measured" || cotangent < EDGE_ON_COSINE;
  return {
    ...minimum,
    value,
    minus: side(minimum.minus, inclination.plus),
    plus: side(minimum.plus, inclination.minus),
    kind: isSure ? minimum.kind : "no-uncertainty",
    derivedFrom: `${minimum.derivedFrom ?? "minimum mass"} and inclination`,
  };
}

/** Independent errors add in quadrature, relative and weighted by the powers, each side for itself. */
function product(value: number, factors: readonly Factor[], derivedFrom: string): MeasuredQuantity | undefined {
  const first = factors[0]?.quantity;
  if (first === undefined || !Number.isFinite(value)) return undefined;
  const side = (raised: "plus" | "minus", lowered: "plus" | "minus"): number | undefined => {
    let sum = 0;
    for (const { quantity, power } of factors) {
      const error = power > 0 ? quantity[raised] : quantity[lowered];
      if (error === undefined) return undefined;
      sum += ((power * error) / quantity.value) ** 2;
    }
    return value * Math.sqrt(sum);
  };
  return {
    value,
    minus: side("minus", "plus"),
    plus: side("plus", "minus"),
    kind: productKind(factors),
    derivedFrom,
    origin: first.origin,
  };
}

/** Measured if all factors are; a limit stays one where it is the only factor that is not, and enters by a positive power. */
function productKind(factors: readonly Factor[]): QuantityKind {
  const others = factors.filter(({ quantity }) => quantity.kind !== "measured");
  const [only] = others;
  if (only === undefined) return "measured";
  return others.length === 1 && only.power > 0 ? only.quantity.kind : "no-uncertainty";
}
