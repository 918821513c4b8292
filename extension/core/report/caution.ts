/** Stands at the foot of every readout. */
export const CAUTION = [
  'These figures are predictions, not measurements, and no interlock. Beams of this',
  'class blind and burn, also by reflection. Local codes, the laser safety officer',
  'and licensed practice decide.',
].join('\n');
