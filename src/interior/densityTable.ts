import { InputError } from "../errors.ts";
import { G } from "../units/constants.ts";
import type { ProfilePoint } from "./profile.ts";

/** Density against radius, centre to surface, straight lines between rows; a repeated radius is a jump. SI. */
export interface DensityTable {
  readonly radius: readonly number[];
  readonly density: readonly number[];
}

/** What hydrostatic equilibrium says about a density table. SI. */
export interface DensityTableProfile {
  readonly mass: number;
  readonly radius: number;
  readonly centralPressure: number;
  readonly inertiaFactor: number;
  /** One point per row of the table; layers are numbered from the centre, a new one at every jump. */
  readonly points: readonly ProfilePoint[];
}

/**
 * Mass, gravity and pressure under a given ρ(r):  dm/dr = 4π r² ρ,  dP/dr = -G m ρ / r².
 * Exact for the piecewise linear density, as both integrals are elementary: no step size, no quadrature error.
 * Throws  InputError `density-table-radius` unless radii rise from 0 with at most two rows at one radius, and
 *         `density-table-density` for a density that is not positive; line = row of the table from 1
 * Checked uniform and two-layer spheres; PREM (Dziewonski & Anderson 1981): test/interior/densityTable.test.ts
 */
export function integrateDensityTable(table: DensityTable, surfacePressure = 0): DensityTableProfile {
  checkTable(table);
  const { radius, density } = table;
  const rows = radius.length;
  const mass = new Float64Array(rows);
  let inertia = 0;
  for (let i = 1; i < rows; i++) {
    const line = new LinearShell(table, i);
    mass[i] = mass[i - 1] + line.mass();
    inertia += line.inertia();
  }
  const pressure = new Float64Array(rows);
  pressure[rows - 1] = surfacePressure;
  for (let i = rows - 1; i > 0; i--) {
    pressure[i - 1] = pressure[i] + new LinearShell(table, i).pressureDrop(mass[i - 1]);
  }
  const R = radius[rows - 1];
  const M = mass[rows - 1];
  let layer = 1;
  const points = radius.map((r, i) => {
    if (i > 0 && r === radius[i - 1]) layer++;
    return {
      radius: r,
      enclosedMass: mass[i],
      pressure: pressure[i],
      density: density[i],
      gravity: r === 0 ? 0 : (G * mass[i]) / (r * r),
      layer: String(layer),
      phase: "",
    };
  });
  return { mass: M, radius: R, centralPressure: pressure[0], inertiaFactor: inertia / (M * R * R), points };
}

/** The shell between rows i-1 and i, where ρ = a + b r. */
class LinearShell {
  private readonly inner: number;
  private readonly outer: number;
  private readonly a: number;
  private readonly b: number;

  constructor({ radius, density }: DensityTable, i: number) {
    this.inner = radius[i - 1];
    this.outer = radius[i];
    this.b = this.outer === this.inner ? 0 : (density[i] - density[i - 1]) / (this.outer - this.inner);
    this.a = density[i] - this.b * this.outer;
  }

  /** 4π ∫ r² ρ dr */
  mass(): number {
    return 4 * Math.PI * (this.a * this.power(3) + this.b * this.power(4));
  }

  /** (8π/3) ∫ r⁴ ρ dr */
  inertia(): number {
    return ((8 * Math.PI) / 3) * (this.a * this.power(5) + this.b * this.power(6));
  }

  /**
   * G ∫ m ρ / r² dr. With m = c + 4π (a r³/3 + b r⁴/4), where c makes m right at the inner edge, the integrand is
   *   c (a/r² + b/r) + 4π (a² r/3 + 7 a b r²/12 + b² r³/4).
   */
  pressureDrop(innerMass: number): number {
    const { a, b, inner, outer } = this;
    if (outer === inner) return 0;
    const c = innerMass - 4 * Math.PI * ((a * inner ** 3) / 3 + (b * inner ** 4) / 4);
    const pointMass = inner === 0 ? 0 : c * (a * (1 / inner - 1 / outer) + b * Math.log(outer / inner));
    const spread = (a * a * this.power(2)) / 3 + (7 / 12) * a * b * this.power(3) + (b * b * this.power(4)) / 4;
    return G * (pointMass + 4 * Math.PI * spread);
  }

  /** ∫ r^(n-1) dr */
  private power(n: number): number {
    return (this.outer ** n - this.inner ** n) / n;
  }
}

function checkTable({ radius, density }: DensityTable): void {
  const fail = (code: string, row: number, found: number, message: string, remedy: string): never => {
    throw new InputError(code, `Density table, row ${row + 1}: ${message}`, {
      line: row + 1,
      found: String(found),
      remedy,
    });
  };
  if (radius.length < 2 || radius.length !== density.length) {
    throw new InputError(
      "density-table-radius",
      `A density table needs at least two rows; this one has ${radius.length}.`,
    );
  }
  radius.forEach((r, i) => {
    if (i === 0 && r !== 0) {
      fail("density-table-radius", i, r, `the first radius is ${r} m, not 0.`, "Start the table at the centre.");
    }
    if (!Number.isFinite(r) || (i > 0 && !(r >= radius[i - 1])) || (i > 1 && r === radius[i - 2])) {
      fail(
        "density-table-radius",
        i,
        r,
        `radius ${r} m does not rise above the rows before it.`,
        "Sort the rows from centre to surface; give one radius twice, at most, for a jump.",
      );
    }
    if (!(density[i] > 0) || !Number.isFinite(density[i])) {
      fail("density-table-density", i, density[i], `density is ${density[i]} kg/m3.`, "Densities must be positive.");
    }
  });
}
