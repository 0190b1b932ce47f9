import * as z from "zod";
import { nameSchema, textSchema } from "./names.ts";
import { strictObject } from "./strictObject.ts";

/** A lattice over more components would take minutes to solve. */
const MOST_COMPONENTS = 4;

const componentSchema = strictObject({
  name: nameSchema,
  material: nameSchema.optional(),
  composition: nameSchema.optional(),
})
  .check(({ value, issues }) => {
    if ((value.material === undefined) !== (value.composition === undefined)) return;
    const message = 'a component has exactly one of "material" and "composition".';
    issues.push({ code: "custom", input: value, message, path: [] });
  })
  .meta({ oneOf: [{ required: ["material"] }, { required: ["composition"] }] });

/** Flat in the logarithm of a component's mass fraction. */
const logUniformSchema = strictObject({
  component: nameSchema,
  from: z.number().positive().max(1),
  to: z.number().positive().max(1),
}).check(({ value, issues }) => {
  if (value.from < value.to) return;
  issues.push({ code: "custom", input: value, message: '"from" must be below "to".', path: [] });
});

/** Normal in a component's share of the mass of some components, e.g. of a core in what is not water. */
const normalSchema = strictObject({
  component: nameSchema,
  among: z.array(nameSchema).min(1),
  mean: z.number().min(0).max(1),
  sigma: z.number().positive(),
}).check(({ value, issues }) => {
  if (value.among.includes(value.component)) return;
  issues.push({
    code: "custom",
    input: value.among,
    message: '"among" must hold the component itself.',
    path: ["among"],
  });
});

const priorSchema = strictObject({
  fractions: z.literal("flat").default("flat"),
  logUniform: z.array(logUniformSchema).default([]),
  normal: z.array(normalSchema).default([]),
});

/** A family file: components from the centre outwards. */
export const familySchema = strictObject({
  $schema: z.string().optional(),
  family: nameSchema,
  title: textSchema,
  components: z.array(componentSchema).min(1).max(MOST_COMPONENTS),
  prior: priorSchema.prefault({}),
}).check(({ value: { components, prior }, issues }) => {
  const names = components.map(({ name }) => name);
  names.forEach((name, k) => {
    if (names.indexOf(name) === k) return;
    const message = `"${name}" is already the name of another component.`;
    issues.push({ code: "custom", input: name, message, path: ["components", k, "name"] });
  });
  const unknown = (name: string, path: PropertyKey[]) => {
    if (names.includes(name)) return;
    const message = `"${name}" is not a component; they are: ${names.join(", ")}.`;
    issues.push({ code: "custom", input: name, message, path: ["prior", ...path] });
  };
  prior.logUniform.forEach(({ component }, i) => void unknown(component, ["logUniform", i, "component"]));
  prior.normal.forEach(({ component, among }, i) => {
    unknown(component, ["normal", i, "component"]);
    among.forEach((name, k) => void unknown(name, ["normal", i, "among", k]));
  });
  if (prior.logUniform.length > 0 && prior.logUniform.length >= names.length) {
    const message = "at least one component must be left to fill up the planet.";
    issues.push({ code: "custom", input: prior.logUniform, message, path: ["prior", "logUniform"] });
  }
});

export type FamilyFile = z.output<typeof familySchema>;
