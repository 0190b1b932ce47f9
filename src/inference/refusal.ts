import type { MeasuredQuantity, PlanetRow } from "../planets/quantity.ts";

/**
 * Why a mass or radius is not used as a measurement, as stable codes. All that apply are given.
 * `mass-beyond-models` is added by the classifier: a measurement, but of a planet that no curve describes.
 */
export function refusalReasons(row: PlanetRow): string[] {
  const { mass, minimumMass, radius } = row.quantities;
  const reasons = [...quantityReasons("mass", mass ?? minimumMass), ...quantityReasons("radius", radius)];
  // A cell that could not be read leaves its quantity or error missing; the issue of that cell says why.
  if (reasons.some((reason) => reason.endsWith("-missing"))) reasons.push(...row.issues.map(({ code }) => code));
  return [...new Set(reasons)];
}

/** Whether the value alone, its error aside, may stand for the planet. */
export function isMeasuredValue(quantity: MeasuredQuantity | undefined): quantity is MeasuredQuantity {
  return (
    quantity !== undefined && (quantity.kind === "measured" || quantity.kind === "no-uncertainty") && quantity.value > 0
  );
}

function quantityReasons(name: "mass" | "radius", quantity: MeasuredQuantity | undefined): string[] {
  if (quantity === undefined) return [`${name}-missing`];
  const { kind, value } = quantity;
  const reasons: string[] = [];
  if (kind !== "measured" && kind !== "no-uncertainty") reasons.push(`${name}-${kind}`);
  else if (!hasBothErrors(quantity)) reasons.push(`${name}-${errorProblem(quantity)}`);
  if (!(value > 0)) reasons.push(`${name}-not-positive`);
  return reasons;
}

function hasBothErrors({ kind, minus, plus }: MeasuredQuantity): boolean {
  return kind === "measured" && isErrorSize(minus) && isErrorSize(plus);
}

function errorProblem({ minus, plus }: MeasuredQuantity): string {
  if (minus === undefined && plus === undefined) return "error-missing";
  if (minus === undefined || plus === undefined) return "error-one-sided";
  return isErrorSize(minus) && isErrorSize(plus) ? "error-unusable" : "error-zero";
}

export function isErrorSize(size: number | undefined): size is number {
  return size !== undefined && size > 0 && Number.isFinite(size);
}
