import * as z from "zod";
import { meltingCurves } from "../eos/melting/meltingCurves.ts";
import { strictObject } from "./strictObject.ts";

const positive = z.number().positive();
const fraction = z.number().min(0).lt(1);

/** How the Grüneisen parameter follows volume. */
const gruneisenSchema = z.discriminatedUnion("law", [
  strictObject({ law: z.literal("finite-strain"), gammaZero: positive, qZero: z.number() }),
  strictObject({ law: z.literal("power"), gammaZero: positive, q: z.number() }),
  strictObject({ law: z.literal("altshuler"), gammaZero: positive, gammaInfinity: positive, beta: positive }),
]);

/** A part of the heat quadratic in temperature: c_V = coefficient (V/V0)^exponent T. */
const quadraticSchema = strictObject({ coefficientJKgK2: positive, exponent: z.number() });

/**
 * What makes a curve warm. On an isotherm: lattice vibrations, and the corrections that metals need. On the isentrope
 * of a liquid metal, which must be a Birch–Murnaghan form of order 4: γ = γ0 + γ' (ρ/ρ0)^n (E - E0).
 */
export const thermalSchema = z.discriminatedUnion("reference", [
  strictObject({
    reference: z.literal("isotherm"),
    temperatureK: positive,
    formula: z.string().min(1),
    debyeTemperatureK: positive,
    gruneisen: gruneisenSchema,
    anharmonic: quadraticSchema.optional(),
    electronic: quadraticSchema.optional(),
  }),
  strictObject({
    reference: z.literal("isentrope"),
    temperatureZeroK: positive,
    gammaZero: positive,
    gammaPerEnergyKgJ: z.number(),
    gammaExponent: z.number(),
    heatCapacityJKgK: positive,
  }),
]);

/** Light elements of a metal: mass fractions of the whole, or a plain deficit of density. */
export const alloySchema = z.union([
  strictObject({
    nickel: fraction.optional(),
    sulphur: fraction.optional(),
    silicon: fraction.optional(),
    oxygen: fraction.optional(),
  }),
  strictObject({ densityDeficit: fraction, derivedFromPrem: z.boolean() }),
]);

const curveNames = Object.values(meltingCurves).map(({ name }) => name) as [string, ...string[]];

/** A liquid phase ends where it freezes: a published curve, lowered by what is dissolved in it. */
export const freezingSchema = strictObject({
  curve: z.enum(curveNames),
  ironMoleFraction: z.number().gt(0).max(1).optional(),
});

/** Rock by the numbers of atoms of its mantle. */
export const mantleSchema = strictObject({ magnesiumToSilicon: positive, ironNumber: fraction });

export type ThermalKeys = z.output<typeof thermalSchema>;
export type GruneisenKeys = z.output<typeof gruneisenSchema>;
export type AlloyKeys = z.output<typeof alloySchema>;
export type FreezingKeys = z.output<typeof freezingSchema>;
