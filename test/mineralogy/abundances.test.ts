import { describe, expect, it } from "vitest";
import { parseAbundances, solarAbundances } from "../../src/mineralogy/abundances.ts";
import { expectClose } from "../support/expectClose.ts";

const ratio = (abundances: ReturnType<typeof parseAbundances>, element: string): number =>
  10 ** (abundances[element].logNumber - abundances.Mg.logNumber);

describe("parseAbundances", () => {
  it("reads number ratios with errors", () => {
    const abundances = parseAbundances("Fe/Mg=0.81+-0.04, Si/Mg=0.91±0.05");
    expectClose(ratio(abundances, "Fe"), 0.81, { rel: 1e-14, because: "as given" });
    expectClose(abundances.Fe.sigma, 0.04 / (0.81 * Math.LN10), { rel: 1e-14, because: "d log10 x" });
    expect(abundances.Mg).toEqual({ logNumber: 0, sigma: 0 });
  });

  it("reads logarithms on a named scale", () => {
    const sun = parseAbundances("[Fe/H]=0,[Mg/H]=0,[Si/H]=0", "asplund2021");
    expectClose(ratio(sun, "Fe"), ratio(solarAbundances("asplund2021"), "Fe"), { rel: 1e-14, because: "the Sun" });
    const rich = parseAbundances("[Fe/H]=0.1+-0.03,[Mg/H]=-0.1,[Si/H]=0", "asplund2021");
    expectClose(ratio(rich, "Fe") / ratio(sun, "Fe"), 10 ** 0.2, { rel: 1e-13, because: "0.2 dex" });
    expect(rich.Fe.sigma).toBe(0.03);
  });

  it("knows three Suns with their published ratios", () => {
    // Molar Fe/Mg and Si/Mg: 0.813, 0.912 (Asplund 2021); 0.794, 0.813 (Asplund 2009); 0.822, 0.980 (Lodders 2003).
    for (const [scale, iron, silicon] of [
      ["asplund2021", 0.813, 0.912],
      ["asplund2009", 0.794, 0.813],
      ["lodders2003", 0.822, 0.98],
    ] as const) {
      expectClose(ratio(solarAbundances(scale), "Fe"), iron, { rel: 1e-3, because: "three digits" });
      expectClose(ratio(solarAbundances(scale), "Si"), silicon, { rel: 1e-3, because: "three digits" });
    }
  });

  it.each([
    "",
    "Fe/Mg=0.81",
    "Fe/Mg=x,Si/Mg=1",
    "Fe/Mg=-1,Si/Mg=1",
    "Fe/Mg=0.8+-0.9,Si/Mg=1",
    "Fe/Mg=0.8,Si/Mg=1,Si/Mg=1",
    "Mg/Mg=1,Fe/Mg=1,Si/Mg=1",
    "Fe/Mg=0.8,Si/Mg=1,Xe/Mg=1",
    "[Fe/H]=0,[Mg/H]=0,[Si/H]=0",
    "Fe/Mg=0.8,[Si/H]=0",
  ])("refuses %s", (text) => {
    expect(() => parseAbundances(text)).toThrow(expect.objectContaining({ code: "abundances" }));
  });

  it("refuses a mixture of both kinds, and elements the scale lacks", () => {
    expect(() => parseAbundances("[Fe/H]=0,Si/Mg=1", "asplund2021")).toThrow();
    expect(() => parseAbundances("[Fe/H]=0,[Mg/H]=0,[Si/H]=0,[Al/H]=0", "lodders2003")).toThrow(
      expect.objectContaining({ remedy: expect.stringContaining("asplund2021") }),
    );
  });
});
