import { relationRules } from "./relationRules.ts";
import type { Rule } from "./rule.ts";
import { centralPressure } from "./rules/centralPressure.ts";
import { collidingName } from "./rules/collidingName.ts";
import { denserThanIron } from "./rules/denserThanIron.ts";
import { deuteriumLimit } from "./rules/deuteriumLimit.ts";
import { duplicateName } from "./rules/duplicateName.ts";
import { emptyName } from "./rules/emptyName.ts";
import { errorEqualsValue } from "./rules/errorEqualsValue.ts";
import { extremeDensity } from "./rules/extremeDensity.ts";
import { lighterThanHydrogen } from "./rules/lighterThanHydrogen.ts";
import { limitWithUncertainties } from "./rules/limitWithUncertainties.ts";
import { minimumMassAsMass } from "./rules/minimumMassAsMass.ts";
import { minimumMassFlagged } from "./rules/minimumMassFlagged.ts";
import { missingUncertainty } from "./rules/missingUncertainty.ts";
import { oneSidedUncertainty } from "./rules/oneSidedUncertainty.ts";
import { outlyingPublication } from "./rules/outlyingPublication.ts";
import { relationFlagged } from "./rules/relationFlagged.ts";
import { relationUnflagged } from "./rules/relationUnflagged.ts";
import { repeatedValue } from "./rules/repeatedValue.ts";
import { smoothCurve } from "./rules/smoothCurve.ts";
import { status } from "./rules/status.ts";
import { theoreticalValue } from "./rules/theoreticalValue.ts";
import { twinColumns } from "./rules/twinColumns.ts";
import { uncertaintyBelowStar } from "./rules/uncertaintyBelowStar.ts";
import { unitSlip } from "./rules/unitSlip.ts";
import { unreadableCell } from "./rules/unreadableCell.ts";
import { zeroPlusError } from "./rules/zeroPlusError.ts";
import { zeroUncertainty } from "./rules/zeroUncertainty.ts";

/** Every rule, in the order in which a row's findings are listed. */
export const rules: readonly Rule[] = [
  unreadableCell,
  unitSlip,
  ...relationRules,
  twinColumns,
  repeatedValue,
  denserThanIron,
  lighterThanHydrogen,
  extremeDensity,
  centralPressure,
  deuteriumLimit,
  minimumMassAsMass,
  minimumMassFlagged,
  relationFlagged,
  relationUnflagged,
  smoothCurve,
  theoreticalValue,
  missingUncertainty,
  oneSidedUncertainty,
  zeroUncertainty,
  uncertaintyBelowStar,
  limitWithUncertainties,
  zeroPlusError,
  errorEqualsValue,
  status,
  emptyName,
  duplicateName,
  collidingName,
  outlyingPublication,
];
