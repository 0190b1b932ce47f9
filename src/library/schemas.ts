import * as z from "zod";
import { eosSchema, FORMS_WITHOUT_CALIBRATION } from "./forms.ts";
import { nameSchema as name, textSchema as text } from "./names.ts";
import { strictObject } from "./strictObject.ts";

/** Sums of mass fractions may miss 1 by this much, e.g. thirds written with ten digits. */
const SUM_TOLERANCE = 1e-9;

const fraction = z.number().min(0).max(1);
const sourceSchema = strictObject({ citation: text, doi: text.optional(), note: text.optional() });

const phaseSchema = strictObject({
  phase: text,
  eos: eosSchema,
  untilGPa: z.number().positive().optional(),
  untilCrossing: z.literal(true).optional(),
  calibratedToGPa: z.number().positive().optional(),
  source: sourceSchema,
}).check(({ value, issues }) => {
  if (value.calibratedToGPa !== undefined || FORMS_WITHOUT_CALIBRATION.includes(value.eos.form)) return;
  const message = 'missing "calibratedToGPa": the pressure where the data behind the parameters end.';
  issues.push({ code: "custom", input: value, message, path: [] });
});

/** A material file: phases by rising pressure, each but the last with an end. */
export const materialSchema = strictObject({
  $schema: z.string().optional(),
  material: name,
  title: text,
  phases: z.array(phaseSchema).min(1),
}).check(({ value: { phases }, issues }) => {
  phases.forEach((phase, i) => {
    const ends = Number(phase.untilGPa !== undefined) + Number(phase.untilCrossing === true);
    const last = i === phases.length - 1;
    if (ends === (last ? 0 : 1)) return;
    const message = last
      ? 'the last phase has no end: leave "untilGPa" and "untilCrossing" out.'
      : 'give this phase one end, "untilGPa" or "untilCrossing": true, as another follows.';
    issues.push({ code: "custom", input: phase, message, path: ["phases", i] });
  });
});

const partSchema = strictObject({ material: name, massFraction: fraction });

const layerSchema = strictObject({
  material: name.optional(),
  mixture: z.array(partSchema).min(1).optional(),
  composition: name.optional(),
  massFraction: fraction,
})
  .check(({ value, issues }) => {
    const { material, mixture, composition } = value;
    if ([material, mixture, composition].filter((given) => given !== undefined).length !== 1) {
      const message = 'a layer has exactly one of "material", "mixture" and "composition".';
      issues.push({ code: "custom", input: value, message, path: [] });
    }
    if (mixture !== undefined) issues.push(...sumIssue(mixture, ["mixture"]));
  })
  .meta({ oneOf: [{ required: ["material"] }, { required: ["mixture"] }, { required: ["composition"] }] });

/** A composition file: layers from the centre outwards. */
export const compositionSchema = strictObject({
  $schema: z.string().optional(),
  composition: name,
  title: text,
  source: sourceSchema.optional(),
  surface: strictObject({ pressurePa: z.number().nonnegative(), temperatureK: z.number().positive() }).optional(),
  layers: z.array(layerSchema).min(1),
}).check(({ value: { layers }, issues }) => {
  issues.push(...sumIssue(layers, ["layers"]));
});

export type MaterialFile = z.output<typeof materialSchema>;
export type CompositionFile = z.output<typeof compositionSchema>;
export type PartEntry = z.output<typeof partSchema>;

function sumIssue(parts: readonly { massFraction: number }[], path: string[]): z.core.$ZodRawIssue[] {
  const sum = parts.reduce((total, { massFraction }) => total + massFraction, 0);
  if (Math.abs(sum - 1) <= SUM_TOLERANCE) return [];
  const message = `the mass fractions sum to ${Number(sum.toPrecision(12))}; they must sum to 1 within ${SUM_TOLERANCE}.`;
  return [{ code: "custom", input: parts, message, path, params: { code: "mass-fraction-sum" } }];
}
