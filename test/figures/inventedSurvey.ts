import type { Estimate, FigurePlanet } from "../../src/figures/figureSpec.ts";
import { twoReadingsWarning } from "../../src/figures/massRadiusFigure.ts";
import type { CurveInput, MassRadiusInput } from "../../src/figures/massRadiusInput.ts";

/**
 * An invented survey for tests of the page: power-law stand-ins for curves and planets placed by hand around them.
 * Nothing here is physics.
 */
const masses = Array.from({ length: 60 }, (_, i) => 0.1 * 200 ** (i / 59));

function curve(
  composition: string,
  title: string,
  scale: number,
  beyond: number,
  layers: CurveInput["layers"],
): CurveInput {
  const points = masses.map((massEarth) => ({
    massEarth: Number(massEarth.toPrecision(6)),
    radiusEarth: Number((scale * massEarth ** (0.29 - 0.02 * Math.log10(massEarth))).toPrecision(6)),
    extrapolatedLayers: massEarth > beyond ? ["core"] : [],
  }));
  return { composition, title, layers, points };
}

const curves: CurveInput[] = [
  curve("iron", "Pure iron", 0.77, 4, [{ name: "iron-vinet", massFraction: 1 }]),
  curve("earth-like", "Earth-like: 32.5 % iron core, 67.5 % silicate mantle", 0.985, 6, [
    { name: "iron-vinet", massFraction: 0.325 },
    { name: "silicate", massFraction: 0.675 },
  ]),
  curve("silicate", "Pure silicate", 1.06, 9, [{ name: "silicate", massFraction: 1 }]),
  curve("earth-like-50-water", "Half water: 50 % water on an Earth-like interior", 1.25, 12, [
    { name: "iron-vinet", massFraction: 0.1625 },
    { name: "silicate", massFraction: 0.3375 },
    { name: "water", massFraction: 0.5 },
  ]),
  curve("water", "Pure water", 1.41, 8, [{ name: "water", massFraction: 1 }]),
];

export const verdicts = [
  "denser than pure iron",
  "between iron and silicate",
  "between silicate and water",
  "less dense than water",
  "undecided",
];

/** mass, its errors, radius, its errors, verdict. */
const rows: [string, Estimate | null, Estimate | null, number | null, string | null][] = [
  ["Amber b", e(0.42, 0.05, 0.05), e(0.54, 0.02, 0.02), 0, null],
  ["Basalt b", e(0.69, 0.02, 0.02), e(0.92, 0.012, 0.012), 1, null],
  ["Basalt c", e(1.37, 0.07, 0.07), e(1.116, 0.014, 0.012), 1, null],
  ["Basalt d", e(1.31, 0.06, 0.06), e(1.097, 0.012, 0.014), 1, null],
  ["Cobalt b", e(5.6, 0.19, 0.19), e(1.73, 0.025, 0.025), 2, null],
  ["Cobalt c", e(7.1, 1.2, 1.9), e(2.02, 0.09, 0.07), 2, null],
  ["Dune b", e(2.1, 0.4, 0.3), e(1.05, 0.04, 0.04), 4, null],
  ["Ember b", e(9.4, 0.6, 0.7), e(1.62, 0.05, 0.05), 1, null],
  ["Ember c", e(12.8, 1.9, 1.6), e(2.55, 0.12, 0.1), 2, null],
  ["Flint b", e(4.1, 1.1, 1.2), e(2.62, 0.08, 0.08), 3, null],
  ["Garnet b", e(14.2, 2.2, 2.2), e(3.9, 0.15, 0.2), 3, null],
  ["Garnet c", e(6.3, 1.4, 1.5), e(2.4, 0.07, 0.07), 3, null],
  ["Heron b", e(3.3, 0.9, 0.8), e(1.35, 0.06, 0.06), 4, null],
  ["Iris b", e(1.9, 0.25, 0.25), e(1.2, 0.03, 0.03), 1, null],
  ["Juniper b", e(8.6, 0.8, 0.8), e(2.31, 0.06, 0.06), 2, null],
  ["Kelp b", e(17.2, 1.5, 1.4), e(3.1, 0.1, 0.1), 3, null],
  ["Lichen b", e(0.31, 0.12, 0.2), e(0.75, 0.04, 0.04), 4, null],
  ["Marl b", e(2.6, 0.3, 0.3), e(1.48, 0.04, 0.05), 2, null],
  ["Nettle b", e(4.9, 0.5, 0.5), e(1.5, 0.03, 0.03), 1, null],
  ["Opal b", e(3.9, 0.4, 0.4), e(1.88, 0.06, 0.06), 2, null],
  ["Pumice b", e(10.4, 3.1, 3.4), e(2.1, 0.1, 0.1), 4, null],
  ["Quill b", e(0.17, 0.03, 0.03), e(0.58, 0.02, 0.02), 1, null],
  ["Rill b", e(6.9, 0.5, 0.5), e(1.36, 0.03, 0.03), 0, null],
  ["Sable b", e(1.0, 0.2, 0.2), e(1.7, 0.08, 0.08), 3, null],
  ["Tarn b", e(2.2, 0.7, 0.6), e(2.05, 0.1, 0.1), 3, null],
  ["Umber b", e(5.1, 0.3, 0.3), e(1.6, 0.04, 0.04), 1, null],
  ["Vale b", e(4.4, null, null), e(1.52, 0.04, 0.04), null, "mass has no error"],
  ["Wren b", null, e(2.2, 0.1, 0.1), null, "no mass"],
  ["Xenon b", null, e(1.3, 0.1, 0.1), null, "mass is computed from the radius by a relation"],
  ["Yarrow b", e(3.2, 0.4, 0.4), null, null, "no radius"],
];

function e(value: number, minus: number | null, plus: number | null): Estimate {
  return { value, minus, plus };
}

const planets: FigurePlanet[] = rows.map(([name, mass, radius, verdict, reason], i) => ({
  name,
  mass: reason === "mass has no error" ? null : mass,
  radius,
  verdict: verdict === null ? null : (verdicts[verdict] as string),
  statement: verdict === null ? null : `${verdicts[verdict]} (p = 0.94)`,
  reason,
  note: name === "Cobalt c" ? "radius from two transits only" : null,
  values:
    verdict === null
      ? [null, null, null, null, null]
      : [
          ...[0, 1, 2, 3].map((k) => (k === verdict ? 0.94 : 0.02)),
          verdict === 1 ? e(0.3 + 0.01 * i, 0.08, 0.09) : null,
        ],
}));

export const inventedSurvey: MassRadiusInput = {
  title: "Mass–radius diagram of an invented survey",
  curves,
  planets,
  columns: [
    { title: "P(denser than iron)" },
    { title: "P(iron–silicate)" },
    { title: "P(silicate–water)" },
    { title: "P(lighter than water)" },
    { title: "Core mass fraction" },
  ],
  verdicts,
  sources: [
    {
      subject: "iron-vinet, hcp",
      citation: "An invented reference 2001, Journal of Nothing 1, 2",
      doi: "10.1234/nothing.5",
      note: "from memory",
    },
    { subject: "silicate, perovskite", citation: "An invented reference 2002, Journal of Nothing 2, 3" },
    {
      subject: "water, ice VII",
      citation: "An invented reference 2003, Journal of Nothing 3, 4",
      doi: "10.1234/nothing.6",
    },
  ],
  warnings: [twoReadingsWarning("Earth-like", "Pure silicate")],
  earthRadiusKm: 6378.1,
  version: "0.1.0",
  command: "bulkwright classify survey.csv --compositions iron,silicate,water --html output/survey.html",
};

/** Planet names that try to be markup, script, entities, TeX, colours or other people's text direction. */
export const hostileNames = [
  "<b>x</b>",
  "</script><script>alert(1)</script>",
  '<img src=x onerror="alert(1)">',
  "$\\alpha$ b",
  "&amp; &lt;br&gt; &#60;",
  '<a href="https://example.org">x</a>',
  "%{x} %{customdata}",
  "var(--ink)",
  "<!-- x",
  "line\u2028separator",
  "right\u202Eleft",
  "\"' onmouseover='alert(1)",
  "a<br>b",
  "\\u003cb\\u003e",
];

/** The survey with every text that a user's files can hold replaced by hostile ones. */
export const hostileSurvey: MassRadiusInput = {
  ...inventedSurvey,
  title: `Survey ${hostileNames[1]}`,
  planets: inventedSurvey.planets.map((planet, i) => {
    const name = hostileNames[i % hostileNames.length] as string;
    return { ...planet, name, note: name, reason: planet.reason && name };
  }),
  curves: inventedSurvey.curves.map((curve, i) => ({
    ...curve,
    composition: hostileNames[i] as string,
    title: `${hostileNames[i]}`,
    layers: curve.layers.map((layer) => ({ ...layer, name: hostileNames[i] as string })),
  })),
  sources: hostileNames.map((name) => ({ subject: name, citation: name, doi: name, note: name })),
  warnings: [...hostileNames],
  command: hostileNames.join(" "),
};
