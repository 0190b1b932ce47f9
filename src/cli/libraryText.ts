import type {
  CompositionDescription,
  LayerDescription,
  MaterialDescription,
  PhaseDescription,
} from "../library/describe.ts";
import type { JoinDescription } from "../library/describeJoins.ts";
import type { Parameters } from "../library/describeWarm.ts";
import type { Library } from "../library/library.ts";
import type { Entry } from "../library/libraryFiles.ts";
import { sourceText } from "./provenance.ts";

/** The names and titles of a library, for a person to read. */
export function listingText({ compositions, materials, families, notes }: Library): string {
  const width = Math.max(...[...compositions, ...materials, ...families].map(({ name }) => name.length));
  const lines = (entries: readonly Entry[]) => entries.map(({ name, title }) => `  ${name.padEnd(width)}  ${title}`);
  const sections = [
    ["compositions", ...lines(compositions)],
    ["materials", ...lines(materials)],
    ["families", ...lines(families)],
    ...(notes.length > 0 ? [notes.map((note) => `note: ${note}`)] : []),
  ];
  return joinSections(sections);
}

/** A composition with its materials, or a material, for a person to read. */
export function descriptionText(description: CompositionDescription | MaterialDescription): string {
  if (description.kind === "material") return joinSections([materialLines(description)]);
  const { name, title, source, surface, temperature, envelope, layers, materials } = description;
  const recipe = [
    `${name}: ${title}`,
    `  surface: ${surface.pressurePa} Pa, ${surface.temperatureK} K`,
    ...(temperature ? [`  temperature: ${temperature.mode}, ${temperature.topK} K at the surface`] : []),
    ...layers.map(layerLine),
    ...(envelope ? [`  envelope: ${keyValues(envelope)}`] : []),
    ...(source ? [`  source: ${sourceText(source)}`] : []),
  ];
  return joinSections([recipe, ...materials.map(materialLines)]);
}

function layerLine({ name, massFraction, heating }: LayerDescription, i: number): string {
  const fraction = `  layer ${i + 1} from the centre: ${name}, mass fraction ${digits(massFraction)}`;
  if (heating === undefined) return fraction;
  const top = "top" in heating ? `${heating.top} K at its top` : `${heating.jump} K warmer than the layer above`;
  return `${fraction}, ${top}`;
}

function materialLines(material: MaterialDescription): string[] {
  const { name, title, parameters, alternatives, source, temperatureK, phases, joins, densities } = material;
  return [
    `${name}: ${title}`,
    ...(Object.keys(parameters).length > 0 ? [`  ${keyValues(parameters)}`] : []),
    ...(source ? [`  source: ${sourceText(source)}`] : []),
    ...(alternatives.length > 0 ? [`  alternatives: ${alternatives.join(", ")}`] : []),
    ...(temperatureK === undefined
      ? []
      : [`  pressures and densities at ${digits(temperatureK)} K; a planet has its own temperatures`]),
    ...densities.map(
      ({ pressureGPa, densityKgM3 }) =>
        `  density at ${pressureGPa} GPa: ${densityKgM3 === undefined ? "none, outside the form's range" : `${digits(densityKgM3)} kg/m3`}`,
    ),
    ...phases.flatMap(phaseLines),
    ...joins.map(joinLine),
  ];
}

function phaseLines(phase: PhaseDescription): string[] {
  const { name, form, parameters, warmKeys = {}, minerals = [], source } = phase;
  return [
    `  phase ${name}: ${[form, keyValues(parameters)].filter(Boolean).join(", ")}`,
    ...Object.entries(warmKeys).map(([group, keys]) => `    ${group}: ${keyValues(keys)}`),
    ...minerals.map(
      (mineral) => `    ${percent(mineral.massFraction)} ${mineral.name} (${sourceText(mineral.source)})`,
    ),
    `    ${rangeText(phase)}`,
    `    source: ${sourceText(source)}`,
  ];
}

function rangeText({ fromGPa, untilGPa, calibratedToGPa, formEndsGPa }: PhaseDescription): string {
  if (fromGPa === undefined) return "not stable at this temperature";
  return [
    untilGPa === undefined ? `from ${digits(fromGPa)} GPa on` : `from ${digits(fromGPa)} to ${digits(untilGPa)} GPa`,
    ...(calibratedToGPa === undefined ? [] : [`data to ${digits(calibratedToGPa)} GPa`]),
    ...(formEndsGPa === undefined ? [] : [`the form ends at ${digits(formEndsGPa)} GPa`]),
  ].join(", ");
}

const keyValues = (keys: Parameters): string =>
  Object.entries(keys)
    .map(([key, value]) => `${key} ${value}`)
    .join(", ");

function joinLine(join: JoinDescription): string {
  const from = `  ${join.lower} to ${join.upper}`;
  switch (join.kind) {
    case "crossing":
      return `${from}: densities cross at ${digits(join.atGPa)} GPa`;
    case "transition":
      return `${from}: density steps by ${percent(join.step)} at ${digits(join.atGPa)} GPa`;
    case "bridge": {
      const steps = [join.stepAtFrom, join.stepAtUntil].map((step) =>
        step === undefined ? "no step known" : percent(step),
      );
      return `${from}: bridged from ${digits(join.fromGPa)} GPa (apart by ${steps[0]}) to ${digits(join.untilGPa)} GPa (${steps[1]})`;
    }
  }
}

function joinSections(sections: readonly (readonly string[])[]): string {
  return sections.map((lines) => `${lines.join("\n")}\n`).join("\n");
}

function digits(value: number): string {
  return String(Number(value.toPrecision(6)));
}

function percent(step: number): string {
  return `${Number((step * 100).toPrecision(3))} %`;
}
