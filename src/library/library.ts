import type { Material } from "../eos/material.ts";
import { InputError } from "../errors.ts";
import { EARTH_FLUX, GIGAYEAR } from "../units/constants.ts";
import { buildMaterial } from "./buildMaterial.ts";
import type { Composition, GasEnvelope } from "./composition.ts";
import type { Family, FamilyComponent } from "./family.ts";
import { type FamilyFile, familySchema } from "./familySchema.ts";
import { inFile, unknownName } from "./libraryErrors.ts";
import { type Entry, type EntryKind, entryOf, isJson, type LibraryFile, siblingPath } from "./libraryFiles.ts";
import { materialEntry, materialFile } from "./materialFile.ts";
import { readDensityTable } from "./readDensityTable.ts";
import { type NameLookup, resolveLayers } from "./resolveLayers.ts";
import { resolveTemperature } from "./resolveTemperature.ts";
import { type CompositionFile, compositionSchema, type EnvelopeEntry } from "./schemas.ts";
import { validate } from "./validate.ts";

/** A surface at vacuum and room temperature, where a composition file does not give its own. */
const DEFAULT_SURFACE = { pressurePa: 0, temperatureK: 300 };

/** Names of materials by the names of those they replace. */
export type Substitutes = ReadonlyMap<string, string>;

const NO_SUBSTITUTES: Substitutes = new Map();

/** Compositions and materials by name. Each is read, checked and built when first asked for. */
export interface Library {
  readonly compositions: readonly Entry[];
  readonly materials: readonly Entry[];
  readonly families: readonly Entry[];
  /** What a user should know, e.g. that a file of theirs took the place of a shipped one. */
  readonly notes: readonly string[];
  /**
   * The composition of that name, or a planet of the material of that name alone; `substitutes` stand in for the
   * materials they are filed under.
   * Throws InputError `unknown-composition`, `composition-cycle`, or any error of the files it is made from.
   */
  composition(name: string, substitutes?: Substitutes): Composition;
  /** Throws InputError `unknown-family`, or any error of the files it is made from. */
  family(name: string): Family;
  /** Throws InputError `unknown-material`, or any error of its file. */
  material(name: string): Material;
}

/**
 * Reads a library from its files; of two that define the same name the later one counts, and a note says so.
 * Throws InputError `json-syntax` or `library-name` for a file that does not even say what it defines.
 */
export function loadLibrary(files: readonly LibraryFile[]): Library {
  return new FileLibrary(files);
}

class FileLibrary implements Library {
  readonly notes: string[] = [];
  private readonly files: ReadonlyMap<string, string>;
  private readonly entries = {
    composition: new Map<string, Entry>(),
    material: new Map<string, Entry>(),
    family: new Map<string, Entry>(),
  };
  private readonly builtCompositions = new Map<string, Composition>();
  private readonly builtMaterials = new Map<string, Material>();

  constructor(files: readonly LibraryFile[]) {
    this.files = new Map(files.map(({ path, text }) => [path, text]));
    for (const file of files.filter(isJson)) this.add(entryOf(file));
  }

  get compositions(): readonly Entry[] {
    return [...this.entries.composition.values()];
  }

  get materials(): readonly Entry[] {
    return [...this.entries.material.values()];
  }

  get families(): readonly Entry[] {
    return [...this.entries.family.values()];
  }

  composition(name: string, substitutes = NO_SUBSTITUTES): Composition {
    return this.resolve(name, [], substitutes);
  }

  material(name: string): Material {
    const known = this.builtMaterials.get(name);
    if (known !== undefined) return known;
    const { path } = materialEntry(this.materials, name);
    const file = materialFile(this.materials, name);
    const material = inFile(path, () => buildMaterial(file, (table) => this.table(path, table)));
    this.builtMaterials.set(name, material);
    return material;
  }

  family(name: string): Family {
    const { path, content } = this.entry("family", name);
    const { value: file, problems } = validate(familySchema, path, content);
    if (problems) throw problems[0];
    const components = file.components.map((component, k) =>
      inFile(path, () => this.component(component), `components[${k}]`),
    );
    return { name, title: file.title, components, prior: file.prior };
  }

  private component({ name, material, composition }: FamilyFile["components"][number]): FamilyComponent {
    if (composition !== undefined) return { name, composition: this.composition(composition) };
    return { name, composition: planetOf(this.material(material as string)) };
  }

  private add(entry: Entry): void {
    const entries = this.entries[entry.kind];
    const before = entries.get(entry.name);
    if (before !== undefined) {
      this.notes.push(`${entry.kind} "${entry.name}": ${entry.path} takes the place of ${before.path}`);
    }
    entries.set(entry.name, entry);
  }

  private entry(kind: EntryKind, name: string): Entry {
    const entry = this.entries[kind].get(name);
    if (entry !== undefined) return entry;
    throw unknownName(kind, name, [...this.entries[kind].keys()]);
  }

  /** `above` are the compositions being resolved that led here, outermost first. */
  private resolve(name: string, above: readonly string[], substitutes: Substitutes): Composition {
    const known = substitutes.size === 0 ? this.builtCompositions.get(name) : undefined;
    if (known !== undefined) return known;
    const entry = this.entries.composition.get(name);
    const composition =
      entry === undefined ? this.pure(name, substitutes) : this.resolveEntry(entry, above, substitutes);
    if (substitutes.size === 0) this.builtCompositions.set(name, composition);
    return composition;
  }

  private pure(name: string, substitutes: Substitutes): Composition {
    if (!this.entries.material.has(name)) {
      throw unknownName("composition", name, [...this.entries.composition.keys(), ...this.entries.material.keys()]);
    }
    return { ...planetOf(this.material(substitutes.get(name) ?? name)), name };
  }

  private resolveEntry(
    { name, path, content }: Entry,
    above: readonly string[],
    substitutes: Substitutes,
  ): Composition {
    const chain = [...above, name];
    if (above.includes(name)) {
      throw new InputError(
        "composition-cycle",
        `${path}: compositions refer to each other in a circle: ${chain.join(" → ")}; one of them must name materials only.`,
        { file: path, column: "layers", found: name },
      );
    }
    const { value: file, problems } = validate(compositionSchema, path, content);
    if (problems) throw problems[0];
    const lookup: NameLookup = {
      material: (wanted, key) => inFile(path, () => this.material(substitutes.get(wanted) ?? wanted), key),
      composition: (wanted, key) => inFile(path, () => this.resolve(wanted, chain, substitutes), key),
    };
    return inFile(path, () => compositionOf(file, resolveLayers(file, lookup)));
  }

  private table(materialPath: string, name: string): ReturnType<typeof readDensityTable> {
    const path = siblingPath(materialPath, name);
    const text = this.files.get(path);
    if (text !== undefined) return readDensityTable(path, text);
    throw new InputError("library-table", `the table "${name}" is not there; it was looked for as ${path}.`, {
      column: "file",
      found: name,
    });
  }
}

/** Of one material alone. */
function planetOf(material: Material): Composition {
  const { name, title } = material;
  return { name, title, surface: DEFAULT_SURFACE, layers: [{ name, material, massFraction: 1 }] };
}

function compositionOf(file: CompositionFile, layers: Composition["layers"]): Composition {
  const { composition: name, title, source, surface = DEFAULT_SURFACE } = file;
  const temperature = resolveTemperature(file.temperature, layers, surface.temperatureK);
  return {
    ...{ name, title, surface, layers },
    ...(source && { source }),
    ...(temperature && { temperature }),
    ...(file.envelope && { envelope: envelopeOf(file.envelope) }),
  };
}

function envelopeOf({ massFraction, fluxEarth, ageGyr, opacity }: EnvelopeEntry): GasEnvelope {
  return {
    massFraction,
    opacity,
    ...(fluxEarth !== undefined && { flux: fluxEarth * EARTH_FLUX }),
    ...(ageGyr !== undefined && { age: ageGyr * GIGAYEAR }),
  };
}
