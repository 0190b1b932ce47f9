/**
 * Number of ticks to allow on a logarithmic axis so that Plotly, which aims at one tick in span/count decades, picks
 * the densest labels that fit: 1, 2, 3 … 9 of every decade below 0.3, 1, 2 and 5 up to 0.7, decades alone above.
 * Below one decade it steps evenly instead.
 */
export function tickCount(spanDecades: number, pixels: number, labelPixels: number): number {
  const fits = (closestDecades: number) => (pixels / spanDecades) * closestDecades >= labelPixels;
  if (spanDecades < 1) return Math.max(2, Math.floor(pixels / (5 * labelPixels)));
  if (fits(Math.log10(10 / 9))) return Math.ceil(spanDecades / 0.28);
  if (fits(Math.log10(2))) return Math.ceil(spanDecades / 0.5);
  return Math.max(1, Math.floor(spanDecades / 0.75));
}
