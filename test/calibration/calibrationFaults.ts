import type { FractionCalibration } from "./fractionCalibration.ts";

/** A right posterior fails one of so many tests of uniformity with this probability. */
const FALSE_ALARM = 0.01;
/** Coverages within these of what they should be are good enough, … */
const BANDS = [
  { interval: "68 %", share: 0.68, band: 0.02, of: (found: FractionCalibration) => found.coverage68 },
  { interval: "95 %", share: 0.95, band: 0.01, of: (found: FractionCalibration) => found.coverage95 },
];
/** … but few planets cannot tell better than this many standard deviations of the binomial distribution. */
const DEVIATIONS = 3.5;

/** What is wrong with the calibration of fractions, in words; nothing if all is well. */
export function calibrationFaults(all: readonly FractionCalibration[]): string[] {
  return all.flatMap((found) => {
    const { family, component, planets, uniformP } = found;
    const faults = BANDS.flatMap(({ interval, share, band, of }) => {
      const allowed = Math.max(band, DEVIATIONS * Math.sqrt((share * (1 - share)) / planets));
      const covered = of(found);
      if (Math.abs(covered - share) <= allowed) return [];
      return [`the ${interval} interval covers ${percent(covered)}, allowed are ${percent(allowed)} more or less`];
    });
    const least = FALSE_ALARM / all.length;
    if (!(uniformP > least)) faults.push(`ranks are uniform with p = ${uniformP.toExponential(1)}, least ${least}`);
    return faults.map((fault) => `${family}, ${component}: ${fault}`);
  });
}

function percent(share: number): string {
  return `${(100 * share).toFixed(2)} %`;
}
