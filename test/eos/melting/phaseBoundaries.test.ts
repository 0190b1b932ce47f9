import { describe, expect, it } from "vitest";
import { boundaryPressure, mantleBoundaries } from "../../../src/eos/melting/phaseBoundaries.ts";
import { GPA } from "../../../src/units/constants.ts";
import { expectClose } from "../../support/expectClose.ts";

describe("mantleBoundaries", () => {
  it("lie near the Earth's seismic discontinuities on a warm geotherm", () => {
    // Pressures at 400 and 670 km depth from the density of PREM: 13.36 and 23.85 GPa.
    expectClose(boundaryPressure(mantleBoundaries.olivineToWadsleyite, 1750), 13.36 * GPA, {
      rel: 0.05,
      because: "published spread",
    });
    expectClose(boundaryPressure(mantleBoundaries.ringwooditeToBridgmanite, 1900), 23.85 * GPA, {
      rel: 0.05,
      because: "published spread",
    });
  });

  it("give post-perovskite the published line", () => {
    // Ono & Oganov 2005: P = 112.5 GPa + 7 MPa/K T.
    expectClose(boundaryPressure(mantleBoundaries.bridgmaniteToPostPerovskite, 0), 112.5 * GPA, {
      rel: 1e-12,
      because: "the same line written from 0 K",
    });
    // Murakami et al. 2004: above 125 GPa at 2500 K.
    expect(boundaryPressure(mantleBoundaries.bridgmaniteToPostPerovskite, 2500)).toBeGreaterThan(125 * GPA);
  });

  it("follow one another in pressure at mantle temperatures", () => {
    const boundaries = Object.values(mantleBoundaries);
    for (const temperature of [1000, 1600, 2000]) {
      const pressures = boundaries.map((boundary) => boundaryPressure(boundary, temperature));
      expect(pressures).toEqual([...pressures].sort((a, b) => a - b));
    }
  });
});
