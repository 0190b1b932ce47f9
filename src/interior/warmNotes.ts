import { phaseAt } from "../eos/material.ts";
import type { Layer } from "../library/composition.ts";
import { GPA } from "../units/constants.ts";
import type { Planet } from "./planet.ts";

/** Where a layer is compared with its melting curve. */
const SAMPLES = 200;

/** What a reader should know of a planet's temperatures. */
export function warmNotes(planet: Planet): string[] {
  const { layers } = planet.composition;
  return [
    ...missingJump(planet),
    ...layers.flatMap((layer, i) => cooler(planet, layer, i)),
    ...layers.flatMap((layer, i) => molten(planet, layer, i)),
  ];
}

/** A stated temperature suits one mass: in a heavier planet the layer above may come to end hotter. */
function cooler({ composition, boundaries }: Planet, { name, heating }: Layer, i: number): string[] {
  if (heating === undefined || !("top" in heating)) return [];
  const above = composition.layers[i + 1];
  const { pressure } = boundaries.filter(({ kind }) => kind === "layer")[i];
  const bottom = temperatureAt(above, pressure);
  if (bottom === undefined || bottom <= heating.top) return [];
  return [
    `${name} begins at ${heating.top} K, as stated, cooler than ${above.name} ends (${bottom.toFixed(0)} K): ` +
      'for this mass "temperatureJumpK" is the better key',
  ];
}

function temperatureAt({ material }: Layer, pressure: number): number | undefined {
  const { curve } = phaseAt(material, pressure);
  return curve.temperature?.(curve.coordinate(pressure));
}

/** A core as warm as the rock above it is what one gets by saying nothing, not what planets have. */
function missingJump({ composition, boundaries }: Planet): string[] {
  const [core, above] = composition.layers;
  if (composition.temperature?.mode.kind !== "adiabatic" || above === undefined || core.heating) return [];
  const top = boundaries.find(({ kind }) => kind === "layer");
  if (top?.temperature === undefined) return [];
  return [
    `${core.name} begins as warm as ${above.name} ends, at ${top.temperature.toFixed(0)} K: a jump of 0 K, as none is ` +
      "stated; the Earth's is some 1500 K",
  ];
}

/** Rock beyond its melting curve, and what it costs to go on with the solid. */
function molten({ centralPressure, boundaries }: Planet, layer: Layer, i: number): string[] {
  const { name, massFraction } = layer;
  const { melting } = layer.material;
  if (melting === undefined) return [];
  const tops = boundaries.filter(({ kind }) => kind !== "phase").map(({ pressure }) => pressure);
  const from = Math.max(tops[i], melting.fromPressure);
  const to = i === 0 ? centralPressure : tops[i - 1];
  if (!(to > from)) return [];
  const pressures = Array.from({ length: SAMPLES + 1 }, (_, k) => from + ((to - from) * k) / SAMPLES);
  const hot = pressures.filter((pressure) => (temperatureAt(layer, pressure) ?? 0) > melting.temperatureAt(pressure));
  if (hot.length === 0) return [];
  const [low, high] = [hot[0], hot[hot.length - 1]];
  const bound = (densityExcess(low) * massFraction * hot.length) / pressures.length / 3;
  return [
    `${name} is molten (above ${melting.curve}) from ${gigapascals(low)} to ${gigapascals(high)} GPa but taken as solid: ` +
      `its density there is ${percent(densityExcess(high))} to ${percent(densityExcess(low))} % too high, ` +
      `the radius up to ${percent(bound)} % too small`,
  ];
}

/**
 * How much denser solid than molten MgSiO3 is at its melting point: 20 % without pressure, 4 % at 136 GPa, falling
 * exponentially in between and beyond.
 * Source  Stixrude & Karki 2005, Science 310, 297 (from memory)
 */
function densityExcess(pressure: number): number {
  return 0.2 * 5 ** (-pressure / (136 * GPA));
}

const gigapascals = (pressure: number): string => (pressure / GPA).toPrecision(3);
const percent = (share: number): string => (100 * share).toPrecision(2);
