import { columnKey } from "./columnKey.ts";
import { splitUnitText } from "./columnMeaning.ts";
import {
  boundSuffixes,
  type ErrorSide,
  errorPrefixes,
  errorSuffixes,
  limitPrefixes,
  limitSuffixes,
  positionalErrors,
} from "./errorNames.ts";

export interface ErrorColumns {
  readonly minus?: number;
  readonly plus?: number;
  /** Named so that they may be errors or the ends of the interval; the values must tell. */
  readonly mayBeBounds: boolean;
  /** The user said that they are the ends of the interval. */
  readonly areBounds?: boolean;
  readonly limit?: number;
}

interface Attachment {
  readonly owner: number;
  readonly role: ErrorSide | "limit";
  readonly mayBeBounds?: true;
}

/** Which columns hold the errors and limit flags of which columns of values, by name or by place. */
export function attachErrorColumns(
  names: readonly string[],
  stems: ReadonlyMap<number, readonly string[]>,
): Map<number, ErrorColumns> {
  const owners = new Map<string, number>();
  for (const [index, keys] of stems) for (const key of keys) if (!owners.has(key)) owners.set(key, index);
  const attached = new Map<number, { minus?: number; plus?: number; mayBeBounds: boolean; limit?: number }>();
  let precedingValue: number | undefined;
  names.forEach((name, index) => {
    if (stems.has(index)) {
      precedingValue = index;
      return;
    }
    const found = attachmentByName(name, owners) ?? attachmentByPlace(name, precedingValue);
    if (found === undefined) {
      precedingValue = undefined;
      return;
    }
    const columns = attached.get(found.owner) ?? { mayBeBounds: false };
    if (found.role === "limit") columns.limit ??= index;
    else if (found.role === "plus") columns.plus = index;
    else if (found.role === "minus") columns.minus = index;
    else addSymmetric(columns, index);
    columns.mayBeBounds ||= found.mayBeBounds === true;
    attached.set(found.owner, columns);
  });
  return attached;
}

/** One column for both sides; a second one of the same name is the lower error. */
function addSymmetric(columns: { minus?: number; plus?: number }, index: number): void {
  columns.plus ??= index;
  if (columns.minus === undefined || columns.minus === columns.plus) columns.minus = index;
}

function attachmentByName(name: string, owners: ReadonlyMap<string, number>): Attachment | undefined {
  const written = splitUnitText(name).base.trim();
  const key = columnKey(written);
  const byEnding = (suffixes: string): number | undefined => {
    for (const suffix of suffixes.split(" ")) {
      const owner = key.endsWith(suffix) ? owners.get(key.slice(0, -suffix.length)) : undefined;
      if (owner !== undefined) return owner;
    }
    return undefined;
  };
  for (const side of ["plus", "minus", "both"] as const) {
    const owner = byEnding(errorSuffixes[side]);
    if (owner !== undefined) return { owner, role: side };
  }
  for (const { side, prefix } of errorPrefixes) {
    const owner = written.startsWith(prefix) ? owners.get(columnKey(written.slice(prefix.length))) : undefined;
    if (owner !== undefined) return { owner, role: side };
  }
  for (const side of ["plus", "minus"] as const) {
    const owner = byEnding(boundSuffixes[side]);
    if (owner !== undefined) return { owner, role: side, mayBeBounds: true };
  }
  const flagged =
    byEnding(limitSuffixes) ??
    (written.startsWith(limitPrefixes) ? owners.get(columnKey(written.slice(2))) : undefined);
  return flagged === undefined ? undefined : { owner: flagged, role: "limit" };
}

function attachmentByPlace(name: string, precedingValue: number | undefined): Attachment | undefined {
  if (precedingValue === undefined) return undefined;
  // Programs that need unique names number the repeated ones: `err.1`.
  const key = columnKey(name).replace(/_\d+$/, "");
  const signed = /^(?:e|err|error)?\s*([+-])(?:\s*(?:e|err|error))?$/i.exec(name.trim())?.[1];
  if (signed !== undefined) return { owner: precedingValue, role: signed === "+" ? "plus" : "minus" };
  for (const side of ["plus", "minus", "both"] as const) {
    if (positionalErrors[side].split(" ").includes(key)) return { owner: precedingValue, role: side };
  }
  return undefined;
}
