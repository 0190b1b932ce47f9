import { type DensityTable, integrateDensityTable } from "./densityTable.ts";

/** Longest Runge–Kutta step in ln r, and where the innermost shell is entered, as a share of its outer radius. */
const LONGEST_STEP = 0.02;
const ENTRANCE = 1e-4;

/**
 * Fluid Love number k2 of a body in hydrostatic equilibrium: how much its gravity field gives way to a slow tide.
 * Formula r dη/dr = 6 + η - η² - 6 (ρ/ρ̄)(η + 1) with η = 0 at the centre; η is continuous at density jumps;
 *         k2 = (3 - η(R)) / (2 + η(R)), from 3/2 for a uniform body down to 0 for a point mass
 * Source  Radau's form of Clairaut's equation: Jeffreys 1970, The Earth, section 4.03; as used for planets by Ragozzine
 *         & Wolf 2009, Astrophys. J. 698, 1778, equation 13
 * Range   slow rotation and small tides; error second order in the spacing of the rows, 1e-5 with 500 even rows
 * Throws  InputError as `integrateDensityTable`
 * Checked polytropes, PREM: test/interior/loveNumber.test.ts
 */
export function fluidLoveNumber(table: DensityTable): number {
  const { points } = integrateDensityTable(table);
  let eta = 0;
  for (let i = 1; i < points.length; i++) {
    const shell = { inner: points[i - 1], outer: points[i] };
    if (shell.inner.radius < shell.outer.radius) eta = crossShell(shell, eta);
  }
  return (3 - eta) / (2 + eta);
}

interface Row {
  readonly radius: number;
  readonly density: number;
  readonly enclosedMass: number;
}

/** η at the outer edge of a shell in which density is linear in radius. */
function crossShell({ inner, outer }: { inner: Row; outer: Row }, etaInside: number): number {
  const slope = (outer.density - inner.density) / (outer.radius - inner.radius);
  const intercept = inner.density - slope * inner.radius;
  const massIntegral = (r: number): number => 4 * Math.PI * r ** 3 * (intercept / 3 + (slope * r) / 4);
  const offset = inner.enclosedMass - massIntegral(inner.radius);
  const etaSlope = (logRadius: number, eta: number): number => {
    const r = Math.exp(logRadius);
    const meanDensity = (offset + massIntegral(r)) / ((4 / 3) * Math.PI * r ** 3);
    return 6 + eta - eta * eta - 6 * ((intercept + slope * r) / meanDensity) * (eta + 1);
  };
  // Close to the centre η is nearly 0, and what is missed there fades as r^-5.
  const start = Math.max(inner.radius, ENTRANCE * outer.radius);
  let eta = etaInside;
  const span = Math.log(outer.radius / start);
  const steps = Math.ceil(span / LONGEST_STEP);
  const h = span / steps;
  for (let k = 0; k < steps; k++) eta = rungeKutta4(etaSlope, Math.log(start) + k * h, eta, h);
  return eta;
}

function rungeKutta4(f: (x: number, y: number) => number, x: number, y: number, h: number): number {
  const k1 = f(x, y);
  const k2 = f(x + h / 2, y + (h / 2) * k1);
  const k3 = f(x + h / 2, y + (h / 2) * k2);
  const k4 = f(x + h, y + h * k3);
  return y + (h / 6) * (k1 + 2 * k2 + 2 * k3 + k4);
}
