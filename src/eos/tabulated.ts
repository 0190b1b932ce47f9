import { InputError } from "../errors.ts";
import { CubicHermite, monotoneSlopes } from "./cubicHermite.ts";
import type { EosCurve } from "./curve.ts";
import { invertIncreasing } from "./invert.ts";
import { checkDensity, checkPressure } from "./range.ts";

export interface TableRow {
  /** [Pa] */
  readonly pressure: number;
  /** [kg m^-3] */
  readonly density: number;
}

/**
 * A table of densities, joined by a monotone C1 cubic of ln ρ over pressure. The coordinate is pressure [Pa].
 * Valid   from the first row to the last
 * Throws  InputError `eos-table` unless there are two rows or more, pressures rise, and densities are positive and
 *         never fall; `place.line` is the offending row, counted from 1
 * Checked test/eos/tabulated.test.ts
 */
export function tabulated(rows: readonly TableRow[]): EosCurve {
  if (rows.length < 2) {
    throw new InputError("eos-table", `the table has ${rows.length} rows; it needs two or more.`);
  }
  rows.forEach(({ pressure, density }, i) => {
    const { pressure: pressureBefore, density: densityBefore } = rows[i - 1] ?? { pressure: -1, density: 0 };
    const rises = pressure >= 0 && pressure > pressureBefore && density > 0 && density >= densityBefore;
    if (rises && Number.isFinite(pressure) && Number.isFinite(density)) return;
    throw new InputError(
      "eos-table",
      `row ${i + 1} of the table (${pressure} Pa, ${density} kg/m3) does not continue row ${i}: ` +
        "pressure must be 0 or more and rise from row to row; density must be positive and never fall.",
      { line: i + 1, found: `${pressure}, ${density}` },
    );
  });
  return new TableCurve(rows);
}

class TableCurve implements EosCurve {
  readonly minPressure: number;
  readonly maxPressure: number;
  private readonly logDensity: CubicHermite;

  constructor(rows: readonly TableRow[]) {
    const pressures = rows.map((row) => row.pressure);
    const logDensities = rows.map((row) => Math.log(row.density));
    this.minPressure = pressures[0];
    this.maxPressure = pressures[pressures.length - 1];
    this.logDensity = new CubicHermite(pressures, logDensities, monotoneSlopes(pressures, logDensities));
  }

  pressure(y: number): number {
    return y;
  }

  density(y: number): number {
    return Math.exp(this.logDensity.value(y));
  }

  slopes(y: number, out: Float64Array): void {
    out[0] = 1;
    out[1] = Math.exp(-this.logDensity.value(y));
    out[2] = this.logDensity.slope(y);
    out[3] = 0;
  }

  coordinate(pressure: number): number {
    checkPressure("table", this, pressure);
    return pressure;
  }

  invert(pressure: number): number {
    return pressure;
  }

  /** Where density does not change over several pressures, any of them may be given. */
  coordinateAtDensity(density: number): number {
    const { minPressure: low, maxPressure: high, logDensity } = this;
    checkDensity("table", density, this.density(low), this.density(high));
    const f = { value: (y: number) => logDensity.value(y), slope: (y: number) => logDensity.slope(y) };
    return invertIncreasing(f, Math.log(density), { low, high, guess: 0.5 * (low + high) });
  }
}
