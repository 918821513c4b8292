import { element } from '../dom.ts';

/** Stands at the foot of every readout, whatever else is shown. */
export const caution =
  'Predictions, not measurements. Beams of this class can blind and burn. Local codes, the laser safety officer and licensed practice decide.';

export function cautionFoot(): HTMLElement {
  return element(
    'footer',
    { class: 'caution' },
    element('span', { class: 'mark', 'aria-hidden': 'true' }, '⚠'),
    caution,
  );
}
