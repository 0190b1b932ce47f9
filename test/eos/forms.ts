import { birchMurnaghan } from "../../src/eos/birchMurnaghan.ts";
import { bridge } from "../../src/eos/bridge.ts";
import { constantDensity } from "../../src/eos/constantDensity.ts";
import type { EosCurve } from "../../src/eos/curve.ts";
import { holzapfel } from "../../src/eos/holzapfel.ts";
import { keane } from "../../src/eos/keane.ts";
import { mixCurves } from "../../src/eos/mixCurves.ts";
import { modifiedPolytrope } from "../../src/eos/modifiedPolytrope.ts";
import { tabulated } from "../../src/eos/tabulated.ts";
import { thomasFermiDirac } from "../../src/eos/thomasFermiDirac.ts";
import { vinet } from "../../src/eos/vinet.ts";

export const GPA = 1e9;

export const densityAtGPa = (curve: EosCurve, gpa: number): number => curve.density(curve.coordinate(gpa * GPA));

export const slopesAt = (curve: EosCurve, y: number): Float64Array => {
  const out = new Float64Array(4);
  curve.slopes(y, out);
  return out;
};

// Parameters: Seager et al. 2007, ApJ 669, 1279, tables 1 and 3 (from memory), unless said otherwise.
export const ironVinet = vinet({ densityZero: 8300, bulkModulus: 156.2 * GPA, bulkModulusPrime: 6.08 });
export const perovskite = birchMurnaghan({
  order: 4,
  densityZero: 4100,
  bulkModulus: 247 * GPA,
  bulkModulusPrime: 3.97,
  bulkModulusSecond: -0.016 / GPA,
});
/** Zeng, Sasselov & Jacobsen 2016, ApJ 819, 127 (from memory). */
export const earthMantle = birchMurnaghan({ order: 2, densityZero: 3980, bulkModulus: 206 * GPA });
/** Hemley et al. 1987, Nature 330, 737 (from memory). */
export const iceVII = birchMurnaghan({ order: 3, densityZero: 1460, bulkModulus: 23.7 * GPA, bulkModulusPrime: 4.15 });
/** Smith et al. 2018, Nature Astronomy 2, 452 (from memory). */
export const ironSmith = vinet({ densityZero: 8430, bulkModulus: 177.7 * GPA, bulkModulusPrime: 5.64 });
/** Bouchet et al. 2013, Phys. Rev. B 87, 094102 (from memory): V0 = 6.29 cm3/mol. */
export const ironBouchet = holzapfel({
  densityZero: 55.845e3 / 6.29,
  bulkModulus: 253.844 * GPA,
  bulkModulusPrime: 4.719,
  fermiGasPressure: 1.0685e4 * GPA,
});
/** Sakai et al. 2016, Sci. Rep. 6, 22652 (from memory): V0 = 24.73 cm3/mol. */
export const postPerovskiteSakai = keane({
  densityZero: 100.387e3 / 24.73,
  bulkModulus: 203 * GPA,
  bulkModulusPrime: 5.35,
  bulkModulusPrimeInfinite: 2.6,
});
export const ironPolytrope = modifiedPolytrope({ densityZero: 8300, coefficient: 0.00349, exponent: 0.528 });
export const classicalPolytrope = modifiedPolytrope({ densityZero: 0, coefficient: 0.00349, exponent: 0.6 });
export const ironTfd = thomasFermiDirac({ formula: "Fe" });

/** One of each form, and what they are made into. */
export const everyForm: Readonly<Record<string, EosCurve>> = {
  vinet: ironVinet,
  "birch-murnaghan 2": earthMantle,
  "birch-murnaghan 3": iceVII,
  "birch-murnaghan 4": perovskite,
  holzapfel: ironBouchet,
  keane: postPerovskiteSakai,
  "modified-polytrope": ironPolytrope,
  "classical polytrope": classicalPolytrope,
  "thomas-fermi-dirac": ironTfd,
  constant: constantDensity({ density: 5000 }),
  table: tabulated(
    [0, 1, 5, 20, 100, 500, 3000].map((gpa) => ({ pressure: gpa * GPA, density: 2000 + 900 * Math.sqrt(gpa) })),
  ),
  mixture: mixCurves([
    { curve: perovskite, massFraction: 0.675 },
    { curve: ironVinet, massFraction: 0.325 },
  ]),
  "mixture led by a polytrope": mixCurves([
    { curve: ironPolytrope, massFraction: 0.2 },
    { curve: earthMantle, massFraction: 0.5 },
    { curve: ironTfd, massFraction: 0.3 },
  ]),
  bridge: bridge(ironSmith, ironTfd, 1374 * GPA, 11000 * GPA),
};
