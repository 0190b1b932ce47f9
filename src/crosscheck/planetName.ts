/** Entities that planet lists hold; numeric ones are decoded by number. */
const entities: Readonly<Record<string, string>> = {
  nbsp: " ",
  amp: "&",
  apos: "'",
  quot: '"',
  minus: "-",
  ndash: "-",
};

/** Greek letters in order, each with the abbreviation of star catalogues where that is shorter. */
const greek: readonly (readonly [letter: string, name: string, short: string])[] = [
  ["α", "alpha", "alf"],
  ["β", "beta", "bet"],
  ["γ", "gamma", "gam"],
  ["δ", "delta", "del"],
  ["ε", "epsilon", "eps"],
  ["ζ", "zeta", "zet"],
  ["η", "eta", "eta"],
  ["θ", "theta", "tet"],
  ["ι", "iota", "iot"],
  ["κ", "kappa", "kap"],
  ["λ", "lambda", "lam"],
  ["μ", "mu", "mu"],
  ["ν", "nu", "nu"],
  ["ξ", "xi", "ksi"],
  ["ο", "omicron", "omi"],
  ["π", "pi", "pi"],
  ["ρ", "rho", "rho"],
  ["σ", "sigma", "sig"],
  ["τ", "tau", "tau"],
  ["υ", "upsilon", "ups"],
  ["φ", "phi", "phi"],
  ["χ", "chi", "chi"],
  ["ψ", "psi", "psi"],
  ["ω", "omega", "ome"],
];

const greekNames = new Map(
  greek.flatMap(([letter, name, short]) => [letter, name, short].map((form) => [form, name] as const)),
);

/** Code points beyond Unicode, as a numeric entity may name them, stand as they are. */
const fromCode = (code: number, raw: string) => (code > 0 && code <= 0x10ffff ? String.fromCodePoint(code) : raw);

function decodeEntities(text: string): string {
  return text.replace(/&(?:#(\d+)|#x([0-9a-f]+)|(\w+));/gi, (raw, decimal, hex, name) => {
    if (decimal) return fromCode(Number(decimal), raw);
    if (hex) return fromCode(Number.parseInt(hex, 16), raw);
    const known = name.toLowerCase();
    return (Object.hasOwn(entities, known) ? entities[known] : greekLetter(known)) ?? raw;
  });
}

const greekLetter = (name: string) => greek.find(([, full]) => full === name)?.[0];

/** Words of letters, numbers without padding zeros, and signs of declination, which keep BD+08 apart from BD-08. */
function words(text: string): string[] {
  const plain = decodeEntities(text)
    .normalize("NFKC")
    .replace(/['"`´‘’“”]/g, "")
    .replace(/([α-ω])/gi, " $1 ");
  return (plain.match(/\p{L}+|[+]?\d+(?:\.\d+)?/gu) ?? []).map((word) => unpad(greekName(word)));
}

const greekName = (word: string) => greekNames.get(word.toLowerCase()) ?? word;
const unpad = (word: string) => word.replace(/^([+]?)0+(?=\d)/, "$1");

/**
 * A name reduced to what tells planets apart: entities, blanks of every kind, dashes, underscores, brackets,
 * apostrophes, zero padding and the spelling of Greek letters do not count, case does. `Foo-07_b` and `Foo 7b` give
 * `Foo 7 b`. Empty where nothing is left.
 * Checked by test/crosscheck/planetName.test.ts
 */
export function nameKey(name: string): string {
  return words(name).join(" ");
}

/** A name key without regard to case, for use where it is unambiguous. */
export const foldCase = (key: string): string => key.toLowerCase();

/** The star's part of a planet's name key, i.e. without a last lower-case letter b to z; undefined if there is none. */
export function hostKey(key: string): string | undefined {
  return /^(.+) [b-z]$/.exec(key)?.[1];
}
