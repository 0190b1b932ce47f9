import { allowedText, type Check, relativeDifference, within } from "./check.ts";
import type { ValidationRun } from "./validation.ts";

/** The README's table: every check that has a bar, rounded so that it changes only when a result does. */
export function readmeTable({ checks }: ValidationRun): string {
  const header = "| body | quantity | computed | reference | off by | allowed | met |\n|---|---|---|---|---|---|---|\n";
  return (
    header +
    checks
      .filter((check) => within(check) !== undefined)
      .map(row)
      .join("")
  );
}

function row(check: Check): string {
  const { body, quantity, unit, computed, reference, allowed } = check;
  const difference = relativeDifference(check);
  const cells = [
    body,
    unit === "" ? quantity : `${quantity} [${unit}]`,
    shown(computed),
    shown(reference),
    difference === undefined ? "" : `${(100 * difference).toFixed(2)} %`,
    typeof allowed === "number" ? `${Number((100 * allowed).toPrecision(3))} %` : allowedText(check),
    within(check) ? "yes" : "**no**",
  ];
  return `| ${cells.join(" | ")} |\n`;
}

const shown = (value: number | string): string => (typeof value === "number" ? value.toPrecision(5) : value);
