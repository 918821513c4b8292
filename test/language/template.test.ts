import { expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { template } from '../../extension/language/template.ts';

test('a new design predicts a pulse and has nothing to mend', () => {
  const { prediction, problems } = analyse(template());
  expect(prediction?.pulse).toBeDefined();
  expect(problems.filter(({ severity }) => severity !== 'information')).toEqual([]);
  expect(prediction?.requirements.map(({ met }) => met)).toEqual([true, true]);
});
