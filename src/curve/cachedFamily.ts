import { type Material, phaseAt } from "../eos/material.ts";
import { type Family, familyMember } from "../library/family.ts";
import { decodeFamily, encodeFamily } from "./familyBytes.ts";
import type { MassRange } from "./radiusCurve.ts";
import { type LatticeOptions, type SolvedFamily, solveFamily } from "./solveFamily.ts";
import { sweepMasses } from "./sweep.ts";

/** Keeps bytes under a key between runs. What is read is checked; a cache may lose or spoil anything. */
export interface ByteCache {
  read(key: string): Promise<Uint8Array | undefined>;
  write(key: string, bytes: Uint8Array): Promise<void>;
}

/** To be raised whenever the same materials and recipe would give other radii, or the bytes another form. */
const CODE_VERSION = 1;
/** Of an integration step: radii are then met to some 1e-7, well below what interpolation loses. */
const STEP_TOLERANCE = 1e-7;
/** Densities by which a phase is told from any other. */
const PROBES = 24;

export interface CachedFamilyOptions extends LatticeOptions {
  readonly cache?: ByteCache;
  /** Told in words when an entry of the cache is spoilt. */
  readonly note?: (text: string) => void;
}

/**
 * The solved lattice of a family, from the cache if it holds it. The key is a hash of all that shaped it: densities of
 * the materials over their phases, recipe, range, lattice, tolerance of the solver and version of the code.
 * Checked test/curve/cachedFamily.test.ts
 */
export async function solvedFamily(
  family: Family,
  range: MassRange,
  { cache, note, ...lattice }: CachedFamilyOptions = {},
): Promise<SolvedFamily> {
  const solve = () =>
    solveFamily(
      (fractions) => (masses) =>
        Array.from(
          sweepMasses(familyMember(family, fractions), masses, { tolerance: STEP_TOLERANCE }),
          ({ planet }) => planet?.radius,
        ),
      family.components.length,
      range,
      lattice,
    );
  if (cache === undefined) return solve();
  const key = await hashed(new TextEncoder().encode(description(family, range, lattice)));
  const bytes = await cache.read(key);
  const found = bytes && (await decodeFamily(bytes));
  if (found) return found;
  if (bytes) note?.(`the cached radii of the family "${family.name}" are damaged; they are solved again`);
  const solved = solve();
  await cache.write(key, await encodeFamily(solved));
  return solved;
}

function description({ components }: Family, range: MassRange, lattice: LatticeOptions): string {
  const parts = components.map(({ composition: { surface, layers } }) => ({
    surface: surface.pressurePa,
    layers: layers.map(({ massFraction, material }) => ({
      massFraction,
      phases: material.phases.map(probes(material)),
    })),
  }));
  return JSON.stringify({ CODE_VERSION, STEP_TOLERANCE, range, lattice, parts });
}

/** A phase by its limits and the densities between them: whatever its form, no two alike give other planets. */
const probes =
  (material: Material) =>
  ({ fromPressure, untilPressure, curve }: Material["phases"][number]) => {
    const from = Math.max(fromPressure, 1e6);
    const to = Math.min(untilPressure, 1e17, curve.maxPressure);
    const densities = Array.from({ length: PROBES }, (_, i) => {
      const pressure = from * (to / from) ** ((i + 0.5) / PROBES);
      const phase = phaseAt(material, pressure);
      return phase.curve.density(phase.curve.invert(pressure));
    });
    return { fromPressure, untilPressure, densities };
  };

/** SHA-256, hexadecimal. */
async function hashed(bytes: Uint8Array<ArrayBuffer>): Promise<string> {
  const digest = new Uint8Array(await crypto.subtle.digest("SHA-256", bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, "0")).join("");
}
