import { acrossBackOverUnderarmToUnderarm } from './across-back-over-underarm-to-underarm.js';
import { brimSidesDiffer } from './brim-sides-differ.js';
import { type Check } from './check.js';
import { cuffOverSleeveWidest } from './cuff-over-sleeve-widest.js';
import { derivedAgainstMeasured } from './derived-against-measured.js';
import { type Finding, severities } from './finding.js';
import { halfTypedAsWhole } from './half-typed-as-whole.js';
import { hemShorterThanWaist } from './hem-shorter-than-waist.js';
import { impossibleLength } from './impossible-length.js';
import { innerWaistBandOverWaist } from './inner-waist-band-over-waist.js';
import { insideLegOverOutsideLeg } from './inside-leg-over-outside-leg.js';
import { outsideSoftRange } from './outside-soft-range.js';
import { readingDecimalSlip } from './reading-decimal-slip.js';
import { requiredMissingWithoutReason } from './required-missing-without-reason.js';
import { roundsApart } from './rounds-apart.js';
import { type CheckSheet, viewSheet } from './sheet-view.js';
import { sleeveUnderOverOuter } from './sleeve-under-over-outer.js';
import { waistDiffersBetweenParts } from './waist-differs-between-parts.js';
import { waistOverBust } from './waist-over-bust.js';
import { waistToHemOverNeckToHem } from './waist-to-hem-over-neck-to-hem.js';

export const checks: readonly Check[] = [
  impossibleLength,
  readingDecimalSlip,
  halfTypedAsWhole,
  outsideSoftRange,
  roundsApart,
  hemShorterThanWaist,
  waistToHemOverNeckToHem,
  insideLegOverOutsideLeg,
  waistOverBust,
  acrossBackOverUnderarmToUnderarm,
  cuffOverSleeveWidest,
  sleeveUnderOverOuter,
  derivedAgainstMeasured,
  innerWaistBandOverWaist,
  waistDiffersBetweenParts,
  brimSidesDiffer,
  requiredMissingWithoutReason,
];

/** Every finding on a sheet: stops first, then questions, then notes. Never throws. */
export function runChecks(sheet: CheckSheet): readonly Finding[] {
  const view = viewSheet(sheet);
  const findings = checks.flatMap((check) => check.run(view));
  return severities.flatMap((severity) => findings.filter((finding) => finding.severity === severity));
}
