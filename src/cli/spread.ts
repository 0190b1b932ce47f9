import { ModelRangeError } from "../errors.ts";
import type { Planet } from "../interior/planet.ts";
import { type AlternativeComposition, alternativeCompositions } from "../library/alternatives.ts";
import type { Composition } from "../library/composition.ts";
import type { Library } from "../library/library.ts";
import type { ColumnGroup } from "./columnGroup.ts";
import type { Cell } from "./csv.ts";
import type { Curve } from "./massRadiusPage.ts";
import { sweepCurves } from "./sweepCurves.ts";

/** A planet made with one of the published sets for each material, or why there is none. */
interface Variant {
  readonly materials: string;
  readonly point: Curve["points"][number];
}

export interface Spread {
  readonly group: ColumnGroup;
  /** All that went into it. */
  readonly compositions: readonly Composition[];
  /** Which sets each composition was made with. */
  readonly notes: readonly string[];
}

const columns = [
  "radius_earth_spread_low",
  "radius_earth_spread_high",
  "spread_low_materials",
  "spread_high_materials",
];

/**
 * The range of radii over the published sets for each material: how far equations of state disagree. `adjust` is what
 * the run did to the compositions behind `curves`.
 */
export async function spreadOf(
  curves: readonly Curve[],
  massesEarth: readonly number[],
  { library, adjust, earthRadius }: { library: Library; adjust: (c: Composition) => Composition; earthRadius: number },
): Promise<Spread> {
  const variants = new Map<Planet, readonly Variant[]>();
  const used: Composition[] = [];
  const notes: string[] = [];
  for (const { composition, points } of curves) {
    const sets = alternativeCompositions(library, composition.name);
    notes.push(setsNote(composition.name, sets));
    if (sets.length === 1) continue;
    const compositions = sets.map((set) => adjust(set.composition));
    used.push(...compositions);
    const setCurves = await sweepCurves(compositions, massesEarth);
    points.forEach(({ planet }, i) => {
      if (planet === undefined) return;
      const made = sets.map(({ materials }, k) => ({ materials: materials.join(";"), point: setCurves[k].points[i] }));
      variants.set(planet, made);
    });
  }
  const group = { columns, cells: (planet: Planet) => spreadCells(variants.get(planet), earthRadius) };
  return { group, compositions: used, notes };
}

/** Throws ModelRangeError `spread-incomplete` where a set makes no planet: the range over the others would mislead. */
function spreadCells(variants: readonly Variant[] | undefined, earthRadius: number): Cell[] {
  if (variants === undefined) return [undefined, undefined, undefined, undefined];
  const radii = variants.map(({ materials, point: { mass, planet, error } }) => {
    if (planet) return { materials, radius: planet.radius / earthRadius };
    const message = `no spread, as there is no planet with ${materials}: ${error.message}`;
    throw new ModelRangeError("spread-incomplete", message, { quantity: "mass", value: mass });
  });
  const [low, ...others] = radii.sort((a, b) => a.radius - b.radius);
  const high = others[others.length - 1];
  return [low.radius, high.radius, low.materials, high.materials];
}

function setsNote(name: string, sets: readonly AlternativeComposition[]): string {
  if (sets.length === 1) return `${name}: its materials list no alternatives, so there is no spread`;
  return `spread of ${name} over ${sets.length} sets: ${sets.map(({ materials }) => materials.join(" with ")).join("; ")}`;
}
