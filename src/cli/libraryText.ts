import type { CompositionDescription, MaterialDescription, PhaseDescription } from "../library/describe.ts";
import type { JoinDescription } from "../library/describeJoins.ts";
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
  const { name, title, source, surface, layers, materials } = description;
  const recipe = [
    `${name}: ${title}`,
    `  surface: ${surface.pressurePa} Pa, ${surface.temperatureK} K`,
    ...layers.map(
      (layer, i) => `  layer ${i + 1} from the centre: ${layer.name}, mass fraction ${digits(layer.massFraction)}`,
    ),
    ...(source ? [`  source: ${sourceText(source)}`] : []),
  ];
  return joinSections([recipe, ...materials.map(materialLines)]);
}

function materialLines({ name, title, phases, joins, densities }: MaterialDescription): string[] {
  return [
    `${name}: ${title}`,
    ...densities.map(
      ({ pressureGPa, densityKgM3 }) =>
        `  density at ${pressureGPa} GPa: ${densityKgM3 === undefined ? "none, outside the form's range" : `${digits(densityKgM3)} kg/m3`}`,
    ),
    ...phases.flatMap(phaseLines),
    ...joins.map(joinLine),
  ];
}

function phaseLines(phase: PhaseDescription): string[] {
  const { name, form, parameters, fromGPa, untilGPa, calibratedToGPa, formEndsGPa, source } = phase;
  const values = Object.entries(parameters).map(([key, value]) => `${key} ${value}`);
  const range = [
    untilGPa === undefined ? `from ${digits(fromGPa)} GPa on` : `from ${digits(fromGPa)} to ${digits(untilGPa)} GPa`,
    ...(calibratedToGPa === undefined ? [] : [`data to ${digits(calibratedToGPa)} GPa`]),
    ...(formEndsGPa === undefined ? [] : [`the form ends at ${digits(formEndsGPa)} GPa`]),
  ];
  return [
    `  phase ${name}: ${[form, ...values].join(", ")}`,
    `    ${range.join(", ")}`,
    `    source: ${sourceText(source)}`,
  ];
}

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
