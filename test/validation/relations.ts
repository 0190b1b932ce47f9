import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import type { Composition } from "../../src/library/composition.ts";
import { constants, EARTH_MASS } from "../../src/units/constants.ts";
import type { Check } from "./check.ts";
import { massOf, shipped, withOutermost } from "./model.ts";

const EARTH_RADIUS = constants.earthMeanRadius.value;

const radiusOf = (composition: Composition, massEarth: number): number =>
  solvePlanet(composition, massEarth * EARTH_MASS).radius / EARTH_RADIUS;

/**
 * The Earth's materials at other masses. Its core stays as much hotter than its mantle as at one Earth mass: a fixed
 * temperature would come to lie below the mantle's in a heavier planet.
 */
function earthMaterials(coreMassFraction: number): Composition {
  const { layers, ...earth } = shipped("earth");
  const [core, mantle] = withOutermost({ ...earth, layers }, 1 - coreMassFraction).layers;
  return { ...earth, layers: [{ ...core, heating: { jump: 2008 } }, mantle] };
}

const zeng = (coreMassFraction: number, mass: number): number => (1.07 - 0.21 * coreMassFraction) * mass ** (1 / 3.7);

/** Fortney, Marley & Barnes 2007, equations 7 (ice and rock) and 8 (rock and iron): radius of a planet [Earth radii]. */
export function fortneyIceRock(iceMassFraction: number, mass: number): number {
  const log = Math.log10(mass);
  const f = iceMassFraction;
  return (0.0912 * f + 0.1603) * log ** 2 + (0.333 * f + 0.7387) * log + (0.4639 * f + 1.1193);
}

export function fortneyRockIron(rockMassFraction: number, mass: number): number {
  const log = Math.log10(mass);
  const f = rockMassFraction;
  return (0.0592 * f + 0.0975) * log ** 2 + (0.2337 * f + 0.4938) * log + (0.3102 * f + 0.7932);
}

export function relationChecks(): Check[] {
  return [...zengChecks(), ...exponentChecks(), ...fortneyChecks()];
}

function zengChecks(): Check[] {
  const source =
    "Zeng, Sasselov & Jacobsen 2016, Astrophys. J. 819, 127: R = (1.07 - 0.21 CMF) M^(1/3.7), R⊕ = 6371 km";
  return [0.2, 0.26, 0.325, 0.4].flatMap((fraction) =>
    [1, 2, 4, 8].map(
      (mass): Check => ({
        body: `Earth's materials, core ${fraction}`,
        quantity: `radius at ${mass} Earth masses`,
        unit: "Earth radii",
        computed: radiusOf(earthMaterials(fraction), mass),
        reference: zeng(fraction, mass),
        ...(mass <= 4 && { allowed: 0.01 }),
        independent: true,
        source: mass <= 4 ? source : `${source}; no bar beyond 4 Earth masses`,
      }),
    ),
  );
}

function exponentChecks(): Check[] {
  const exponent = (composition: Composition, from: number, to: number): number =>
    Math.log(radiusOf(composition, to) / radiusOf(composition, from)) / Math.log(to / from);
  const earth = earthMaterials(0.325);
  const sotin = "Sotin, Grasset & Mocquet 2007, Icarus 191, 337 (from memory)";
  const valencia = "Valencia, O'Connell & Sasselov 2006, Icarus 181, 545";
  const mercury = massOf(22031.8686) / EARTH_MASS;
  const iron =
    "iron extrapolated from 300 GPa to 4 TPa: other published equations of state are up to 4 % less dense at 1 TPa, which would raise the exponent";
  const row = (
    composition: Composition,
    range: readonly [number, number],
    reference: number,
    source: string,
    spread = 0,
  ): Check => ({
    body: composition.name === "earth" ? "Earth's materials" : composition.name,
    quantity: `exponent of the mass–radius relation, ${range[0].toPrecision(2)} to ${range[1].toPrecision(2)} Earth masses`,
    unit: "",
    computed: exponent(composition, ...range),
    reference,
    allowed: [Number((reference - spread - 0.01).toFixed(4)), Number((reference + spread + 0.01).toFixed(4))],
    independent: true,
    source,
  });
  return [
    row(earth, [0.01, 1], 0.306, sotin),
    { ...row(earth, [1, 10], 0.274, sotin), miss: { difference: 0.0467, reason: iron } },
    row(earth, [1, 10], 0.2695, `${valencia}: 0.267 to 0.272`, 0.0025),
    row(shipped("mercury"), [mercury, 10 * mercury], 0.3, `${valencia}: about 0.3 for one to ten Mercury masses`),
  ];
}

function fortneyChecks(): Check[] {
  const source = "Fortney, Marley & Barnes 2007, Astrophys. J. 659, 1661";
  const row = (body: string, quantity: string, computed: number, reference: number, equation: string): Check => ({
    body,
    quantity,
    unit: "Earth radii",
    computed,
    reference,
    independent: true,
    source: `${source}, ${equation}`,
  });
  const at = (name: string): number => radiusOf(shipped(name), 1);
  return [
    row(
      "equations of Fortney et al.",
      "pure rock at one Earth mass by equation 7, against equation 8",
      fortneyIceRock(0, 1),
      fortneyRockIron(1, 1),
      "which contradict each other here",
    ),
    row("silicate", "radius at one Earth mass", at("silicate"), fortneyRockIron(1, 1), "equation 8"),
    row("silicate", "radius at one Earth mass", at("silicate"), fortneyIceRock(0, 1), "equation 7"),
    row("iron", "radius at one Earth mass", at("iron"), fortneyRockIron(0, 1), "equation 8"),
    row("earth-like", "radius at one Earth mass", at("earth-like"), fortneyRockIron(0.675, 1), "equation 8"),
    row(
      "water",
      "radius at one Earth mass",
      at("water"),
      fortneyIceRock(1, 1),
      "equation 7, with a warmer and softer water",
    ),
  ];
}
