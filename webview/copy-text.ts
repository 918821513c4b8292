import type { ReadoutState } from '../extension/protocol/readout.ts';
import { caution } from './parts/caution.ts';

/** The figures as plain text, one a line, for a report or a message. */
export function copyText(state: ReadoutState): string {
  const figures = [...state.headline, ...state.groups.flatMap((group) => group.figures)];
  const seen = new Set<string>();
  const lines = figures.flatMap(({ label, value }) => {
    if (value === undefined || seen.has(label)) return [];
    seen.add(label);
    return [`${label}: ${value}`];
  });
  const surfaces = state.surfaces.map(
    ({ name, fluence, threshold, margin }) =>
      `${name}: ${fluence}${threshold === undefined ? '' : ` against ${threshold}`}${margin === undefined ? '' : `, margin ${margin}`}`,
  );
  const requirements = state.requirements.map(({ name, required, predicted, verdict }) => {
    const met = { good: 'met', look: 'near', bad: 'missed', unknown: 'not predicted' }[verdict];
    return `${name} ${required}: ${predicted === undefined ? met : `${met} (${predicted})`}`;
  });
  const parts = [[state.title], lines, surfaces, requirements, [caution]];
  return parts
    .filter((part) => part.length > 0)
    .map((part) => part.join('\n'))
    .join('\n\n');
}
