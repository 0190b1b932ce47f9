import fc from "fast-check";
import { InputError } from "../../src/errors.ts";
import { readPlainNumber, readTypedNumber } from "../../src/planets/numberCell.ts";
import type { PlanetRow } from "../../src/planets/quantity.ts";
import { cellsOf, fixture, readList } from "./readText.ts";

/** A property of the readers; `npm test` tries it a thousand times, `npm run fuzz` a hundred thousand. */
export interface Property {
  readonly name: string;
  readonly property: fc.IAsyncProperty<unknown[]>;
}

const define = (name: string, property: unknown): Property => ({ name, property: property as Property["property"] });

const seeds = [
  "invented/planets.ecsv",
  "invented/planets-comma.ecsv",
  "invented/planets.tabledata.vot",
  "invented/planets.binary.vot",
  "invented/planets.binary2.vot",
  "invented/planets.ipac",
  "invented/planets.mrt",
].map((name) => ({ name, bytes: fixture(name) }));

const csvSeeds = [
  "name,mass_earth,mass_earth_minus,mass_earth_plus,radius_earth\nAster b,5,1,1,2\nBrook c,<5,,,1.2(3)\n",
  "# COLUMN pl_name: Name\npl_name\tpl_bmasse\tpl_bmasseerr1\tpl_bmasseerr2\tpl_bmasselim\tpl_rade\nA\t5\t1\t-1\t0\t2\n",
  'System ; M_b(earth) ; err ; err ; R_b [R_earth]\n"Aster ""b""\nor so" ; 0.0 ; 0.1 ; 0 ; -1\n',
].map((text, i) => ({ name: `text ${i}`, bytes: new TextEncoder().encode(text) }));

const snippet = fc.constantFrom(
  ...[
    ",",
    ";",
    "\t",
    "|",
    '"',
    '""',
    "\n",
    "\r",
    "\r\n",
    "#",
    "# ",
    "-1",
    "nan",
    "inf",
    "<",
    "±",
    "1e999",
    "\0",
    "\ufeff",
  ],
  ...[
    "<TD>",
    "</TD>",
    "</TR>",
    "<!--",
    "]]>",
    "&x;",
    "<STREAM>",
    "=",
    "----",
    "__proto__",
    "mass",
    "[Mjup]",
    "é",
    "%ECSV",
  ],
);

/** A file with a few places overwritten, cut out, repeated or filled with what readers stumble over. */
const mutated = (files: readonly { bytes: Uint8Array }[]): fc.Arbitrary<Uint8Array> =>
  fc
    .tuple(
      fc.constantFrom(...files),
      fc.array(fc.tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.nat(40), snippet), {
        minLength: 1,
        maxLength: 6,
      }),
    )
    .map(([{ bytes }, edits]) => {
      let text = Buffer.from(bytes).toString("latin1");
      for (const [place, length, inserted] of edits) {
        const at = Math.floor(place * text.length);
        text = text.slice(0, at) + inserted + text.slice(at + length);
      }
      return new Uint8Array(Buffer.from(text, "latin1"));
    });

/** Rows come in order with sound numbers, or an InputError says why not; nothing else may happen. */
async function readsOrRefuses(bytes: Uint8Array, chunkSize: number): Promise<boolean> {
  try {
    const { rows } = await readList(bytes, { unitChoices: { mass: "earth", radius: "earth" } }, chunkSize);
    return rows.every((row, index) => row.row === index + 1 && isSound(row));
  } catch (error) {
    if (error instanceof InputError && error.message !== "") return true;
    throw error;
  }
}

const isSound = ({ quantities, twins, issues, line }: PlanetRow): boolean =>
  line >= 1 &&
  issues.every(({ code, message }) => code !== "" && message !== "") &&
  [...Object.values(quantities), ...Object.values(twins ?? {}).flat()].every(
    ({ value, minus = 0, plus = 0, kind }) =>
      Number.isFinite(value) && minus >= 0 && plus >= 0 && (kind !== "measured" || (minus > 0 && plus > 0)),
  );

const cell = fc.string({ unit: fc.constantFrom(..."abc ,;\t|\"'\n\r#é⊕<>&"), maxLength: 8 });

export const properties: readonly Property[] = [
  ...[...seeds, ...csvSeeds].map((seed) =>
    define(
      `a damaged ${seed.name} is read or refused`,
      fc.asyncProperty(mutated([seed]), fc.constantFrom(13, 300, 65536), readsOrRefuses),
    ),
  ),
  define(
    "any bytes are read or refused",
    fc.asyncProperty(fc.uint8Array({ maxLength: 300 }), fc.integer({ min: 1, max: 300 }), readsOrRefuses),
  ),
  define(
    "any text is read or refused",
    fc.asyncProperty(fc.string({ unit: "binary", maxLength: 300 }), async (text) =>
      readsOrRefuses(new TextEncoder().encode(text), 64),
    ),
  ),
  define(
    "cells written with quotes come back verbatim, however the file is cut",
    fc.asyncProperty(
      fc.array(fc.tuple(cell, cell, cell), { minLength: 1, maxLength: 5 }),
      fc.constantFrom(",", ";", "\t"),
      fc.integer({ min: 1, max: 100 }),
      async (rows, delimiter, chunkSize) => {
        const quote = (text: string): string => `"${text.replaceAll('"', '""')}"`;
        const lines = rows.map((row) => ["x", ...row].map(quote).join(delimiter));
        const text = [["name", "a_column", "b_column", "c_column"].join(delimiter), ...lines].join("\r\n");
        const read = await cellsOf(text, chunkSize);
        return JSON.stringify(read) === JSON.stringify(rows.map((row) => ["x", ...row]));
      },
    ),
  ),
  define(
    "numbers come back as they were written",
    fc.asyncProperty(fc.double({ noNaN: true, noDefaultInfinity: true }), async (value) => {
      return Object.is(readTypedNumber(String(value))?.value, value === 0 ? 0 : value) || Object.is(value, -0);
    }),
  ),
  define(
    "decimal numbers are read as Number reads them",
    fc.asyncProperty(fc.nat(), fc.nat(1e9), fc.nat(12), async (whole, fraction, zeros) => {
      const text = `${whole}.${"0".repeat(zeros)}${fraction}`;
      return Object.is(readPlainNumber(text), Number(text));
    }),
  ),
];
