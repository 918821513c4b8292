import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { analyse } from '../../extension/core/analyse.ts';
import { wantedFigures } from '../../extension/core/design/wanted.ts';
import { depletionPulse } from '../../extension/core/physics/depletion.ts';
import { predict } from '../../extension/core/physics/predict.ts';
import { type Case, gaussian, gaussianOnSixteen, oneRing } from './cases.ts';
import { odexPulse } from './odex-pulse.ts';
import { odexSettings } from './odex-settings.ts';
import { inTurn } from './stopwatch.ts';
import { type Row, time } from './table.ts';

export function predictions(root: string): Row[] {
  const one = oneRing();
  return [
    ...against('one ring', one, one, 100),
    ...against('Gaussian, 20 rings; odex 16', gaussian(), gaussianOnSixteen(), 20),
    demo(root),
  ];
}

/** odex for all three figures, which takes its dense output, and for the energy alone, the least that it can do. */
function against(name: string, ours: Case, theirs: Case, least: number): Row[] {
  const figures = odexSettings(theirs, 'raw', true, 1e-8);
  const energy = odexSettings(theirs, 'raw', false, 1e-8);
  const times = inTurn(
    [() => depletionPulse(ours.depletion), () => odexPulse(theirs, figures), () => odexPulse(theirs, energy)],
    3,
  );
  const [t = Number.NaN, full = Number.NaN, plain = Number.NaN] = times;
  const target = { least };
  return [
    { what: name, ours: time(t), other: time(full), ratio: full / t, target },
    { what: '  odex for the energy alone', ours: time(t), other: time(plain), ratio: plain / t, target },
  ];
}

/** The whole prediction: train, best coupling, surfaces and requirements. */
function demo(root: string): Row {
  const text = readFileSync(join(root, 'extension/demo/hail_lidar.gainmodule.yaml'), 'utf8');
  const { design, resolved } = analyse(text);
  const { module } = resolved;
  if (!module) throw new Error('the demo is incomplete');
  const wanted = wantedFigures(design);
  const [t = Number.NaN] = inTurn([() => predict(module, wanted)], 1);
  return { what: 'demo: the whole prediction', ours: time(t) };
}
