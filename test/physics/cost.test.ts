import { describe, expect, it } from 'vitest';
import { gainShares, roundTripGain } from '../../extension/core/physics/cavity.ts';
import { integratePulse } from '../../extension/core/physics/rate-equations.ts';
import { photonsBehindSwitch } from '../../extension/core/physics/spontaneous-start.ts';
import { type Changes, cavityAndStore, flatModule, moduleWith, outcomeOf } from './modules.ts';

function statisticsOf(changes: Changes, base = moduleWith({})) {
  const module = moduleWith(changes, base);
  const { cavity, store } = cavityAndStore(module);
  const photons = photonsBehindSwitch(cavity, roundTripGain(cavity, store.ions));
  const pulse = integratePulse(cavity, gainShares(cavity, store.ions), photons, module.qSwitch.gate);
  if (!pulse) throw new Error('no pulse');
  return pulse.statistics;
}

// Counts, not times: they are the same on every machine. The bounds lie about a third above what was counted.
describe('what a time integration costs', () => {
  it.each([
    ['the demo module with its 5 ns ramp', { qSwitch: { closedLoss: 0.995, openingTime: 5e-9 } }, 1250],
    ['the same opened at once', { qSwitch: { closedLoss: 0.995 } }, 920],
    ['a ramp of 150 ns', { qSwitch: { closedLoss: 0.995, openingTime: 150e-9 } }, 2150],
  ])('%s', (_, changes, bound) => {
    expect(statisticsOf(changes).evaluations).toBeLessThan(bound);
  });

  it('is no more evaluations for twenty rings than for one inversion', () => {
    expect(statisticsOf({}, flatModule({ pump: { power: 200 } })).evaluations).toBeLessThan(950);
  });

  it('is nothing for a train that the depletion form follows', () => {
    expect(outcomeOf(moduleWith({})).train.work).toEqual({ openings: 1, steps: 0 });
  });
});
