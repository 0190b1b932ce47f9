import type { Family } from "../../src/library/family.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";

const library = loadLibrary(shippedFiles);

export const shippedFamilies: readonly Family[] = library.families.map(({ name }) => library.family(name));

/** No shipped family prefers anything; this one does in both ways there are. */
export const statedPriors: Family = {
  ...library.family("iron-silicate-water"),
  name: "stated-priors",
  prior: {
    fractions: "flat",
    logUniform: [{ component: "water", from: 1e-4, to: 0.2 }],
    normal: [{ component: "iron", among: ["iron", "silicate"], mean: 0.33, sigma: 0.1 }],
  },
};
