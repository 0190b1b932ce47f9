import { decodeBase64 } from "./base64.ts";
import type { RawColumn } from "./rawTable.ts";

export type Datatype =
  | "boolean"
  | "bit"
  | "unsignedByte"
  | "short"
  | "int"
  | "long"
  | "char"
  | "unicodeChar"
  | "float"
  | "double"
  | "floatComplex"
  | "doubleComplex";

export interface VotableField extends RawColumn {
  readonly datatype: Datatype;
  /** Elements per cell where fixed; those of one slice where `isVariable`. */
  readonly elements: number;
  readonly isVariable: boolean;
  /** Text longer than this is cut, as the standard has it; absent where the length is free. */
  readonly longestText?: number;
  /** No `arraysize`, so not even an array of one. */
  readonly isScalar: boolean;
  /** The value that stands for a missing one. */
  readonly missing?: string;
}

const datatypes = new Map<string, Datatype>([
  ...(
    ["boolean", "bit", "unsignedByte", "short", "int", "long", "char", "unicodeChar", "float", "double"] as const
  ).map((name) => [name, name] as const),
  ["floatComplex", "floatComplex"],
  ["doubleComplex", "doubleComplex"],
  // Found in files although no standard knows them.
  ["string", "char"],
  ["unicodeString", "unicodeChar"],
]);

/** Throws RangeError for a datatype that the standard does not know. */
export function parseField(attributes: Readonly<Record<string, string>>, number: number): VotableField {
  const dimensions = (attributes.arraysize ?? "1").split("x").map((part) => part.trim());
  const isVariable = dimensions.at(-1)?.endsWith("*") === true;
  const fixed = (isVariable ? dimensions.slice(0, -1) : dimensions).map(Number);
  const name = attributes.name ?? attributes.ID ?? `column ${number}`;
  const datatype = datatypes.get(attributes.datatype ?? "char");
  if (datatype === undefined) throw new RangeError(`field "${name}" has the unknown datatype "${attributes.datatype}"`);
  return {
    name,
    unit: attributes.unit,
    datatype,
    elements: fixed.reduce((product, size) => product * (Number.isSafeInteger(size) && size > 0 ? size : 1), 1),
    isVariable,
    // Text without an arraysize should be one character long; whoever forgot it did not mean to lose the rest.
    longestText: /^\d+\*?$/.test(attributes.arraysize ?? "")
      ? Number.parseInt(attributes.arraysize ?? "", 10)
      : undefined,
    isScalar: attributes.arraysize === undefined,
  };
}

const integerRanges: Readonly<Partial<Record<Datatype, readonly [bigint, bigint]>>> = {
  unsignedByte: [0n, 255n],
  short: [-32768n, 32767n],
  int: [-2147483648n, 2147483647n],
  long: [-(2n ** 63n), 2n ** 63n - 1n],
};

/** A TABLEDATA cell: text verbatim; of numbers the missing ones empty and the others as their type holds them. */
export function readCellText(text: string, field: VotableField): string {
  const { datatype, isScalar, longestText, missing } = field;
  if (datatype === "char" || datatype === "unicodeChar") return text.slice(0, longestText);
  const cell = text.trim();
  if (cell === missing) return "";
  if (!isScalar) return cell;
  const range = integerRanges[datatype];
  if (range !== undefined && /^(?:[+-]?\d{1,30}|0x[0-9a-f]{1,30})$/i.test(cell))
    return clampInteger(BigInt(cell.replace(/^\+/, "")), range, missing);
  return /^[+-]?nan$/i.test(cell) ? "" : cell;
}

/** Integers too large for their type count as the largest of it, as the reference reader has it. */
function clampInteger(value: bigint, [low, high]: readonly [bigint, bigint], missing: string | undefined): string {
  const text = String(value < low ? low : value > high ? high : value);
  return text === missing ? "" : text;
}

/** A TD may hold its value in binary; only whole numbers of elements can be read. */
export function readTypedBase64(text: string, field: VotableField): string {
  const bytes = decodeBase64(text);
  const read = readElements(
    new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength),
    0,
    field,
    bytes.length / elementBytes(field),
  );
  return read === field.missing ? "" : read;
}

const bytesOf: Readonly<Record<Datatype, number>> = {
  boolean: 1,
  bit: 1 / 8,
  unsignedByte: 1,
  short: 2,
  int: 4,
  long: 8,
  char: 1,
  unicodeChar: 2,
  float: 4,
  double: 8,
  floatComplex: 8,
  doubleComplex: 16,
};

export const elementBytes = (field: VotableField): number => bytesOf[field.datatype];

/** Big-endian elements as text, blanks between the elements of an array; the caller has checked that all bytes are there. */
export function readElements(view: DataView, at: number, { datatype }: VotableField, count: number): string {
  if (datatype === "char" || datatype === "unicodeChar") return readText(view, at, datatype, count);
  const values: string[] = [];
  for (let i = 0; i < Math.floor(count); i++) values.push(readElement(view, at, datatype, i));
  return values.join(" ");
}

function readElement(view: DataView, at: number, datatype: Datatype, index: number): string {
  const offset = at + index * bytesOf[datatype];
  switch (datatype) {
    case "boolean":
      return readBoolean(view.getUint8(offset));
    case "bit":
      return String((view.getUint8(at + (index >> 3)) >> (7 - (index & 7))) & 1);
    case "unsignedByte":
      return String(view.getUint8(offset));
    case "short":
      return String(view.getInt16(offset));
    case "int":
      return String(view.getInt32(offset));
    case "long":
      return String(view.getBigInt64(offset));
    case "float":
      return formatFloat(view.getFloat32(offset));
    case "double":
      return formatFloat(view.getFloat64(offset));
    case "floatComplex":
      return `${formatFloat(view.getFloat32(offset))} ${formatFloat(view.getFloat32(offset + 4))}`;
    case "doubleComplex":
      return `${formatFloat(view.getFloat64(offset))} ${formatFloat(view.getFloat64(offset + 8))}`;
    case "char":
    case "unicodeChar":
      return readText(view, offset, datatype, 1);
  }
}

function readBoolean(byte: number): string {
  const letter = String.fromCharCode(byte);
  if ("Tt1".includes(letter)) return "true";
  return "Ff0".includes(letter) ? "false" : "";
}

/** A missing number is NaN in binary data. */
function formatFloat(value: number): string {
  if (Number.isNaN(value)) return "";
  return Number.isFinite(value) ? String(value) : value > 0 ? "inf" : "-inf";
}

function readText(view: DataView, at: number, datatype: "char" | "unicodeChar", count: number): string {
  const bytes = new Uint8Array(view.buffer, view.byteOffset + at, count * bytesOf[datatype]);
  const text = new TextDecoder(datatype === "char" ? "utf-8" : "utf-16be").decode(bytes);
  const end = text.indexOf("\0");
  return end === -1 ? text : text.slice(0, end);
}
