import type { Material } from "../eos/material.ts";
import { InputError } from "../errors.ts";
import { buildMaterial } from "./buildMaterial.ts";
import type { Composition } from "./composition.ts";
import type { Family, FamilyComponent } from "./family.ts";
import { type FamilyFile, familySchema } from "./familySchema.ts";
import { inFile, unknownName } from "./libraryErrors.ts";
import { type Entry, type EntryKind, entryOf, isJson, type LibraryFile, siblingPath } from "./libraryFiles.ts";
import { readDensityTable } from "./readDensityTable.ts";
import { resolveLayers } from "./resolveLayers.ts";
import { type CompositionFile, compositionSchema, type MaterialFile, materialSchema } from "./schemas.ts";
import { validate } from "./validate.ts";

/** A surface at vacuum and room temperature, where a composition file does not give its own. */
const DEFAULT_SURFACE = { pressurePa: 0, temperatureK: 300 };

/** Compositions and materials by name. Each is read, checked and built when first asked for. */
export interface Library {
  readonly compositions: readonly Entry[];
  readonly materials: readonly Entry[];
  readonly families: readonly Entry[];
  /** What a user should know, e.g. that a file of theirs took the place of a shipped one. */
  readonly notes: readonly string[];
  /**
   * The composition of that name, or a planet of the material of that name alone.
   * Throws InputError `unknown-composition`, `composition-cycle`, or any error of the files it is made from.
   */
  composition(name: string): Composition;
  /** Throws InputError `unknown-family`, or any error of the files it is made from. */
  family(name: string): Family;
  /** Throws InputError `unknown-material`, or any error of its file. */
  material(name: string): Material;
  /** The form of every phase with its keys, as in the material's file. Throws like `material`. */
  formKeys(name: string): readonly Readonly<Record<string, number | string>>[];
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

  composition(name: string): Composition {
    return this.resolve(name, []);
  }

  material(name: string): Material {
    const known = this.builtMaterials.get(name);
    if (known !== undefined) return known;
    const file = this.materialFile(name);
    const { path } = this.entry("material", name);
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

  formKeys(name: string): readonly Readonly<Record<string, number | string>>[] {
    return this.materialFile(name).phases.map(({ eos }) => eos);
  }

  private component({ name, material, composition }: FamilyFile["components"][number]): FamilyComponent {
    if (composition !== undefined) return { name, composition: this.composition(composition) };
    return { name, composition: planetOf(this.material(material as string)) };
  }

  private materialFile(name: string): MaterialFile {
    const entry = this.entry("material", name);
    const { value, problems } = validate(materialSchema, entry.path, entry.content);
    if (problems) throw problems[0];
    return value;
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
  private resolve(name: string, above: readonly string[]): Composition {
    const known = this.builtCompositions.get(name);
    if (known !== undefined) return known;
    const entry = this.entries.composition.get(name);
    const composition = entry === undefined ? this.pure(name) : this.resolveEntry(entry, above);
    this.builtCompositions.set(name, composition);
    return composition;
  }

  private pure(name: string): Composition {
    if (!this.entries.material.has(name)) {
      throw unknownName("composition", name, [...this.entries.composition.keys(), ...this.entries.material.keys()]);
    }
    return planetOf(this.material(name));
  }

  private resolveEntry({ name, path, content }: Entry, above: readonly string[]): Composition {
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
    const layers = resolveLayers(file, {
      material: (wanted, key) => inFile(path, () => this.material(wanted), key),
      composition: (wanted, key) => inFile(path, () => this.resolve(wanted, chain), key),
    });
    return compositionOf(file, layers);
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
  return { name, title, ...(source && { source }), surface, layers };
}
