import { element } from '../dom.ts';

/** Stands at the foot of every readout, whatever else is shown; a test holds it to the command's own words. */
export const caution =
  'These figures are predictions, not measurements, and no interlock. Beams of this class blind and burn, also by reflection. Local codes, the laser safety officer and licensed practice decide.';

export function cautionFoot(): HTMLElement {
  return element(
    'footer',
    { class: 'caution' },
    element('span', { class: 'mark', 'aria-hidden': 'true' }, '⚠'),
    caution,
  );
}
