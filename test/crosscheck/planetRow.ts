import type { MeasuredQuantity, PlanetRow, QuantityKind, QuantityName, TextName } from "../../src/planets/quantity.ts";
import { constants, EARTH_MASS, EARTH_RADIUS, SUN_MASS, SUN_RADIUS } from "../../src/units/constants.ts";

/** Units that tests write values in. */
export const testUnits: Readonly<Partial<Record<QuantityName, number>>> = {
  mass: EARTH_MASS,
  minimumMass: EARTH_MASS,
  radius: EARTH_RADIUS,
  period: constants.day.value,
  semiMajorAxis: constants.astronomicalUnit.value,
  inclination: Math.PI / 180,
  starMass: SUN_MASS,
  starRadius: SUN_RADIUS,
  rightAscension: Math.PI / 180,
  declination: Math.PI / 180,
};

type Extra = Partial<Omit<MeasuredQuantity, "value" | "origin">>;

/** A value in test units, without errors, with one for both sides, or with one for each; then anything else about it. */
export type Written =
  | number
  | readonly [value: number, errors: number | readonly [number, number] | undefined, extra?: Extra];

/** A quantity as a reader would give it; SI. */
export function quantity(name: QuantityName, written: Written): MeasuredQuantity {
  const unit = testUnits[name] ?? 1;
  const [value, errors, extra] = typeof written === "number" ? [written, undefined, undefined] : written;
  const [minus, plus] = typeof errors === "number" ? [errors, errors] : (errors ?? []);
  const kind: QuantityKind = minus && plus ? "measured" : "no-uncertainty";
  const scaled = (x: number | undefined) => (x === undefined ? undefined : x * unit);
  return {
    value: value * unit,
    minus: scaled(minus),
    plus: scaled(plus),
    kind,
    origin: { file: "invented.csv", line: 2, column: name },
    written: String(value),
    ...extra,
  };
}

/** A row of an invented list. */
export function planetRow(
  values: Readonly<Partial<Record<QuantityName, Written>>>,
  texts: Readonly<Partial<Record<TextName, string>>> & { readonly name?: string } = {},
  row = 1,
): PlanetRow {
  const quantities = Object.fromEntries(
    Object.entries(values).map(([name, written]) => [name, quantity(name as QuantityName, written)]),
  );
  const name = texts.name ?? `Ostara ${row} b`;
  return { row, line: row + 1, name, quantities, texts, cells: [], issues: [] };
}
