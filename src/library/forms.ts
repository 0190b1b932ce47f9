import * as z from "zod";
import { birchMurnaghan } from "../eos/birchMurnaghan.ts";
import { constantDensity } from "../eos/constantDensity.ts";
import type { EosCurve } from "../eos/curve.ts";
import { holzapfel } from "../eos/holzapfel.ts";
import { keane } from "../eos/keane.ts";
import { modifiedPolytrope } from "../eos/modifiedPolytrope.ts";
import { type TableRow, tabulated } from "../eos/tabulated.ts";
import { thomasFermiDirac } from "../eos/thomasFermiDirac.ts";
import { vinet } from "../eos/vinet.ts";
import { GPA } from "../units/constants.ts";
import { strictObject } from "./strictObject.ts";

/** Gives the rows of a table file named in a material file. */
export type TableReader = (file: string) => readonly TableRow[];

type Curve = EosCurve | "bridge";

const define = <Schema extends z.ZodType>(
  schema: Schema,
  build: (keys: z.output<Schema>, readTable: TableReader) => Curve,
) => ({ schema, build });

const positive = z.number().positive();
const compressible = { densityZeroKgM3: positive, bulkModulusGPa: positive };
const finiteStrain = { ...compressible, bulkModulusPrime: z.number().gt(1) };
const birch = { form: z.literal("birch-murnaghan"), ...compressible };
const birchHigher = { form: z.literal("birch-murnaghan"), ...finiteStrain };

const compressibleSI = (keys: { densityZeroKgM3: number; bulkModulusGPa: number }) => ({
  densityZero: keys.densityZeroKgM3,
  bulkModulus: keys.bulkModulusGPa * GPA,
});
const finiteStrainSI = (keys: { densityZeroKgM3: number; bulkModulusGPa: number; bulkModulusPrime: number }) => ({
  ...compressibleSI(keys),
  bulkModulusPrime: keys.bulkModulusPrime,
});

/** Every form of equation of state a material file can name: the keys it takes, and its curve. */
const forms = {
  vinet: define(strictObject({ form: z.literal("vinet"), ...finiteStrain }), (keys) => vinet(finiteStrainSI(keys))),

  "birch-murnaghan": define(
    z.discriminatedUnion("order", [
      strictObject({ ...birch, order: z.literal(2) }),
      strictObject({ ...birchHigher, order: z.literal(3) }),
      strictObject({ ...birchHigher, order: z.literal(4), bulkModulusSecondPerGPa: z.number() }),
    ]),
    (keys) => {
      if (keys.order === 2) return birchMurnaghan({ order: 2, ...compressibleSI(keys) });
      if (keys.order === 3) return birchMurnaghan({ order: 3, ...finiteStrainSI(keys) });
      const bulkModulusSecond = keys.bulkModulusSecondPerGPa / GPA;
      return birchMurnaghan({ order: 4, ...finiteStrainSI(keys), bulkModulusSecond });
    },
  ),

  holzapfel: define(
    strictObject({ form: z.literal("holzapfel"), ...finiteStrain, fermiGasPressureGPa: positive }),
    (keys) => holzapfel({ ...finiteStrainSI(keys), fermiGasPressure: keys.fermiGasPressureGPa * GPA }),
  ),

  keane: define(
    strictObject({ form: z.literal("keane"), ...finiteStrain, bulkModulusPrimeInfinite: positive }),
    (keys) => keane({ ...finiteStrainSI(keys), bulkModulusPrimeInfinite: keys.bulkModulusPrimeInfinite }),
  ),

  "modified-polytrope": define(
    strictObject({
      form: z.literal("modified-polytrope"),
      densityZeroKgM3: z.number().nonnegative(),
      coefficientSI: positive,
      exponent: z.number().gt(0).lt(1),
    }),
    (keys) =>
      modifiedPolytrope({
        densityZero: keys.densityZeroKgM3,
        coefficient: keys.coefficientSI,
        exponent: keys.exponent,
      }),
  ),

  "thomas-fermi-dirac": define(
    strictObject({ form: z.literal("thomas-fermi-dirac"), formula: z.string().min(1) }),
    ({ formula }) => thomasFermiDirac({ formula }),
  ),

  constant: define(strictObject({ form: z.literal("constant"), densityKgM3: positive }), ({ densityKgM3 }) =>
    constantDensity({ density: densityKgM3 }),
  ),

  table: define(strictObject({ form: z.literal("table"), file: z.string().min(1) }), ({ file }, readTable) =>
    tabulated(readTable(file)),
  ),

  bridge: define(strictObject({ form: z.literal("bridge") }), () => "bridge"),
};

type FormSchema = (typeof forms)[keyof typeof forms]["schema"];
const formSchemas = Object.values(forms).map(({ schema }) => schema) as [FormSchema, ...FormSchema[]];

/** The `eos` of a phase. */
export const eosSchema = z.discriminatedUnion("form", formSchemas);
export type EosKeys = z.output<typeof eosSchema>;

/** Forms whose range does not come from data fitted, or comes with them: `calibratedToGPa` may be left out. */
export const FORMS_WITHOUT_CALIBRATION: readonly EosKeys["form"][] = ["thomas-fermi-dirac", "table", "bridge"];

/** The curve that validated keys describe. Throws InputError where they do not describe any. */
export function buildCurve(keys: EosKeys, readTable: TableReader): Curve {
  const { build } = forms[keys.form] as { build: (keys: EosKeys, readTable: TableReader) => Curve };
  return build(keys, readTable);
}
