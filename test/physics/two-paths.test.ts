import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gainShares, roundTripGain } from '../../extension/core/physics/cavity.ts';
import { fire } from '../../extension/core/physics/fire.ts';
import { integratePulse } from '../../extension/core/physics/rate-equations.ts';
import { photonsBehindSwitch } from '../../extension/core/physics/spontaneous-start.ts';
import { designs } from './designs.ts';
import { apart, cavityAndStore } from './modules.ts';

describe('the depletion form and the rate equations in time', () => {
  it('give one pulse: energy, peak, width and delay to 1e-6 over the design space', () => {
    fc.assert(
      fc.property(designs, (module) => {
        const { cavity, store } = cavityAndStore(module);
        const fired = fire(cavity, store);
        expect(fired?.model).toBe('depletion');
        const gain = gainShares(cavity, store.ions);
        const photons = photonsBehindSwitch(cavity, roundTripGain(cavity, store.ions));
        const timed = integratePulse(cavity, gain, photons, module.qSwitch.gate);
        expect(timed, 'the rate equations find a pulse').toBeDefined();
        const perPhoton = (cavity.photon * cavity.outputLog) / cavity.roundTripTime;
        expect(timed!.followed).toBe(false);
        expect(apart(timed!.depletion * cavity.energyUnit * cavity.outputLog, fired!.energy)).toBeLessThan(1e-6);
        expect(apart(timed!.peakPhotons * perPhoton, fired!.peakPower)).toBeLessThan(1e-6);
        expect(apart(timed!.width, fired!.width)).toBeLessThan(1e-6);
        expect(apart(timed!.peakTime, fired!.buildUp!)).toBeLessThan(1e-6);
      }),
      { numRuns: 1500, seed: 20 },
    );
  });
});
