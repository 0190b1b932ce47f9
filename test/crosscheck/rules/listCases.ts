import { planetRow, quantity, type Written } from "../planetRow.ts";
import type { RuleCase } from "./ruleCase.ts";

type Values = Parameters<typeof planetRow>[0];
type Texts = Parameters<typeof planetRow>[1];
const one = (values: Values, texts: Texts = {}) => [planetRow(values, texts)];
const named = (...names: string[]) => names.map((name, i) => planetRow({}, { name }, i + 1));

/** One planet in several publications. */
const publications = (...radii: Written[]) =>
  radii.map((radius, i) => planetRow({ radius }, { name: "Ostara 1 b", reference: `paper ${i}` }, i + 1));

const twin = (radius: number, other: Written) => [
  { ...planetRow({ radius: [radius, 0.1] }), twins: { radius: [quantity("radius", other)] } },
];

export const listCases: readonly RuleCase[] = [
  {
    rule: "twin-columns",
    fires: [
      { why: "13 % apart", rows: twin(2.345, 2.071), severity: "warning" },
      { why: "a factor 11.2", rows: twin(26.28, 2.345), severity: "error" },
    ],
    silent: [
      { why: "equal", rows: twin(2.345, 2.345) },
      { why: "mean for equatorial radius of Jupiter", rows: twin(2.345, 2.345 * (69911 / 71492)) },
      { why: "a twin of one digit", rows: twin(2.345, [2.1, undefined, { written: "0.2" }]) },
    ],
  },
  {
    rule: "repeated-value",
    fires: [{ why: "four digits", rows: one({ radius: 1.234, period: 1.234 }), severity: "warning" }],
    silent: [
      { why: "three digits", rows: one({ radius: 1.23, period: 1.23 }) },
      {
        why: "padding zeros",
        rows: one({ radius: [1, 0.1, { written: "1.0000" }], period: [1, 0.1, { written: "1.0000" }] }),
      },
      { why: "mass and minimum mass", rows: one({ mass: 1.234, minimumMass: 1.234 }) },
    ],
  },
  {
    rule: "missing-uncertainty",
    fires: [{ why: "none", rows: one({ mass: 1 }), severity: "info" }],
    silent: [{ why: "both", rows: one({ mass: [1, 0.1] }) }],
  },
  {
    rule: "one-sided-uncertainty",
    fires: [
      {
        why: "upper only",
        rows: one({ radius: [2, undefined, { plus: 1e5, kind: "no-uncertainty" }] }),
        severity: "warning",
      },
    ],
    silent: [
      { why: "both", rows: one({ radius: [2, [0.1, 0.2]] }) },
      { why: "neither", rows: one({ radius: 2 }) },
      { why: "a limit", rows: one({ radius: [2, undefined, { plus: 1e5, kind: "upper-limit" }] }) },
    ],
  },
  {
    rule: "zero-uncertainty",
    fires: [{ why: "zero", rows: one({ semiMajorAxis: [1.2, 0] }), severity: "warning" }],
    silent: [
      { why: "small", rows: one({ semiMajorAxis: [1.2, 0.001] }) },
      {
        why: "0 +0.15 −0 is a limit",
        rows: one({ mass: [0, [0, 0.15], { kind: "upper-limit", limitCoding: "zero-with-error" }] }),
      },
    ],
  },
  {
    rule: "uncertainty-below-star",
    fires: [{ why: "0.1 % beside 5 %", rows: one({ radius: [2, 0.002], starRadius: [1, 0.05] }), severity: "warning" }],
    silent: [
      { why: "2 % beside 5 %", rows: one({ radius: [2, 0.04], starRadius: [1, 0.05] }) },
      { why: "the star has no error", rows: one({ radius: [2, 0.002], starRadius: 1 }) },
    ],
  },
  {
    rule: "limit-with-uncertainties",
    fires: [
      {
        why: "flag and errors",
        rows: one({ mass: [5, 1, { kind: "upper-limit", limitCoding: "flag" }] }),
        severity: "warning",
      },
    ],
    silent: [{ why: "flag only", rows: one({ mass: [5, undefined, { kind: "upper-limit", limitCoding: "flag" }] }) }],
  },
  {
    rule: "zero-plus-error",
    fires: [
      {
        why: "0.0 +0.15 −0.0",
        rows: one({ mass: [0, [0, 0.15], { kind: "upper-limit", limitCoding: "zero-with-error" }] }),
        severity: "warning",
      },
    ],
    silent: [{ why: "a measurement", rows: one({ mass: [5, 1] }) }],
  },
  {
    rule: "error-equals-value",
    fires: [
      { why: "5 ± 5", rows: one({ mass: [5, 5] }), severity: "warning" },
      {
        why: "read as a limit",
        rows: one({ mass: [5, undefined, { kind: "upper-limit", limitCoding: "error-equals-value" }] }),
        severity: "warning",
      },
    ],
    silent: [
      { why: "5 ± 4.9", rows: one({ mass: [5, 4.9] }) },
      { why: "eccentricity 0.1 ± 0.1", rows: one({ eccentricity: [0.1, 0.1] }) },
    ],
  },
  {
    rule: "status",
    fires: [
      { why: "retracted", rows: one({}, { status: "Retracted" }), severity: "error" },
      { why: "false positive", rows: one({}, { status: "FALSE POSITIVE" }), severity: "error" },
      { why: "controversial by flag", rows: one({}, { status: "Confirmed", controversial: "1" }), severity: "warning" },
      { why: "candidate", rows: one({}, { status: "Candidate" }), severity: "info" },
    ],
    silent: [
      { why: "confirmed", rows: one({}, { status: "Confirmed", controversial: "0" }) },
      { why: "nothing said", rows: one({}) },
    ],
  },
  {
    rule: "empty-name",
    fires: [{ why: "blank", rows: one({}, { name: "  " }), severity: "warning" }],
    silent: [{ why: "named", rows: one({}, { name: "Ostara 1 b" }) }],
  },
  {
    rule: "duplicate-name",
    fires: [
      { why: "spelled alike", rows: named("Ostara-01_b", "Ostara 1b"), severity: "warning" },
      { why: "publications", rows: publications(1, 2), severity: "info" },
    ],
    silent: [
      { why: "different letters", rows: named("Ostara 1 b", "Ostara 1 c") },
      { why: "no names", rows: named("", "") },
    ],
  },
  {
    rule: "colliding-name",
    fires: [{ why: "star and planet", rows: named("Ostara 1 B", "Ostara 1 b"), severity: "warning" }],
    silent: [{ why: "the same case", rows: named("Ostara 1 b", "Ostara-1 b") }],
  },
  {
    rule: "outlying-publication",
    fires: [
      { why: "3 against 2", rows: publications([3, 0.1], [2, 0.1], [2.05, 0.1], [1.98, 0.1]), severity: "warning" },
    ],
    silent: [
      { why: "agreement", rows: publications([2.1, 0.1], [2, 0.1], [2.05, 0.1]) },
      { why: "two only", rows: publications([3, 0.1], [2, 0.1]) },
      { why: "two with errors", rows: publications([3, 0.1], [2, 0.1], 2) },
      { why: "no error", rows: publications(3, [2, 0.1], [2.05, 0.1], [1.98, 0.1]) },
    ],
  },
];
