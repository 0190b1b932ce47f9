import type { MeasuredQuantity, PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import type { ListRule } from "../rule.ts";
import { hasBothErrors } from "../significance.ts";

/** Least width in ln M, and least number of rows, of the bins looked at one by one; a smooth curve is straight over 50 %. */
const WIDTH = 0.4;
const ROWS = 15;
/** Rows on one line, and their share of the bin, that are beyond chance. */
const ENOUGH = 10;
const SHARE = 1 / 3;
/** Rounding of three-digit values: half a unit in 100 on each axis. */
const ROUNDING = 0.005;
/** Rows of a bin that lines are drawn through; enough to hit a line that holds a third of them. */
const ANCHORS = 40;

interface Point {
  readonly row: PlanetRow;
  readonly mass: number;
  readonly radius: number;
}

/** A row whose mass or radius has no errors and is not known to be computed: measured pairs scatter, and are no candidates. */
function candidate(row: PlanetRow): Point[] {
  const { mass, radius } = row.quantities;
  const bare = (quantity: MeasuredQuantity) => quantity.kind === "no-uncertainty" && !hasBothErrors(quantity);
  if (!mass || !radius || mass.kind === "from-relation" || radius.kind === "from-relation") return [];
  if (!(mass.value > 0 && radius.value > 0) || !(bare(mass) || bare(radius))) return [];
  return [{ row, mass: Math.log(mass.value), radius: Math.log(radius.value) }];
}

/** Members of the bin that lie on the line that most of them lie on, among lines through two of them. */
function onOneLine(bin: readonly Point[]): Point[] {
  const stride = Math.ceil(bin.length / ANCHORS);
  const anchors = bin.filter((_, i) => i % stride === 0);
  let best: Point[] = [];
  for (const a of anchors) {
    for (const b of anchors) {
      if (!(b.mass - a.mass > WIDTH / 3)) continue;
      const slope = (b.radius - a.radius) / (b.mass - a.mass);
      const tolerance = ROUNDING * (1 + Math.abs(slope));
      const members = bin.filter((p) => Math.abs(p.radius - a.radius - slope * (p.mass - a.mass)) <= tolerance);
      if (members.length > best.length) best = members;
    }
  }
  return best.length >= Math.max(ENOUGH, SHARE * bin.length) ? best : [];
}

/** Cuts points, sorted by mass, into bins; what is left at the end joins the last bin. */
function binned(points: readonly Point[]): Point[][] {
  const bins: Point[][] = [[]];
  for (const [i, point] of points.entries()) {
    const current = bins.at(-1) as Point[];
    const width = point.mass - (current[0]?.mass ?? point.mass);
    const full = width > WIDTH && current.length >= ROWS && points.length - i >= ROWS;
    if (full) bins.push([point]);
    else current.push(point);
  }
  return bins;
}

function describe({ row }: Point, count: number): Discrepancy {
  const { mass, radius } = row.quantities;
  const quantity = mass && hasBothErrors(mass) ? "radius" : "mass";
  return {
    row,
    quantity,
    value: (quantity === "mass" ? mass : radius)?.value,
    explanation: `lies with ${count - 1} other rows on one smooth mass–radius curve, to rounding`,
    remedy: "infer no composition from it: one of the two values was computed from the other",
  };
}

function test(rows: readonly PlanetRow[]): readonly Discrepancy[] {
  const points = rows.flatMap(candidate).sort((a, b) => a.mass - b.mass);
  if (points.length < ROWS) return [];
  const found = binned(points).flatMap(onOneLine);
  return found.map((point) => describe(point, found.length));
}

/** A line in ln R against ln M, found bin by bin by trying pairs. */
export const smoothCurve: ListRule = {
  id: "smooth-curve",
  scope: "list",
  severity: "warning",
  claim: "Masses and radii without errors do not all lie on one curve",
  formula: "of the rows within 50 % in mass, fewer than 10 or a third lie within 0.5 % of one power law",
  source: "measured planets scatter by tens of per cent at equal radius",
  test,
};
