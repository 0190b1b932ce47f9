import type { Planet } from "../../src/interior/planet.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import type { Composition } from "../../src/library/composition.ts";
import { bodyMasses, icyMoonChecks, rockyBodyChecks } from "./bodies.ts";
import type { Check } from "./check.ts";
import { EARTH_GM, earthChecks } from "./earth.ts";
import { massOf, shipped } from "./model.ts";
import { relationChecks } from "./relations.ts";

export interface Validated {
  readonly name: string;
  readonly composition: Composition;
  readonly planet: Planet;
}

export interface ValidationRun {
  readonly checks: readonly Check[];
  /** Every body as its file has it. */
  readonly planets: readonly Validated[];
}

/** Everything that is compared with the Solar System and with published relations. */
export function validate(): ValidationRun {
  const masses: readonly (readonly [string, number])[] = [
    ["earth", EARTH_GM],
    ["earth-cosmochemical-core", EARTH_GM],
    ...bodyMasses,
  ];
  return {
    checks: [...earthChecks(), ...rockyBodyChecks(), ...icyMoonChecks(), ...relationChecks()],
    planets: masses.map(([name, massParameter]) => {
      const composition = shipped(name);
      return { name, composition, planet: solvePlanet(composition, massOf(massParameter)) };
    }),
  };
}
