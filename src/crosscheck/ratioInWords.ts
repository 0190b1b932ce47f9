/** A ratio for people, from its logarithm: `3.12 times`. */
export function times(logRatio: number): string {
  return `${Number(Math.exp(logRatio).toPrecision(3))} times`;
}
