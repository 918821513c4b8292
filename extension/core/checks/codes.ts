import { READING_CODES } from '../design/codes.ts';
import { ACCEPTANCE_CODES } from './acceptance.ts';
import { CHECKS } from './registry.ts';

/** Problems that arise between reading and prediction. */
const RESOLVING_CODES = [
  { code: 'no-table-figure', title: 'The property table lacks a figure' },
  { code: 'switch-not-modelled', title: 'This kind of switch is not predicted' },
] as const;

/** What the tool itself may have to say. */
const OWN_CODES = [{ code: 'internal-failure', title: 'The tool itself failed' }] as const;

/** The closed list of problem codes, each with the title of its section in `extension/docs/checks.md`. */
export const PROBLEM_CODES: readonly { readonly code: string; readonly title: string }[] = [
  ...CHECKS,
  ...ACCEPTANCE_CODES,
  ...RESOLVING_CODES,
  ...READING_CODES,
  ...OWN_CODES,
];
