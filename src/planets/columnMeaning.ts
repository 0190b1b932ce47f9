import { camelKey, columnKey } from "./columnKey.ts";
import { ambiguousNames, prefixRenames, quantityColumns, textColumns } from "./columnTable.ts";
import type { KnownList } from "./knownLists.ts";
import type { QuantityName, TextName } from "./quantity.ts";
import { findUnit, type Unit, unitById } from "./unitTable.ts";

/** What a column of values means, from its name alone. */
export interface QuantityMeaning {
  readonly quantity: QuantityName;
  /** The unit the name states, if it states one. */
  readonly unit?: Unit;
  /** The key without the unit, under which error columns may be named. */
  readonly stem: string;
}

export interface TextMeaning {
  readonly text: TextName;
  /** 0 for the surest name of this text. */
  readonly rank: number;
}

/** No column name is longer; what is longer is not searched for meanings. */
const NAME_LIMIT = 200;

const quantityNames = Object.keys(quantityColumns) as QuantityName[];
const words = (list = ""): string[] => list.split(" ").filter((word) => word !== "");

const plainNames = new Map<string, QuantityName>();
const unitNames = new Map<string, { quantity: QuantityName; unit: Unit }>();
const textNames = new Map<string, TextMeaning>();
fillTables();

function fillTables(): void {
  for (const quantity of quantityNames) {
    const columns = quantityColumns[quantity];
    const bodies =
      columns.body === "planet"
        ? ["planet", "pl", "planetary", "p", "b"]
        : ["star", "st", "stellar", "host", "host_star", "s"];
    for (const name of words(columns.names)) plainNames.set(name, quantity);
    plainNames.set(columns.ownName, quantity);
    for (const word of [...words(columns.words), ...(columns.body === "planet" ? words(columns.names) : [])]) {
      for (const body of bodies) {
        if (body.length > 1) addIfNew(`${body}_${word}`, quantity);
        addIfNew(`${word}_${body}`, quantity);
      }
    }
    for (const [unitId, names] of Object.entries(columns.unitNames ?? {})) {
      const unit = unitById(unitId, columns.dimension);
      if (unit !== undefined) for (const name of words(names)) unitNames.set(name, { quantity, unit });
    }
  }
  for (const [text, names] of Object.entries(textColumns) as [TextName, string][]) {
    for (const [rank, name] of words(names).entries()) textNames.set(name, { text, rank });
  }
}

function addIfNew(name: string, quantity: QuantityName): void {
  if (!plainNames.has(name)) plainNames.set(name, quantity);
}

/** All readings of a column name as a quantity: none, one, or two where the name alone cannot tell. */
export function quantityMeanings(name: string, known?: KnownList): QuantityMeaning[] {
  if (name.length > NAME_LIMIT) return [];
  const { base, unitText } = splitUnitText(name);
  const keys = [columnKey(name), columnKey(base), camelKey(base)];
  for (const key of new Set([...keys, ...keys.map(renamed)])) {
    const special = known?.names?.[key];
    if (special !== undefined && Object.hasOwn(known?.names ?? {}, key))
      return [withUnitText({ quantity: special, stem: key }, unitText)];
    const carrying = unitNames.get(key);
    if (carrying !== undefined) return [{ ...carrying, stem: key }];
    const quantity = plainNames.get(key);
    if (quantity !== undefined) return [withUnitText({ quantity, stem: key }, unitText)];
    const readings = ambiguousNames[key];
    if (readings !== undefined && Object.hasOwn(ambiguousNames, key)) {
      return readings.map((reading) => withUnitText({ quantity: reading, stem: key }, unitText));
    }
    const suffixed = withUnitSuffix(key);
    if (suffixed !== undefined) return [suffixed];
  }
  return [];
}

export const textMeaning = (name: string): TextMeaning | undefined =>
  name.length > NAME_LIMIT ? undefined : (textNames.get(columnKey(name)) ?? textNames.get(renamed(columnKey(name))));

export const isKnownColumn = (name: string): boolean =>
  quantityMeanings(name).length > 0 || textMeaning(name) !== undefined;

/** `Mass [M_jup]`, `a(AU)`, `Radius, R_Earth` in two; a bracket that holds no unit stays with the name. */
export function splitUnitText(name: string): { base: string; unitText?: string } {
  const match = /^(.+?)\s*(?:[[({]\s*([^\])}]+?)\s*[\])}]+|[,/]\s*([^,/]+))\s*$/.exec(name);
  const unitText = match?.[2] ?? match?.[3];
  if (match?.[1] === undefined || unitText === undefined || findUnit(unitText) === undefined) return { base: name };
  return { base: match[1], unitText };
}

function withUnitText(meaning: QuantityMeaning, unitText: string | undefined): QuantityMeaning {
  if (unitText === undefined) return meaning;
  return { ...meaning, unit: findUnit(unitText, quantityColumns[meaning.quantity].dimension) };
}

/** `mass_earth`, `density_g_cm3`, `period_days`: a known name and, after it, a unit of its dimension. */
function withUnitSuffix(key: string): QuantityMeaning | undefined {
  const tokens = key.split("_");
  for (let split = tokens.length - 1; split > 0; split--) {
    const stem = tokens.slice(0, split).join("_");
    const quantity = plainNames.get(stem);
    const unit = quantity && findUnit(tokens.slice(split).join(""), quantityColumns[quantity].dimension);
    if (quantity !== undefined && unit !== undefined) return { quantity, unit, stem };
  }
  return undefined;
}

function renamed(key: string): string {
  for (const [prefix, replacement] of Object.entries(prefixRenames)) {
    if (key.startsWith(prefix)) return replacement + key.slice(prefix.length);
  }
  return key;
}
