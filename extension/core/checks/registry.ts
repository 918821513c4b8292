import { beamBeyondMedium } from './beam-beyond-medium.ts';
import type { Check } from './check.ts';
import { fewRoundTrips } from './few-round-trips.ts';
import { fluenceAfterPause } from './fluence-after-pause.ts';
import { fluenceNearThreshold } from './fluence-near-threshold.ts';
import { fluenceOverThreshold } from './fluence-over-threshold.ts';
import { holdOff } from './hold-off.ts';
import { holdOffUnknown } from './hold-off-unknown.ts';
import { impossibleTiming } from './impossible-timing.ts';
import { longPulse } from './long-pulse.ts';
import { lowReflectivity } from './low-reflectivity.ts';
import { lowerLevelBottleneck } from './lower-level-bottleneck.ts';
import { mediumTooLong } from './medium-too-long.ts';
import { noPulse } from './no-pulse.ts';
import { opensBeforePumpEnd } from './opens-before-pump-end.ts';
import { pumpWavelength } from './pump-wavelength.ts';
import { requirementMissed } from './requirement-missed.ts';
import { requirementNotJudged } from './requirement-not-judged.ts';
import { secondPulse } from './second-pulse.ts';
import { thresholdConditions } from './threshold-conditions.ts';
import { tooManyExcited } from './too-many-excited.ts';
import { trainUnsettled } from './train-unsettled.ts';

/** Every check of a predicted design, in the order of the documentation. */
export const CHECKS: readonly Check[] = [
  noPulse,
  holdOff,
  holdOffUnknown,
  requirementMissed,
  requirementNotJudged,
  fluenceOverThreshold,
  fluenceNearThreshold,
  fluenceAfterPause,
  thresholdConditions,
  impossibleTiming,
  opensBeforePumpEnd,
  trainUnsettled,
  secondPulse,
  pumpWavelength,
  mediumTooLong,
  tooManyExcited,
  beamBeyondMedium,
  lowReflectivity,
  fewRoundTrips,
  longPulse,
  lowerLevelBottleneck,
];
