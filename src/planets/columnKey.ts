const signs: readonly (readonly [RegExp, string])[] = [
  [/ρ/g, "rho"],
  [/σ/g, "_sigma_"],
  [/[δΔ∆]/g, "_delta_"],
  [/[⊕]/g, "_earth_"],
  [/[♃]/g, "_jupiter_"],
  [/[☉⊙]/g, "_sun_"],
  [/[*★⋆]/g, "_star_"],
];

/** A column name reduced to what is compared: `[Fe/H]`, `Fe/H` and `fe_h` are one, and so are `R_*` and `r_star`. */
export function columnKey(name: string): string {
  let key = name;
  for (const [sign, word] of signs) key = key.replace(sign, word);
  return key
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, "_")
    .replace(/^_|_$/g, "");
}

/** The key of a name in camel case, e.g. `massEarth` as `mass_earth`. */
export const camelKey = (name: string): string => columnKey(name.replace(/([a-z])(?=[A-Z])/g, "$1_"));
