import { type BarotropePath, type BarotropePiece, resolvedPiece } from "./barotropePiece.ts";
import type { WaterPhaseName } from "./phaseBoundaries.ts";

export interface PathPoint {
  readonly pressure: number;
  readonly temperature: number;
}

/** Part of a path through one phase of water, followed by one rule. */
export interface Stretch {
  readonly name: string;
  readonly phase: WaterPhaseName;
  readonly path: BarotropePath;
  /** True from where the next stretch has to take over. */
  hasLeft(at: PathPoint): boolean;
  /** The pressure [Pa] past which the phase has no state at a temperature [K]; Infinity for most. */
  lastPressure(temperature: number): number;
}

/** In x, so relative in pressure: how far past its end a stretch is followed, so that the next one starts clearly there. */
const OVERSHOOT = 1e-10;

/** The pieces of a stretch from `foot` to where it is left or to the pressure `limit`, and the point where it ends. */
export function followStretch(
  stretch: Stretch,
  foot: PathPoint,
  limit: number,
): { pieces: BarotropePiece[]; end: PathPoint } {
  const { path } = stretch;
  const top = Math.log(limit + path.shift);
  const pieces: BarotropePiece[] = [];
  let end = foot;
  for (let from = Math.log(foot.pressure + path.shift); from < top; from = pieces[pieces.length - 1].until) {
    const until = Math.min(top, Math.log(stretch.lastPressure(end.temperature) + path.shift));
    const ahead = resolvedPiece(path, from, until, end.temperature);
    const leaves = whereItLeaves(ahead, stretch);
    const piece = leaves === undefined ? ahead : resolvedPiece(path, from, leaves, end.temperature);
    pieces.push(piece);
    end = pointAt(piece, path.shift, piece.until);
    if (piece.until === leaves || stretch.hasLeft(end)) return { pieces, end };
  }
  return { pieces, end: { ...end, pressure: limit } };
}

/** The x where the path has just left the stretch, if it does so on this piece. */
function whereItLeaves(piece: BarotropePiece, stretch: Stretch): number | undefined {
  const left = (x: number) => stretch.hasLeft(pointAt(piece, stretch.path.shift, x));
  const i = piece.nodes.findIndex((x, index) => index > 0 && left(x));
  if (i < 0) return undefined;
  let before = piece.nodes[i - 1];
  let after = piece.nodes[i];
  while (after - before > OVERSHOOT) {
    const middle = 0.5 * (before + after);
    if (left(middle)) after = middle;
    else before = middle;
  }
  return after + OVERSHOOT;
}

function pointAt(piece: BarotropePiece, shift: number, x: number): PathPoint {
  return { pressure: Math.exp(x) - shift, temperature: piece.temperature.value(x) };
}
