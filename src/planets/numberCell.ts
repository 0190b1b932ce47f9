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

/** The common case, much faster than the patterns below; `Number` alone would take blanks for 0 and `0x10` for 16. */
export function readPlainNumber(text: string): number | undefined {
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
const infinite = /^[+-]?inf(?:inity)?$/i;

/**
 * `5`, `1.2e3`, `1.2D3`, `<5`, `5±1`, `5 +1 -2`, `5.2(3)` (an error of 3 in the last digit); `inf` as an error. With
 * `decimalComma` also `5,2`. Undefined for anything else: the reader never takes a number out of a text that holds more.
 */
export function readTypedNumber(text: string, decimalComma = false): TypedNumber | undefined {
  if (text.length > NUMBER_LIMIT) return undefined;
  let trimmed = text
    .trim()
    .replace(/^\$|\$$/g, "")
    .replace(/[−–]/g, "-");
  if (decimalComma) trimmed = trimmed.replace(/(\d),(?=\d)/g, "$1.");
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

function readLastDigits(text: string): TypedNumber | undefined {
  const match = inLastDigits.exec(text);
  if (match?.[1] === undefined || match[3] === undefined) return undefined;
  const power = `e${match[4] ?? "0"}`;
  // Through text, so that 5.2(3) has an error of 0.3 and not of 0.30000000000000004.
  const error = Number(`${match[3]}e${Number(match[4] ?? "0") - (match[2]?.length ?? 0)}`);
  return { value: Number(match[1] + power), minus: error, plus: error };
}

const toNumber = (text: string): number => Number(text.replace(/[dD]/, "e"));
