/** One comparison with what is measured or published. Texts are compared as such, numbers by their relative difference. */
export interface Check {
  readonly body: string;
  readonly quantity: string;
  readonly unit: string;
  readonly computed: number | string;
  readonly reference: number | string;
  /** Largest relative difference, or the range that the computed value must be in; absent where there is no bar. */
  readonly allowed?: number | readonly [low: number, high: number];
  /** Whether the inputs are free of the quantity itself, and of anything derived from it. */
  readonly independent: boolean;
  readonly source: string;
  /** For a bar that is missed: the relative difference measured, which must not grow, and the likely reason. */
  readonly miss?: { readonly difference: number; readonly reason: string };
}

/** Computed over reference less 1; undefined for texts. */
export function relativeDifference({ computed, reference }: Check): number | undefined {
  return typeof computed === "number" && typeof reference === "number" ? computed / reference - 1 : undefined;
}

/** Whether a check meets its bar; undefined where it has none. */
export function within(check: Check): boolean | undefined {
  const { computed, reference, allowed } = check;
  if (typeof computed === "string") return computed === reference;
  if (allowed === undefined) return undefined;
  if (typeof allowed === "number") return Math.abs(relativeDifference(check) ?? Number.NaN) <= allowed;
  return computed >= allowed[0] && computed <= allowed[1];
}

export function allowedText({ allowed }: Check): string {
  if (allowed === undefined) return "";
  return typeof allowed === "number" ? String(allowed) : `${allowed[0]} to ${allowed[1]}`;
}
