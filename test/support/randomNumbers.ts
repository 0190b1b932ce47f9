/** Random numbers that are the same in every run. */
export interface RandomNumbers {
  /** Above 0 and below 1, all alike. */
  uniform(): number;
  /** Of mean 0 and variance 1. */
  normal(): number;
}

/** Uniform numbers by mulberry32 (T. Ettinger 2017; 32 bits of state, period 2^32), normal ones of them by Box & Muller 1958. */
export function randomNumbers(seed: number): RandomNumbers {
  let state = seed | 0;
  const uniform = (): number => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return (((mixed ^ (mixed >>> 14)) >>> 0) + 0.5) / 2 ** 32;
  };
  return {
    uniform,
    normal: () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform()),
  };
}
