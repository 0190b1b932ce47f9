import { thermalMixture } from "../eos/thermal/thermalMixture.ts";
import type { WarmPhase } from "../eos/thermal/warmStack.ts";
import { GPA } from "../units/constants.ts";
import { endMemberEos } from "./endMember.ts";
import { type MantleComposition, mantleMineralogy } from "./mantleMineralogy.ts";

/** The end members are fitted to data from the Earth's mantle, whose base is at this pressure [Pa]. */
const CALIBRATED_TO = 136 * GPA;

/**
 * The phases of a mantle, ready for `warmStack`: in each domain the intimate mixture of its minerals.
 * Checked test/mineralogy/mantlePhases.test.ts
 */
export function mantlePhases(composition: MantleComposition): WarmPhase[] {
  return mantleMineralogy(composition).map(({ domain, minerals }) => ({
    name: domain.name,
    form: "finite-strain-debye",
    eos: thermalMixture(
      minerals.map(({ endMember, massFraction }) => ({ eos: endMemberEos(endMember), massFraction })),
    ),
    stableFrom: domain.stableFrom,
    calibratedTo: CALIBRATED_TO,
    source: {
      citation: minerals[0].endMember.source.citation,
      note: [`minerals by mass balance: ${minerals.map(({ endMember }) => endMember.name).join(", ")}`, domain.remark]
        .filter((part) => part !== undefined)
        .join("; "),
    },
  }));
}
