import fc from 'fast-check';
import { roundTripGain } from '../../extension/core/physics/cavity.ts';
import type { GainModule } from '../../extension/core/physics/gain-module.ts';
import { cavityAndStore, lossOf, moduleWith } from './modules.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const decades = (min: number, max: number) => between(Math.log(min), Math.log(max)).map(Math.exp);
const profile = fc.constantFrom('flat' as const, 'gaussian' as const);

/**
 * Smaller modes than this hold so few photons near threshold that what is emitted spontaneously after the start, which
 * the depletion form leaves out, shows: 2e-5 of the peak where that has 3e7 photons.
 */
const radius = decades(3e-4, 5e-3);

/** The design space: inversion ratio 1.02 to 50, loss 1 % to 95 %, spot ratio 0.3 to 3, every profile. */
export const designs = fc
  .record({
    ratio: decades(0.02, 49).map((excess) => 1 + excess),
    lossFraction: fc.oneof(between(0.01, 0.95), decades(0.01, 0.95)),
    coupled: between(0.05, 0.95),
    spot: decades(0.3, 3),
    radius,
    mode: profile,
    pump: profile,
    reduction: between(1, 2),
    /** σ_a/σ_e and the loss of unpumped ions over δ. */
    reabsorption: fc.option(fc.record({ part: decades(0.01, 1.2), loss: decades(0.05, 5) }), { nil: undefined }),
    /** What the closed switch holds beyond G, as a part of G − δ. */
    margin: fc.option(between(0.05, 3), { nil: undefined }),
  })
  .map((d) => {
    const loss = -Math.log1p(-d.lossFraction);
    const crossSection = 2.8e-23;
    const absorption = crossSection * (d.reabsorption?.part ?? 0);
    const density = d.reabsorption && (d.reabsorption.loss * loss) / (2 * absorption * 0.06);
    const base = moduleWith({
      medium: {
        absorptionCrossSection: absorption,
        inversionReductionFactor: d.reabsorption ? 1 : d.reduction,
        ...(density !== undefined && { ionDensity: density }),
      },
      pump: { beam: { profile: d.pump, radius: d.radius * d.spot } },
      resonator: {
        outputReflectivity: Math.exp(-loss * d.coupled),
        roundTripLoss: -Math.expm1(-loss * (1 - d.coupled)),
        beam: { profile: d.mode, radius: d.radius },
      },
      qSwitch: { gate: 25e-3 },
    });
    const excess = (d.ratio - 1) * lossOf(base);
    // Above 25 the closed switch would have to block to the last digit.
    const closed = d.margin !== undefined && excess < 25;
    const closedLoss = closed ? { closedLoss: -Math.expm1(-excess * (1 + (d.margin ?? 0)) - 0.1) } : {};
    return pumpedToRatio(d.ratio, moduleWith({ qSwitch: closedLoss }, base));
  });

/** Any profile, reabsorption too: the gain is a straight line in the pump power. */
function pumpedToRatio(ratio: number, module: GainModule): GainModule {
  const gainAt = (power: number) => {
    const { cavity, store } = cavityAndStore(moduleWith({ pump: { power } }, module));
    return roundTripGain(cavity, store.ions);
  };
  const dark = gainAt(0);
  return moduleWith({ pump: { power: (ratio * lossOf(module) - dark) / (gainAt(1) - dark) } }, module);
}

/** The same design with a switch that holds whatever the pump brings. */
export function withoutHoldOff(module: GainModule): GainModule {
  return { ...module, qSwitch: moduleWith({ qSwitch: { gate: 25e-3 } }).qSwitch };
}
