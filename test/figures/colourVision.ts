/** Colour as people with and without colour blindness see it, for checks of a palette. */

type Triple = readonly [number, number, number];
type Matrix = readonly [Triple, Triple, Triple];

/**
 * Full loss of one cone type, on linear sRGB: Machado, Oliveira & Fernandes 2009, IEEE Trans. Vis. Comput. Graph. 15,
 * 1291, table for severity 1.0 (from memory; every row sums to 1, so that grey stays grey).
 */
export const sights: Readonly<Record<string, Matrix>> = {
  normal: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritanopia: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};

/** Distance in OKLab (Ottosson 2020, https://bottosson.github.io/posts/oklab/); 0.02 is about a just visible step. */
export function seenDistance(first: string, second: string, sight: Matrix): number {
  const [a, b] = [first, second].map((colour) =>
    oklab(apply(sight, linearRgb(colour)).map(toUnit) as unknown as Triple),
  );
  return Math.hypot(...(a as Triple).map((value, i) => value - (b as Triple)[i as 0 | 1 | 2]));
}

/** Contrast ratio of WCAG 2.2, 1 to 21. */
export function contrast(first: string, second: string): number {
  const [a, b] = [first, second].map((colour) => {
    const [red, green, blue] = linearRgb(colour);
    return 0.2126 * red + 0.7152 * green + 0.0722 * blue + 0.05;
  }) as [number, number];
  return Math.max(a, b) / Math.min(a, b);
}

function linearRgb(colour: string): Triple {
  const channels = [1, 3, 5].map((i) => Number.parseInt(colour.slice(i, i + 2), 16) / 255);
  return channels.map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4)) as unknown as Triple;
}

const apply = (matrix: Matrix, [x, y, z]: Triple): Triple =>
  matrix.map((row) => row[0] * x + row[1] * y + row[2] * z) as unknown as Triple;

const toUnit = (value: number): number => Math.min(1, Math.max(0, value));

function oklab(rgb: Triple): Triple {
  const cones = apply(
    [
      [0.4122214708, 0.5363325363, 0.0514459929],
      [0.2119034982, 0.6806995451, 0.1073969566],
      [0.0883024619, 0.2817188376, 0.6299787005],
    ],
    rgb,
  );
  return apply(
    [
      [0.2104542553, 0.793617785, -0.0040720468],
      [1.9779984951, -2.428592205, 0.4505937099],
      [0.0259040371, 0.7827717662, -0.808675766],
    ],
    cones.map(Math.cbrt) as unknown as Triple,
  );
}
