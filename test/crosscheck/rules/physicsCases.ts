import { planetRow } from "../planetRow.ts";
import type { RuleCase } from "./ruleCase.ts";

type Values = Parameters<typeof planetRow>[0];
const one = (values: Values, texts: Parameters<typeof planetRow>[1] = {}) => [planetRow(values, texts)];

/** Iron in these cases has 0.77 Earth radii at one Earth mass and grows as M^0.27: rules.test.ts. */
export const physicsCases: readonly RuleCase[] = [
  {
    rule: "denser-than-iron",
    fires: [
      { why: "half an Earth radius", rows: one({ mass: [1, 0.02], radius: [0.5, 0.01] }), severity: "error" },
      { why: "within the errors", rows: one({ mass: [1, 0.02], radius: [0.75, 0.02] }), severity: "info" },
      { why: "within that of the mass", rows: one({ mass: [5, 2], radius: [1.12, 0.005] }), severity: "info" },
    ],
    silent: [
      { why: "the Earth", rows: one({ mass: 1, radius: 1 }) },
      { why: "an upper limit", rows: one({ mass: [50, undefined, { kind: "upper-limit" }], radius: [1, 0.01] }) },
    ],
  },
  {
    // GMμ/2RT with μ = 2.3 g/mol at 1000 K is 5.51e7 m or 8.64 Earth radii for one Earth mass (by hand).
    rule: "lighter-than-hydrogen",
    fires: [
      {
        why: "beyond the sonic point",
        rows: one({ mass: [1, 0.02], radius: [12, 0.2], equilibriumTemperature: 1000 }),
        severity: "error",
      },
    ],
    silent: [
      { why: "inside it", rows: one({ mass: [1, 0.02], radius: [8, 0.2], equilibriumTemperature: 1000 }) },
      { why: "colder", rows: one({ mass: [1, 0.02], radius: [12, 0.2], equilibriumTemperature: 500 }) },
    ],
  },
  {
    rule: "extreme-density",
    fires: [
      { why: "40 g/cm³ stated", rows: one({ density: 40e3 }), severity: "info" },
      {
        why: "implied by a limit",
        rows: one({ mass: [50, undefined, { kind: "upper-limit" }], radius: [1, 0.1] }),
        severity: "info",
      },
    ],
    silent: [{ why: "the Earth", rows: one({ mass: 1, radius: 1 }) }],
  },
  {
    // A uniform Earth has 172.5 GPa at its centre; the pressure goes as M²/R⁴.
    rule: "central-pressure",
    fires: [{ why: "three Earth masses in one radius", rows: one({ mass: 3, radius: 1 }), severity: "info" }],
    silent: [{ why: "two and a half", rows: one({ mass: 2.5, radius: 1 }) }],
  },
  {
    rule: "deuterium-limit",
    fires: [
      { why: "20 Jupiter masses", rows: one({ mass: [20 * 317.8, 100] }), severity: "warning" },
      { why: "minimum mass of 15", rows: one({ minimumMass: [15 * 317.8, 100] }), severity: "warning" },
    ],
    silent: [
      { why: "12 Jupiter masses", rows: one({ mass: [12 * 317.8, 100] }) },
      { why: "below 20", rows: one({ mass: [20 * 317.8, undefined, { kind: "upper-limit" }] }) },
    ],
  },
  {
    rule: "minimum-mass-as-mass",
    fires: [
      { why: "equal", rows: one({ mass: [3.21, 0.1], minimumMass: [3.21, 0.1] }), severity: "warning" },
      {
        why: "equal, and the reader noticed",
        rows: one({ mass: [3.21, 0.1, { kind: "minimum" }], minimumMass: [3.21, 0.1] }),
        severity: "warning",
      },
      {
        why: "equal at 45°",
        rows: one({ mass: [3.21, 0.1], minimumMass: [3.21, 0.1], inclination: 45 }),
        severity: "warning",
      },
    ],
    silent: [
      { why: "equal as stated", rows: one({ mass: 3.21, minimumMass: 3.21 }, { massProvenance: "Msini" }) },
      { why: "different", rows: one({ mass: [3.41, 0.1], minimumMass: [3.21, 0.1] }) },
      { why: "edge-on", rows: one({ mass: [3.21, 0.1], minimumMass: [3.21, 0.1], inclination: 90.4 }) },
    ],
  },
  {
    rule: "minimum-mass-flagged",
    fires: [{ why: "flagged", rows: one({ mass: [3.21, 0.1, { kind: "minimum" }] }), severity: "info" }],
    silent: [{ why: "measured", rows: one({ mass: [3.21, 0.1] }) }],
  },
  {
    rule: "relation-flagged",
    fires: [{ why: "flagged", rows: one({ mass: [3.21, undefined, { kind: "from-relation" }] }), severity: "info" }],
    silent: [{ why: "measured", rows: one({ mass: [3.21, 0.1] }) }],
  },
  {
    rule: "relation-unflagged",
    fires: [
      {
        why: "radius by velocities",
        rows: one({ radius: 2.1 }, { discoveryMethod: "Radial Velocity" }),
        severity: "warning",
      },
      {
        why: "radius by timing",
        rows: one({ radius: 2.1 }, { discoveryMethod: "Transit Timing Variations" }),
        severity: "warning",
      },
      { why: "mass by transit", rows: one({ mass: 2.1 }, { discoveryMethod: "Primary Transit" }), severity: "warning" },
    ],
    silent: [
      { why: "a measured radius", rows: one({ radius: [2.1, 0.1] }, { discoveryMethod: "Radial Velocity" }) },
      { why: "radius by transit", rows: one({ radius: 2.1 }, { discoveryMethod: "Transit" }) },
      { why: "mass by timing", rows: one({ mass: 2.1 }, { discoveryMethod: "Transit Timing Variations" }) },
      { why: "method unknown", rows: one({ radius: 2.1, mass: 2.1 }) },
    ],
  },
  {
    rule: "smooth-curve",
    fires: [{ why: "20 rows on R = M^0.28", rows: onCurve(1), severity: "warning" }],
    silent: [
      { why: "scatter of 10 %", rows: onCurve(1.1) },
      { why: "few rows", rows: onCurve(1).slice(0, 9) },
    ],
  },
  {
    rule: "theoretical-value",
    fires: [{ why: "flagged", rows: one({ mass: [3.21, undefined, { kind: "theoretical" }] }), severity: "info" }],
    silent: [{ why: "measured", rows: one({ mass: [3.21, 0.1] }) }],
  },
];

/** Masses on one power law of radius, radii rounded to three digits, two in three masses off by `scatter` or its square. */
function onCurve(scatter: number) {
  return Array.from({ length: 20 }, (_, i) => {
    const mass = 1.13 ** i * scatter ** (i % 3);
    const radius = Number((1.13 ** (0.28 * i)).toPrecision(3));
    return planetRow({ mass, radius }, {}, i + 1);
  });
}
