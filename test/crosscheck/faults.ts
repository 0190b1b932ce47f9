import type { MeasuredQuantity, PlanetRow, QuantityName } from "../../src/planets/quantity.ts";
import { EARTH_MASS, EARTH_RADIUS, JUPITER_MASS, JUPITER_RADIUS } from "../../src/units/constants.ts";

/** A known fault, and the rules of which one must find it. */
export interface Fault {
  readonly name: string;
  readonly foundBy: readonly string[];
  readonly inject: (row: PlanetRow, random: () => number) => PlanetRow;
}

function change(row: PlanetRow, name: QuantityName, by: (quantity: MeasuredQuantity) => Partial<MeasuredQuantity>) {
  const quantity = row.quantities[name];
  if (!quantity) throw new Error(`the invented row has no ${name}`);
  return { ...row, quantities: { ...row.quantities, [name]: { ...quantity, ...by(quantity) } } };
}

function times(row: PlanetRow, name: QuantityName, factor: number): PlanetRow {
  return change(row, name, ({ value, minus = 0, plus = 0 }) => ({
    value: value * factor,
    minus: minus * factor,
    plus: plus * factor,
  }));
}

/** Radius in Earth radii of a planet of `mass` [kg] by a made-up power law. */
const curve = (mass: number) => 1.05 * EARTH_RADIUS * (mass / EARTH_MASS) ** 0.43;

/** Ten faults that real lists hold, each put into rows that were clean. */
export const faults: readonly Fault[] = [
  {
    name: "mass in Jupiter masses read as Earth masses",
    foundBy: ["unit-slip"],
    inject: (row) => times(row, "mass", EARTH_MASS / JUPITER_MASS),
  },
  {
    name: "radius in Earth radii read as Jupiter radii",
    foundBy: ["unit-slip"],
    inject: (row) => times(row, "radius", JUPITER_RADIUS / EARTH_RADIUS),
  },
  {
    name: "period off by 2π",
    foundBy: ["unit-slip"],
    inject: (row) => times(row, "period", 1 / (2 * Math.PI)),
  },
  {
    name: "density off by 1000",
    foundBy: ["unit-slip"],
    inject: (row) => times(row, "density", 1000),
  },
  {
    name: "insolation of another star",
    foundBy: ["insolation-star-orbit"],
    inject: (row, random) => times(row, "insolation", random() < 0.5 ? 3 : 1 / 3),
  },
  {
    name: "twin column not updated",
    foundBy: ["twin-columns"],
    inject: (row, random) => {
      const twins = row.twins?.mass?.map((twin) => ({ ...twin, value: twin.value * (1.1 + random()) })) ?? [];
      return { ...row, twins: { ...row.twins, mass: twins } };
    },
  },
  {
    name: "cell copied from another column",
    foundBy: ["repeated-value"],
    inject: (row) => change(row, "starRadius", () => ({ written: row.quantities.period?.written })),
  },
  {
    name: "error of zero",
    foundBy: ["zero-uncertainty"],
    inject: (row) => change(row, "radius", () => ({ minus: 0, plus: 0, kind: "no-uncertainty" })),
  },
  {
    name: "limit written as a measurement",
    foundBy: ["error-equals-value"],
    inject: (row) => change(row, "mass", ({ value }) => ({ minus: value, plus: value })),
  },
  {
    name: "radius computed from the mass, nothing said",
    foundBy: ["smooth-curve"],
    inject: (row) =>
      change(row, "radius", () => ({
        value: Number((curve(row.quantities.mass?.value ?? Number.NaN) / EARTH_RADIUS).toPrecision(3)) * EARTH_RADIUS,
        minus: undefined,
        plus: undefined,
        kind: "no-uncertainty",
      })),
  },
];
