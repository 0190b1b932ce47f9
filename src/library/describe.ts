import { densityAt, type Material, type Phase, phaseAt, type Source, type TemperatureMode } from "../eos/material.ts";
import { ModelRangeError } from "../errors.ts";
import { EARTH_FLUX, GIGAYEAR, GPA } from "../units/constants.ts";
import type { Composition, GasEnvelope, Layer } from "./composition.ts";
import { describeJoins, type JoinDescription } from "./describeJoins.ts";
import { type MineralDescription, mineralsByPhase, type Parameters, warmKeys } from "./describeWarm.ts";
import type { Library } from "./library.ts";
import { materialFile } from "./materialFile.ts";
import type { EnvelopeEntry, PhaseEntry } from "./schemas.ts";

/** Pressures at which densities are given, so that materials can be compared at a glance. */
const SAMPLE_GPA = [0, 100, 1000];

/** One phase as a reader wants it; absent limits mean that there is none. */
export interface PhaseDescription {
  readonly name: string;
  readonly form: string;
  /** Keys of the form and their values, as in the material file. */
  readonly parameters: Parameters;
  /** What makes it warm, by groups of keys such as `thermal`, `gruneisen` or `alloy`. */
  readonly warmKeys?: Readonly<Record<string, Parameters>>;
  /** End members of the minerals it is made of. */
  readonly minerals?: readonly MineralDescription[];
  /** Absent where it is not stable at the temperature of the description. */
  readonly fromGPa?: number;
  readonly untilGPa?: number;
  readonly calibratedToGPa?: number;
  /** Where the form itself breaks. */
  readonly formEndsGPa?: number;
  readonly source: Source;
}

export interface MaterialDescription {
  readonly kind: "material";
  readonly name: string;
  readonly title: string;
  /** Of what the material is made as a whole, if its phases do not say. */
  readonly source?: Source;
  /** Keys that hold for the whole material. */
  readonly parameters: Parameters;
  /** Materials with other published sets for the same substance. */
  readonly alternatives: readonly string[];
  /** All pressures and densities below are at this temperature; absent where the material knows none. */
  readonly temperatureK?: number;
  readonly phases: readonly PhaseDescription[];
  readonly joins: readonly JoinDescription[];
  readonly densities: readonly SampledDensity[];
}

/** The density is absent where the material has none, outside the range of its form. */
export interface SampledDensity {
  readonly pressureGPa: number;
  readonly densityKgM3?: number;
}

export interface CompositionDescription {
  readonly kind: "composition";
  readonly name: string;
  readonly title: string;
  readonly source?: Source;
  readonly surface: Composition["surface"];
  /** How temperature goes on from the top of the outermost layer [K]; absent for a cold planet. */
  readonly temperature?: { readonly mode: TemperatureMode["kind"]; readonly topK: number };
  /** In the units of composition files. */
  readonly envelope?: EnvelopeEntry;
  /** Centre to surface, nested compositions expanded. */
  readonly layers: readonly LayerDescription[];
  /** Every material of the layers, once. */
  readonly materials: readonly MaterialDescription[];
}

export interface LayerDescription {
  readonly name: string;
  readonly title: string;
  readonly massFraction: number;
  /** How warm it begins [K], or how much warmer than the layer above ends. */
  readonly heating?: Layer["heating"];
}

/** All there is to say about a composition or, where no composition has the name, a material. Throws like `Library`. */
export function describe(library: Library, name: string): CompositionDescription | MaterialDescription {
  const isMaterial = library.materials.some((entry) => entry.name === name);
  const isComposition = library.compositions.some((entry) => entry.name === name);
  return isMaterial && !isComposition ? describeMaterial(library, name) : describeComposition(library, name);
}

function describeEnvelope({ massFraction, flux, age, opacity }: GasEnvelope): EnvelopeEntry {
  return {
    massFraction,
    opacity,
    ...(flux !== undefined && { fluxEarth: flux / EARTH_FLUX }),
    ...(age !== undefined && { ageGyr: age / GIGAYEAR }),
  };
}

export function describeComposition(library: Library, name: string): CompositionDescription {
  const { title, source, surface, temperature, envelope, layers } = library.composition(name);
  const materials = new Set(layers.flatMap(materialNames));
  return {
    kind: "composition",
    name,
    title,
    ...(source && { source }),
    surface,
    ...(temperature && { temperature: { mode: temperature.mode.kind, topK: temperature.top } }),
    ...(envelope && { envelope: describeEnvelope(envelope) }),
    layers: layers.map(({ name, material, massFraction, heating }) => ({
      ...{ name, title: material.title, massFraction },
      ...(heating && { heating }),
    })),
    materials: [...materials].map((material) => describeMaterial(library, material)),
  };
}

const materialNames = ({ material }: Layer): string[] =>
  material.phases[0].components?.map((part) => part.material) ?? [material.name];

export function describeMaterial(library: Library, name: string): MaterialDescription {
  const material = library.material(name);
  const { phases: entries = [], mantle, alternatives = [] } = materialFile(library.materials, name);
  const minerals = mantle && mineralsByPhase(mantle);
  const { source, phases, everyPhase = phases } = material;
  return {
    kind: "material",
    name,
    title: material.title,
    ...(source && { source }),
    parameters: mantle ?? {},
    alternatives,
    ...(material.warmed && { temperatureK: temperatureAt(material) }),
    phases: everyPhase.map((phase, i) => ({
      name: phase.name,
      form: phase.form,
      ...keysOf(entries[i]),
      ...(minerals && { minerals: minerals[i] }),
      ...limits(phases.find((stable) => stable.name === phase.name)),
      source: phase.source,
    })),
    joins: describeJoins(material.phases),
    densities: SAMPLE_GPA.map((pressureGPa) => sampleDensity(material, pressureGPa)),
  };
}

function keysOf(entry: PhaseEntry | undefined): Pick<PhaseDescription, "parameters" | "warmKeys"> {
  if (entry === undefined) return { parameters: {} };
  const { form: _, ...parameters } = entry.eos;
  return { parameters, ...(entry.thermal && { warmKeys: warmKeys(entry) }) };
}

function limits(phase: Phase | undefined): Partial<PhaseDescription> {
  if (phase === undefined) return {};
  return {
    fromGPa: phase.fromPressure / GPA,
    ...limit("untilGPa", phase.untilPressure),
    ...limit("calibratedToGPa", phase.calibratedTo),
    ...limit("formEndsGPa", phase.curve.maxPressure),
  };
}

function temperatureAt(material: Material): number | undefined {
  const { curve, fromPressure } = phaseAt(material, 0);
  return curve.temperature?.(curve.coordinate(fromPressure));
}

const limit = <Key extends string>(key: Key, pressure: number): Partial<Record<Key, number>> =>
  pressure === Number.POSITIVE_INFINITY ? {} : ({ [key]: pressure / GPA } as Record<Key, number>);

function sampleDensity(material: Material, pressureGPa: number): SampledDensity {
  try {
    return { pressureGPa, densityKgM3: densityAt(material, pressureGPa * GPA) };
  } catch (error) {
    if (error instanceof ModelRangeError) return { pressureGPa };
    throw error;
  }
}
