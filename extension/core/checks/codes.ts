import { READING_CODES } from '../design/codes.ts';
import { CHECKS } from './registry.ts';

/** Problems that arise between reading and prediction. */
const RESOLVING_CODES = [
  { code: 'no-table-figure', title: 'The property table lacks a figure' },
  { code: 'switch-not-modelled', title: 'This kind of switch is not predicted' },
] as const;

/** How a quantity can be misread; raised while reading. */
const QUANTITY_CODES = [
  { code: 'missing-unit', title: 'A number has no unit' },
  { code: 'unknown-unit', title: 'A unit is not known' },
  { code: 'ambiguous-unit', title: 'A unit can be read in two ways' },
  { code: 'wrong-dimension', title: 'A unit measures something else' },
  { code: 'not-a-quantity', title: 'A text is not a number with a unit' },
  { code: 'not-finite', title: 'A number is too large or too small to hold' },
  { code: 'bad-tolerance', title: 'A tolerance does not fit its value' },
] as const;

/** What the tool itself may have to say. */
const OWN_CODES = [{ code: 'internal-failure', title: 'The tool itself failed' }] as const;

/** The closed list of problem codes, each with the title of its section in `extension/docs/checks.md`. */
export const PROBLEM_CODES: readonly { readonly code: string; readonly title: string }[] = [
  ...CHECKS,
  ...RESOLVING_CODES,
  ...QUANTITY_CODES,
  ...READING_CODES,
  ...OWN_CODES,
];
