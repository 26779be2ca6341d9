import { acrossBackOverUnderarmToUnderarm } from './across-back-over-underarm-to-underarm.js';
import { acrossFrontAgainstBack } from './across-front-against-back.js';
import { backWaistOverFullBack } from './back-waist-over-full-back.js';
import { brimSidesDiffer } from './brim-sides-differ.js';
import type { Check } from './check.js';
import { corsetWaistOverBottom } from './corset-waist-over-bottom.js';
import { cuffOverSleeveWidest } from './cuff-over-sleeve-widest.js';
import { derivedAgainstMeasured } from './derived-against-measured.js';
import { doubledOverTissue } from './doubled-over-tissue.js';
import { elbowOverSleeveWidest } from './elbow-over-sleeve-widest.js';
import { type Finding, severities } from './finding.js';
import { gapOverATenth } from './gap-over-a-tenth.js';
import { halfTypedAsWhole } from './half-typed-as-whole.js';
import { hemShorterThanWaist } from './hem-shorter-than-waist.js';
import { hipWithoutDepth } from './hip-without-depth.js';
import { hoopAgainstEllipse } from './hoop-against-ellipse.js';
import { hoopsOutOfOrder } from './hoops-out-of-order.js';
import { impossibleLength } from './impossible-length.js';
import { innerWaistBandOverWaist } from './inner-waist-band-over-waist.js';
import { insideLegOverOutsideLeg } from './inside-leg-over-outside-leg.js';
import { leftAgainstRight } from './left-against-right.js';
import { levelNotSaid } from './level-not-said.js';
import { longerThanTape } from './longer-than-tape.js';
import { outsideOwnGarments } from './outside-own-garments.js';
import { outsideSoftRange } from './outside-soft-range.js';
import { palmOverGloveLength } from './palm-over-glove-length.js';
import { readingDecimalSlip } from './reading-decimal-slip.js';
import { requiredMissingWithoutReason } from './required-missing-without-reason.js';
import { restLongerThanTape } from './rest-longer-than-tape.js';
import { roundsApart } from './rounds-apart.js';
import { type CheckSheet, viewSheet } from './sheet-view.js';
import { sleeveOverCentreBackToCuff } from './sleeve-over-centre-back-to-cuff.js';
import { sleeveUnderOverOuter } from './sleeve-under-over-outer.js';
import { tapeOffsetForgotten } from './tape-offset-forgotten.js';
import { tooRoundThroughout } from './too-round-throughout.js';
import { transposedDigits } from './transposed-digits.js';
import { treadOverSole } from './tread-over-sole.js';
import { waistDiffersBetweenParts } from './waist-differs-between-parts.js';
import { waistOverBust } from './waist-over-bust.js';
import { waistOverHip } from './waist-over-hip.js';
import { waistToHemOverNeckToHem } from './waist-to-hem-over-neck-to-hem.js';
export const checks: readonly Check[] = [
  impossibleLength,
  restLongerThanTape,
  readingDecimalSlip,
  halfTypedAsWhole,
  outsideSoftRange,
  outsideOwnGarments,
  longerThanTape,
  transposedDigits,
  roundsApart,
  tapeOffsetForgotten,
  tooRoundThroughout,
  doubledOverTissue,
  gapOverATenth,
  leftAgainstRight,
  derivedAgainstMeasured,
  hemShorterThanWaist,
  waistToHemOverNeckToHem,
  waistOverBust,
  waistOverHip,
  acrossBackOverUnderarmToUnderarm,
  acrossFrontAgainstBack,
  cuffOverSleeveWidest,
  elbowOverSleeveWidest,
  sleeveUnderOverOuter,
  sleeveOverCentreBackToCuff,
  insideLegOverOutsideLeg,
  backWaistOverFullBack,
  corsetWaistOverBottom,
  hoopAgainstEllipse,
  hoopsOutOfOrder,
  palmOverGloveLength,
  treadOverSole,
  brimSidesDiffer,
  innerWaistBandOverWaist,
  waistDiffersBetweenParts,
  hipWithoutDepth,
  levelNotSaid,
  requiredMissingWithoutReason,
];

/** Every finding on a sheet: stops first, then questions, then notes. Never throws. */
export function runChecks(sheet: CheckSheet): readonly Finding[] {
  const view = viewSheet(sheet);
  const findings = checks.flatMap((check) => check.run(view));
  return severities.flatMap((severity) => findings.filter((finding) => finding.severity === severity));
}
