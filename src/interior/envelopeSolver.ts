import { equilibriumTemperature, escapeParameter } from "../envelope/atmosphere.ts";
import { gasPlanetRadius } from "../envelope/gasPlanet.ts";
import type { EnvelopeConditions } from "../envelope/lopezFortney.ts";
import { highEnergyFlux, massLossTime } from "../envelope/massLoss.ts";
import { InputError } from "../errors.ts";
import type { Composition, GasEnvelope } from "../library/composition.ts";
import { G, GIGAYEAR } from "../units/constants.ts";
import type { Planet, SolidPlanet } from "./planet.ts";

/** Solves what lies under the gas. */
export interface SolidSolver {
  solve(mass: number, guess?: number): SolidPlanet;
}

/** Below this escape parameter gas flows away by itself: Fossati et al. 2017, see `escapeParameter`. */
const BOUND = 20;

/**
 * Planets with a gas envelope: the layers solved for their share of the mass, the published thickness of the gas added.
 * Nothing below knows of it.
 * Checked test/interior/envelopeSolver.test.ts
 */
export class EnvelopeSolver {
  private readonly solid: SolidSolver;
  private readonly massFraction: number;
  private readonly environment: Omit<EnvelopeConditions, "planetMass">;

  /** Throws InputError `envelope-conditions` where the composition leaves flux or age open. */
  constructor({ name, envelope }: Composition & { readonly envelope: GasEnvelope }, solid: SolidSolver) {
    const { massFraction, flux, age, opacity } = envelope;
    if (flux === undefined || age === undefined) {
      throw new InputError(
        "envelope-conditions",
        `${name}: the size of a gas envelope depends on the flux it receives and on its age; ` +
          `give ${flux === undefined ? '"fluxEarth"' : '"ageGyr"'} in the composition's "envelope", or with the run.`,
        { found: name },
      );
    }
    this.solid = solid;
    this.massFraction = massFraction;
    this.environment = { flux, age, opacity };
  }

  /** As StructureSolver.solve; also throws ModelRangeError `envelope-grid` outside the range of the scaling. */
  solve(mass: number, guess?: number): Planet {
    const { massFraction } = this;
    const conditions = { planetMass: mass, ...this.environment };
    const core = this.solid.solve((1 - massFraction) * mass, guess);
    const { convective, "with-atmosphere": radius } = gasPlanetRadius(massFraction, conditions, () => core.radius);
    const temperature = equilibriumTemperature(conditions.flux);
    const envelope = {
      ...{ massFraction, conditions, core, temperature },
      convectiveRadius: convective,
      escapeParameter: escapeParameter(mass, radius, temperature),
      massLossTime: massLossTime({
        ...{ mass, radius },
        envelopeMass: massFraction * mass,
        highEnergyFlux: highEnergyFlux(conditions.flux, conditions.age),
      }),
    };
    const { inertiaFactor: _, bindingEnergy: __, ...shared } = core;
    return {
      ...shared,
      ...{ mass, radius, envelope },
      surfaceGravity: (G * mass) / radius ** 2,
      bulkDensity: mass / ((4 / 3) * Math.PI * radius ** 3),
      radiusRelativeError: (core.radiusRelativeError * core.radius) / radius,
      notes: [...core.notes, ...survivalNotes(envelope)],
    };
  }
}

/** Why the envelope could not have lasted to its age, if so. */
function survivalNotes({ conditions, escapeParameter, massLossTime }: NonNullable<Planet["envelope"]>): string[] {
  const inGyr = (time: number): string => `${Number((time / GIGAYEAR).toPrecision(3))} Gyr`;
  return [
    ...(massLossTime < conditions.age
      ? [
          "the envelope could not survive: the star's high-energy light removes it in " +
            `${inGyr(massLossTime)} and its age is ${inGyr(conditions.age)}`,
        ]
      : []),
    ...(escapeParameter < BOUND
      ? [
          "the envelope could not survive: its gas flows away at its own temperature (escape parameter " +
            `${escapeParameter.toPrecision(3)} where ${BOUND} would hold it)`,
        ]
      : []),
  ];
}
