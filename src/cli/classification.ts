import { setImmediate } from "node:timers/promises";
import { classifier } from "../inference/classifier.ts";
import { buildClassifierModels, standardFamilies } from "../inference/classifierModels.ts";
import type { Composition } from "../library/composition.ts";
import type { Library } from "../library/library.ts";
import type { PlanetRow } from "../planets/quantity.ts";
import type { ClassifiedRow } from "./classifyTable.ts";
import type { FamilyResult } from "./familyInference.ts";
import { interruptible } from "./interruptible.ts";
import type { Progress } from "./progress.ts";

/** Names of the compositions between the classes, densest first. */
export type BoundaryNames = readonly [string, string, string];

export const defaultBoundaries: BoundaryNames = ["iron", "silicate", "water"];
const interiorUnderWater = "earth-like";

/** What planets are compared with. */
export interface Comparison {
  readonly boundaryNames: BoundaryNames;
  readonly iron: Composition;
  readonly silicate: Composition;
  readonly water: Composition;
  /** The interior under the water. */
  readonly earthLike: Composition;
}

export function comparisonWith(boundaryNames: BoundaryNames, library: Library): Comparison {
  const [iron, silicate, water] = boundaryNames.map((name) => library.composition(name));
  return { boundaryNames, iron, silicate, water, earthLike: library.composition(interiorUnderWater) };
}

/** Of rising radius, as a figure shows them. */
export function comparedCompositions({ iron, earthLike, silicate, water }: Comparison): Composition[] {
  return [iron, earthLike, silicate, water];
}

/** Classifies every row, in order. */
export async function classifyRows(
  rows: readonly PlanetRow[],
  { boundaryNames, ...compositions }: Comparison,
  progress: Progress,
  inferFamilies?: (row: PlanetRow, index: number) => readonly FamilyResult[],
): Promise<ClassifiedRow[]> {
  await setImmediate(); // shows the bar before the models are solved
  const models = buildClassifierModels({ ...compositions, ...standardFamilies(compositions), labels: boundaryNames });
  const { classify } = classifier(models);
  const classified: ClassifiedRow[] = [];
  for await (const row of interruptible(rows)) {
    const families = inferFamilies?.(row, classified.length);
    classified.push({ row, result: classify(row), ...(families && { families }) });
    progress.advanceTo(classified.length);
  }
  return classified;
}
