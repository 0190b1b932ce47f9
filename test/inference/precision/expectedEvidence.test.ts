import { describe, expect, test } from "vitest";
import { expectedEvidence } from "../../../src/inference/precision/expectedEvidence.ts";
import { contrastAt, separation } from "../../../src/inference/precision/separation.ts";
import { expectClose } from "../../support/expectClose.ts";
import { measurement, powerLaw, quoted, range } from "../powerLaws.ts";
import { straightLine, wholeRange } from "./straightLines.ts";

const because = "data beyond 4.5 errors are left out, which holds 1.5e-4 of their variance";

describe("expectedEvidence", () => {
  test("is half the square of the separation for normal errors and straight, parallel curves", () => {
    const pair = { a: straightLine(1, 0.05), b: straightLine(1.2, 0.05) };
    const planned = measurement(quoted(5, 0.5), quoted(1.3, 0.06));
    const sigma = 0.2 / Math.hypot(0.06, 0.05 * 0.5);
    const evidence = expectedEvidence(planned, pair, wholeRange);
    expectClose(evidence.ifA, sigma ** 2 / 2, { rel: 2e-4, because });
    expectClose(evidence.ifB, sigma ** 2 / 2, { rel: 2e-4, because });
    expectClose(evidence.separation, sigma, { rel: 1e-4, because });
  });

  test("knows that curves of unlike slope are spread unlike by the mass error", () => {
    // E_A = gap² / 2 s_B² + ln(s_B / s_A) with s² = σ_R² + (slope σ_M)², by integrating two normals
    const pair = { a: straightLine(1, 0.02), b: straightLine(0.9, 0.08) };
    const [sA, sB] = [0.02, 0.08].map((slope) => Math.hypot(0.03, slope * 0.5));
    const gap = 0.2;
    const { ifA, ifB } = expectedEvidence(measurement(quoted(5, 0.5), quoted(1.1, 0.03)), pair, wholeRange);
    expectClose(ifA, gap ** 2 / 2 / sB ** 2 + Math.log(sB / sA), { rel: 5e-4, because });
    expectClose(ifB, gap ** 2 / 2 / sA ** 2 + Math.log(sA / sB), { rel: 5e-4, because });
  });

  test("averages unequal errors over the data they lead to", () => {
    const [minus, plus, gap] = [0.03, 0.07, 0.1];
    const pair = { a: straightLine(1, 0), b: straightLine(1 + gap, 0) };
    const { ifA, ifB } = expectedEvidence(measurement(quoted(5, 0.1), quoted(9, minus, plus)), pair, wholeRange);
    // Independently, by the midpoint rule over the quoted radius: a bar of `plus` upwards means a value quoted too low.
    const chi = (at: number, truth: number) => ((truth - at) / (truth < at ? minus : plus)) ** 2;
    const mean = (truth: number, rival: number) => {
      let [sum, total] = [0, 0];
      for (let at = truth - 0.6; at < truth + 0.6; at += 1e-5) {
        const density = Math.exp(-chi(at, truth) / 2);
        sum += (density * (chi(at, rival) - chi(at, truth))) / 2;
        total += density;
      }
      return sum / total;
    };
    expectClose(ifA, mean(1, 1 + gap), { rel: 2e-3, because: "8 nodes pass over the kink at the rival's radius" });
    expectClose(ifB, mean(1 + gap, 1), { rel: 2e-3, because: "8 nodes pass over the kink at the rival's radius" });
  });

  test("agrees with the linear formula for small errors, and leaves it where curves bend within a large one", () => {
    const pair = { a: powerLaw(1.1), b: powerLaw(1.15) };
    const both = (relative: number) => {
      const radius = 1.1 * 5 ** 0.27;
      const planned = measurement(quoted(5, 5 * relative), quoted(radius, (radius * relative) / 3));
      const linear = separation(contrastAt(pair, 5), { mass: 5 * relative, radius: (radius * relative) / 3 });
      return expectedEvidence(planned, pair, range).separation / linear;
    };
    expectClose(both(0.05), 1, { rel: 1e-3, because: "the slopes of the two differ by 5 %, to second order" });
    expect(Math.abs(both(0.6) - 1)).toBeGreaterThan(0.02);
  });
});
