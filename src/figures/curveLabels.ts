import type { FigureSpec, LogAxis } from "./figureSpec.ts";

/** Plotting area in pixels, and the room for labels to its right. */
export interface LabelFrame {
  readonly width: number;
  readonly height: number;
  readonly margin: number;
}

export interface CurveLabel {
  /** Index into `curves`. */
  readonly curve: number;
  /** End of the curve, or the edge of the diagram where the curve ends near it. */
  readonly mass: number;
  readonly radius: number;
  /** Pixels the label is moved down from the end of its curve. */
  readonly shift: number;
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const characterWidth = 7;
const lineHeight = 16;
export const labelGap = 7;
/** How far a label may leave its curve and still be read as its own. */
const shifts = [0, -4, 4, -8, 8];

/**
 * Which curves can carry their name at their end, in every one of `frames`, without covering a planet, a curve or
 * another name. The others are named by the legend alone.
 */
export function curveLabels(spec: FigureSpec, frames: readonly LabelFrame[]): CurveLabel[] {
  const scenes = frames.map((frame) => ({ frame, points: scenePoints(spec, frame), taken: [] as Box[] }));
  const labels: CurveLabel[] = [];
  for (const { curve, mass, radius } of curveEnds(spec)) {
    const text = spec.curves[curve]?.label ?? "";
    const shift = shifts.find((pixels) =>
      scenes.every(({ frame, points, taken }) => {
        const box = labelBox(place(spec, frame, mass, radius), text, pixels);
        return box.right <= frame.width + frame.margin && !taken.some(overlaps(box)) && !points.some(isInside(box));
      }),
    );
    if (shift === undefined) continue;
    for (const { frame, taken } of scenes) taken.push(labelBox(place(spec, frame, mass, radius), text, shift));
    labels.push({ curve, mass, radius, shift });
  }
  return labels;
}

/** A curve that ends this near the right edge, as a fraction of its width, has its name outside. */
const nearEdge = 0.06;

/** Last solved point of every curve, largest radius first, so that labels fill downwards. */
function curveEnds({ curves, axes }: FigureSpec): { curve: number; mass: number; radius: number }[] {
  const ends = curves.flatMap(({ mass, radius }, curve) => {
    const last = radius.findLastIndex((value) => value !== null);
    if (last < 0) return [];
    const end = mass[last] as number;
    const outside = fraction(axes.mass, end) > 1 - nearEdge;
    return [{ curve, mass: outside ? axes.mass.range[1] : end, radius: radius[last] as number }];
  });
  return ends.sort((a, b) => b.radius - a.radius);
}

type Point = readonly [x: number, y: number];

/** What a label must not cover. */
function scenePoints(spec: FigureSpec, frame: LabelFrame): Point[] {
  const planets = spec.marks.flatMap((mark): Point[] => {
    const planet = spec.planets[mark.planet];
    return planet?.mass && planet.radius ? [place(spec, frame, planet.mass.value, planet.radius.value)] : [];
  });
  const curves = spec.curves.flatMap(({ mass, radius }) =>
    mass.flatMap((m, i): Point[] => {
      const r = radius[i];
      return typeof r === "number" ? [place(spec, frame, m, r)] : [];
    }),
  );
  return [...planets, ...curves];
}

function place({ axes }: FigureSpec, { width, height }: LabelFrame, mass: number, radius: number): Point {
  return [width * fraction(axes.mass, mass), height * (1 - fraction(axes.radius, radius))];
}

function fraction({ range: [low, high] }: LogAxis, value: number): number {
  return Math.log(value / low) / Math.log(high / low);
}

function labelBox([x, y]: Point, text: string, shift: number): Box {
  const left = x + labelGap;
  const top = y + shift - lineHeight / 2;
  return { left, right: left + characterWidth * text.length, top, bottom: top + lineHeight };
}

const overlaps = (a: Box) => (b: Box) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** Half a symbol may reach into a label's box from outside; the end of the label's own curve lies left of it. */
const isInside =
  ({ left, right, top, bottom }: Box) =>
  ([x, y]: Point) =>
    x > left - 3 && x < right + 5 && y > top - 5 && y < bottom + 5;

export const labelWidth = (text: string): number => characterWidth * text.length + labelGap;
