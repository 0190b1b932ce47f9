import type { CommaMeaning } from "./columnPlan.ts";

/** What somebody typed into a number cell. */
export interface TypedNumber {
  readonly value: number;
  readonly minus?: number;
  readonly plus?: number;
  readonly limit?: "upper" | "lower";
}

const missing = new Set([
  "",
  "null",
  "nan",
  "none",
  "na",
  "n/a",
  "-",
  "--",
  "---",
  "...",
  "…",
  "—",
  "?",
  '""',
  "\\n",
  "masked",
]);

/** Longer cells hold no number, and the patterns would be slow on them. */
const NUMBER_LIMIT = 100;

export const isMissing = (text: string): boolean => missing.has(text.trim().toLowerCase());

/** Powers of ten that a double holds exactly. */
const powersOfTen = Array.from({ length: 23 }, (_, power) => 10 ** power);
const EXACT_DIGITS = 15;

/**
 * A number in the common notations; undefined for anything that `readTypedNumber` should look at. Up to 15 digits with a
 * decimal point are one exact integer over one exact power of ten, so that their quotient is rounded once, as `Number`
 * would; that way is three times as fast, and lists are mostly such numbers.
 * Source  Clinger 1990, How to read floating point numbers accurately, PLDI '90, doi:10.1145/93542.93557
 */
export function readPlainNumber(text: string): number | undefined {
  let mantissa = 0;
  let digits = 0;
  let point = -1;
  for (let i = 0; i < text.length; i++) {
    const code = text.charCodeAt(i) - 48;
    if (code >= 0 && code <= 9) {
      mantissa = 10 * mantissa + code;
      digits++;
    } else if (code === -2 && point === -1) point = digits;
    else return readSlowly(text);
  }
  if (digits === 0 || digits > EXACT_DIGITS) return readSlowly(text);
  return point === -1 ? mantissa : mantissa / (powersOfTen[digits - point] ?? 1);
}

/** `Number` alone would take blanks for 0 and `0x10` for 16. */
function readSlowly(text: string): number | undefined {
  if (text.length > NUMBER_LIMIT) return undefined;
  const value = Number(text);
  return Number.isFinite(value) && /^\s*[-+.\d][.\deE]*(?:[-+]\d+)?\s*$/.test(text) ? value : undefined;
}

const number = String.raw`[+-]?(?:\d+\.?\d*|\.\d+)(?:[eEdD][+-]?\d+)?`;
const size = String.raw`(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?`;
const upper = String.raw`\^?\{?\+\s*(${size})\}?`;
const lower = String.raw`_?\{?[-−–]\s*(${size})\}?`;
const plain = new RegExp(`^${number}$`);
const limited = new RegExp(`^([<>≤≥]=?|&lt;|&gt;)\\s*(${number})$`);
const symmetric = new RegExp(`^(${number})\\s*(?:±|\\+/-|\\+-|\\\\pm)\\s*(${size})$`);
const upperFirst = new RegExp(`^(${number})\\s*${upper}\\s*[,/]?\\s*${lower}$`);
const lowerFirst = new RegExp(`^(${number})\\s*${lower}\\s*[,/]?\\s*${upper}$`);
const inLastDigits = /^([+-]?\d+(?:\.(\d*))?)\((\d+)\)(?:[eE]([+-]?\d+))?$/;
/** `1,234`, which is no decimal comma for certain, as `5,2` and `0,123` are. */
const groupedDigits = /(?<![\d.,])[1-9]\d{0,2}(?:,\d{3})+(?![\d,])/;
const infinite = /^[+-]?inf(?:inity)?$/i;

/**
 * `5`, `1.2e3`, `1.2D3`, `<5`, `5±1`, `5 +1 -2`, `5.2(3)` (an error of 3 in the last digit); `inf` as an error. With a
 * decimal comma also `5,2`. Undefined for anything else: the reader never takes a number out of a text that holds more.
 */
export function readTypedNumber(text: string, comma: CommaMeaning = "none"): TypedNumber | undefined {
  if (text.length > NUMBER_LIMIT) return undefined;
  let trimmed = text
    .trim()
    .replace(/^\$|\$$/g, "")
    .replace(/[−–]/g, "-");
  if (comma === "unclear" && groupedDigits.test(trimmed)) return undefined;
  if (comma !== "none") trimmed = trimmed.replace(/(\d),(?=\d)/g, "$1.");
  if (plain.test(trimmed)) return { value: toNumber(trimmed) };
  if (infinite.test(trimmed)) return { value: trimmed.startsWith("-") ? -Infinity : Infinity };
  const limit = limited.exec(trimmed);
  if (limit?.[1] && limit[2])
    return { value: toNumber(limit[2]), limit: /^(?:<|≤|&lt;)/.test(limit[1]) ? "upper" : "lower" };
  const both = symmetric.exec(trimmed);
  if (both?.[1] && both[2]) return { value: toNumber(both[1]), minus: toNumber(both[2]), plus: toNumber(both[2]) };
  const up = upperFirst.exec(trimmed);
  if (up?.[1] && up[2] && up[3]) return { value: toNumber(up[1]), plus: toNumber(up[2]), minus: toNumber(up[3]) };
  const down = lowerFirst.exec(trimmed);
  if (down?.[1] && down[2] && down[3])
    return { value: toNumber(down[1]), minus: toNumber(down[2]), plus: toNumber(down[3]) };
  return readLastDigits(trimmed);
}

/** What to do about a cell that is no number because marks stand between its thousands, or seem to; else nothing. */
export const numberAdvice = (text: string): string =>
  /\d[.,' ]\d{3}(?!\d)/.test(text) ? "; write it with a decimal point and no mark between thousands, e.g. 1234.5" : "";

function readLastDigits(text: string): TypedNumber | undefined {
  const match = inLastDigits.exec(text);
  if (match?.[1] === undefined || match[3] === undefined) return undefined;
  const power = `e${match[4] ?? "0"}`;
  // Through text, so that 5.2(3) has an error of 0.3 and not of 0.30000000000000004.
  const error = Number(`${match[3]}e${Number(match[4] ?? "0") - (match[2]?.length ?? 0)}`);
  return { value: Number(match[1] + power), minus: error, plus: error };
}

const toNumber = (text: string): number => Number(text.replace(/[dD]/, "e"));
