/** From the densest class to the least dense; the three curves between them are the boundaries. */
export const CLASS_CODES = ["denser-than-iron", "iron-silicate", "silicate-water", "lighter-than-water"] as const;
export type ClassCode = (typeof CLASS_CODES)[number];

export interface Verdict {
  /** The class, or `undecided` where none is probable enough. */
  readonly code: ClassCode | "undecided";
  /** One plain sentence with its probabilities. */
  readonly statement: string;
}

/** What the boundary compositions are called in a statement, densest first. */
export type BoundaryLabels = readonly [string, string, string];

/** A class is stated alone from this probability on: that of one standard error. */
const STATED_FROM = 0.68;
/** An undecided verdict names the most probable classes until they hold this much together. */
const NAMED_UNTIL = 0.95;

/** Puts the four class probabilities, densest class first, into one plain statement. */
export function verdictFor(probabilities: readonly number[], labels: BoundaryLabels): Verdict {
  const phrases = classPhrases(labels);
  const ranked = [0, 1, 2, 3].sort((a, b) => probabilities[b] - probabilities[a]);
  const [best] = ranked;
  const stated = (c: number): string => `${phrases[c]} (p ${writtenProbability(probabilities[c])})`;
  if (probabilities[best] >= STATED_FROM) {
    // Beyond the outer curves the fractions still given are those of the nearest members of families that do not fit.
    const warning = best === 0 || best === 3 ? "; no mixture of them fits" : "";
    return { code: CLASS_CODES[best], statement: stated(best) + warning };
  }
  let held = 0;
  const named = ranked.filter((c) => {
    const needed = held < NAMED_UNTIL;
    held += probabilities[c];
    return needed;
  });
  return { code: "undecided", statement: `cannot be told apart: ${named.map(stated).join(" or ")}` };
}

/** What a planet of each class is said to be, densest first. */
export function classPhrases([dense, middle, light]: BoundaryLabels): string[] {
  return [
    `denser than ${dense}`,
    `between ${dense} and ${middle}`,
    `between ${middle} and ${light}`,
    `less dense than ${light}`,
  ];
}

/** Two digits, but never a certainty that is none. */
function writtenProbability(p: number): string {
  if (p > 0.99) return "> 0.99";
  if (p < 0.01) return "< 0.01";
  return `= ${p.toFixed(2)}`;
}
