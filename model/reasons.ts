/** Why something could not be done, or should be looked at: the thing, the rule and the amount, never a sentence. */
import type { Ticks } from './length/ticks';
import type { RuleId } from './rules/ids';
import type { ThingRef } from './things';

export type ReasonCode =
  // walls
  | 'runHasNoLength'
  | 'runsCross'
  | 'runsOverlap'
  | 'cornersCoincide'
  | 'tooManyRunsMeet'
  | 'cornerTooSharp'
  | 'runTooShortForCorner'
  | 'unitHeightsDiffer'
  // openings
  | 'openingPastEnd'
  | 'openingsOverlap'
  | 'openingUpsideDown'
  | 'openingAboveWall'
  | 'lintelBearingPastEnd'
  // survey
  | 'readingOffDrawing'
  | 'surveyAssumed'
  | 'cornerNotRead'
  | 'beddingOverMost'
  | 'rereadingsDiffer'
  | 'levelsNotClosed'
  | 'misclosureUnchecked'
  | 'misclosureOverMost'
  | 'collimationOverMost'
  // coursing and lifts
  | 'heightBelowFirstCourse'
  | 'hardHeightNotMet'
  | 'softHeightMissed'
  | 'heightInsideBeam'
  | 'noCoursesFit'
  | 'liftTooTall'
  | 'beamsOverlap'
  | 'noWallTop'
  // bond
  | 'straightJoint'
  | 'lapUnderLeast'
  | 'pieceUnderLeast'
  | 'runDoesNotBond'
  // poles, braces, lines
  | 'poleBlockedByFrame'
  | 'poleBlocked'
  | 'braceBlocked'
  | 'braceAngleOut'
  | 'braceTooLong'
  | 'poleTooShort'
  | 'lineSags'
  | 'searchBoundReached';

export interface Reason {
  readonly code: ReasonCode;
  /** `blocked`: that part has no answer. `warning`: an answer that breaks a rule. `note`: worth knowing. */
  readonly weight: 'blocked' | 'warning' | 'note';
  /** The thing it is about, where it is shown. */
  readonly thing: ThingRef;
  /** What stands in its way, when another thing does. */
  readonly against?: readonly ThingRef[];
  readonly rule?: RuleId;
  /** By how much, in ticks. */
  readonly amount?: Ticks;
  /** What would do: the nearest below and above, or the least change that frees it, in ticks. */
  readonly nearest?: { readonly below: Ticks | null; readonly above: Ticks | null };
  readonly change?:
    | { readonly kind: 'swapHinge' | 'openOtherWay' | 'notUsedDuringWork'; readonly thing: ThingRef }
    | { readonly kind: 'setOff' | 'shorterLeg' | 'longerLeg' | 'move'; readonly thing: ThingRef; readonly by: Ticks };
}
