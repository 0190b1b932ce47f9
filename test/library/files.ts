import type { LibraryFile } from "../../src/library/libraryFiles.ts";

/** Invented library files for tests. */
const source = { citation: "invented" };

export const json = (path: string, content: unknown): LibraryFile => ({ path, text: JSON.stringify(content) });

/** A phase of constant density, the last of its material unless given an end. */
export const constantPhase = (phase: string, densityKgM3: number, end: object = {}): object => ({
  phase,
  eos: { form: "constant", densityKgM3 },
  calibratedToGPa: 10,
  source,
  ...end,
});

export const material = (name: string, phases: unknown = [constantPhase("solid", 3000)]): LibraryFile =>
  json(`mine/materials/${name}.json`, { material: name, title: `Title of ${name}`, phases });

/** A material of one phase with the given `eos`. */
export const withEos = (eos: unknown, rest: object = { calibratedToGPa: 10 }): LibraryFile =>
  material("m", [{ phase: "solid", eos, source, ...rest }]);

export const composition = (name: string, layers: unknown, rest: object = {}): LibraryFile =>
  json(`mine/${name}.json`, { composition: name, title: `Title of ${name}`, layers, ...rest });

export const layer = (name: string, massFraction: number): object => ({ material: name, massFraction });
