import * as z from "zod";
import { eosSchema, FORMS_WITHOUT_CALIBRATION } from "./forms.ts";
import { nameSchema as name, textSchema as text } from "./names.ts";
import { strictObject } from "./strictObject.ts";
import { alloySchema, freezingSchema, mantleSchema, thermalSchema } from "./thermalSchemas.ts";

/** Sums of mass fractions may miss 1 by this much, e.g. thirds written with ten digits. */
const SUM_TOLERANCE = 1e-9;

const fraction = z.number().min(0).max(1);
const sourceSchema = strictObject({ citation: text, doi: text.optional(), note: text.optional() });

const phaseSchema = strictObject({
  phase: text,
  eos: eosSchema,
  untilGPa: z.number().positive().optional(),
  untilCrossing: z.literal(true).optional(),
  untilFreezing: freezingSchema.optional(),
  clapeyron: strictObject({ atTemperatureK: z.number().positive(), slopeMPaPerK: z.number() }).optional(),
  thermal: thermalSchema.optional(),
  alloy: alloySchema.optional(),
  calibratedToGPa: z.number().positive().optional(),
  source: sourceSchema,
}).check(({ value, issues }) => {
  if (value.calibratedToGPa !== undefined || FORMS_WITHOUT_CALIBRATION.includes(value.eos.form)) return;
  const message = 'missing "calibratedToGPa": the pressure where the data behind the parameters end.';
  issues.push({ code: "custom", input: value, message, path: [] });
});

/**
 * A material file: phases by rising pressure, each but the last with an end; or rock by its atoms, whose minerals
 * follow; or water. With `thermal` in one phase all need it, as temperature must go on through the stack.
 */
export const materialSchema = strictObject({
  $schema: z.string().optional(),
  material: name,
  title: text,
  phases: z.array(phaseSchema).min(1).optional(),
  mantle: mantleSchema.optional(),
  water: z.literal(true).optional(),
  alternatives: z.array(name).min(1).optional(),
  source: sourceSchema.optional(),
}).check(({ value: { phases, mantle, water }, issues }) => {
  if ([phases, mantle, water].filter((given) => given !== undefined).length !== 1) {
    const message = 'a material has exactly one of "phases", "mantle" and "water".';
    issues.push({ code: "custom", input: phases, message, path: [] });
  }
  phases?.forEach((phase, i) => {
    const { untilGPa, untilCrossing, untilFreezing, thermal, alloy, clapeyron } = phase;
    const refuse = (message: string) => issues.push({ code: "custom", input: phase, message, path: ["phases", i] });
    const ends = [untilGPa, untilCrossing, untilFreezing].filter((end) => end !== undefined).length;
    const last = i === phases.length - 1;
    if (last && ends !== 0) refuse("the last phase has no end: leave the keys that begin with `until` out.");
    if (!last && ends !== 1) {
      refuse('give this phase one end, "untilGPa", "untilCrossing": true or "untilFreezing", as another follows.');
    }
    if ((thermal === undefined) !== (phases[0].thermal === undefined)) {
      refuse('either every phase of a material has "thermal" or none.');
    }
    if (thermal === undefined && (alloy ?? clapeyron ?? untilFreezing) !== undefined) {
      refuse('"alloy", "clapeyron" and "untilFreezing" need "thermal" beside them.');
    }
    if (clapeyron !== undefined && untilGPa === undefined) refuse('"clapeyron" tilts the end given by "untilGPa".');
    if (thermal !== undefined && untilCrossing) refuse('a phase with "thermal" cannot end by "untilCrossing".');
  });
});

export type PhaseEntry = z.output<typeof phaseSchema>;

const partSchema = strictObject({ material: name, massFraction: fraction });

const layerSchema = strictObject({
  material: name.optional(),
  mixture: z.array(partSchema).min(1).optional(),
  composition: name.optional(),
  massFraction: fraction,
  temperatureJumpK: z.number().nonnegative().optional(),
  topTemperatureK: z.number().positive().optional(),
})
  .check(({ value, issues }) => {
    const { material, mixture, composition, temperatureJumpK, topTemperatureK } = value;
    if (temperatureJumpK !== undefined && topTemperatureK !== undefined) {
      const message = 'give "temperatureJumpK" or "topTemperatureK", not both.';
      issues.push({ code: "custom", input: value, message, path: [] });
    }
    if ([material, mixture, composition].filter((given) => given !== undefined).length !== 1) {
      const message = 'a layer has exactly one of "material", "mixture" and "composition".';
      issues.push({ code: "custom", input: value, message, path: [] });
    }
    if (mixture !== undefined) issues.push(...sumIssue(mixture, ["mixture"]));
  })
  .meta({ oneOf: [{ required: ["material"] }, { required: ["mixture"] }, { required: ["composition"] }] });

/** Temperature from the surface down; without it a planet is cold. */
const temperatureSchema = z.discriminatedUnion("mode", [
  strictObject({ mode: z.literal("isothermal"), temperatureK: z.number().positive() }),
  strictObject({ mode: z.literal("adiabatic"), potentialTemperatureK: z.number().positive() }),
  strictObject({
    mode: z.literal("table"),
    pressureGPa: z.array(z.number().nonnegative()).min(2),
    temperatureK: z.array(z.number().positive()).min(2),
  }),
]);

/** Gas around the layers, which share the rest of the mass; flux and age may be given with the run instead. */
const envelopeSchema = strictObject({
  massFraction: z.number().gt(0).lt(1),
  fluxEarth: z.number().positive().optional(),
  ageGyr: z.number().positive().optional(),
  opacity: z.enum(["solar", "enhanced"]),
});

/** A composition file: layers from the centre outwards. */
export const compositionSchema = strictObject({
  $schema: z.string().optional(),
  composition: name,
  title: text,
  source: sourceSchema.optional(),
  surface: strictObject({ pressurePa: z.number().nonnegative(), temperatureK: z.number().positive() }).optional(),
  temperature: temperatureSchema.optional(),
  layers: z.array(layerSchema).min(1),
  envelope: envelopeSchema.optional(),
}).check(({ value: { layers }, issues }) => {
  issues.push(...sumIssue(layers, ["layers"]));
});

export type MaterialFile = z.output<typeof materialSchema>;
export type CompositionFile = z.output<typeof compositionSchema>;
export type EnvelopeEntry = z.output<typeof envelopeSchema>;
export type PartEntry = z.output<typeof partSchema>;

function sumIssue(parts: readonly { massFraction: number }[], path: string[]): z.core.$ZodRawIssue[] {
  const sum = parts.reduce((total, { massFraction }) => total + massFraction, 0);
  if (Math.abs(sum - 1) <= SUM_TOLERANCE) return [];
  const message = `the mass fractions sum to ${Number(sum.toPrecision(12))}; they must sum to 1 within ${SUM_TOLERANCE}.`;
  return [{ code: "custom", input: parts, message, path, params: { code: "mass-fraction-sum" } }];
}
