import type { UnitFault } from './unit.ts';

/** Why a text is no quantity, and the part of it that is to blame. */
export interface Failure {
  readonly failure:
    | 'number'
    | 'missing-unit'
    | 'unit'
    | 'dimension'
    | 'overflow'
    | 'underflow'
    | 'tolerance-empty'
    | 'tolerance-unreadable'
    | 'tolerance-negative'
    | 'tolerance-dimension'
    | 'tolerance-celsius-percent';
  readonly start: number;
  readonly end: number;
  /** For a unit that can't be read: what is wrong within `start` to `end`. */
  readonly detail?: UnitFault;
}
