// The states that the page is shown, made by the language service itself: a design as it is, edited, and broken.
import { readFileSync, writeFileSync } from 'node:fs';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { analyse } from '../../../extension/core/analyse.ts';
import { exploration } from '../../../extension/language/exploration/exploration.ts';
import { readout } from '../../../extension/language/readout.ts';
import { createAnalyses } from '../../../extension/server/analyses.ts';

const [demoFile = '', target = ''] = process.argv.slice(2);
const demo = readFileSync(demoFile, 'utf8');

async function fixture(text: string, version: number) {
  const document = TextDocument.create('file:///designs/hail_lidar.gainmodule.yaml', 'gainmodule', version, text);
  const subject = createAnalyses({ get: () => document }, analyse).of(document.uri);
  if (subject === undefined || 'failure' in subject) throw new Error('no subject');
  return { state: readout(subject), exploration: (await exploration(subject, async () => true)) ?? null };
}

const fixtures = {
  sound: await fixture(demo, 1),
  edited: await fixture(
    demo
      .replace('600 W', '690 W')
      .replace(
        'beam_radius: 2.4 mm',
        'beam_radius: 0.7 mm # accept fluence-near-threshold: a spare window for the test bench',
      ),
    2,
  ),
  broken: await fixture(demo.replace('length: 60 mm', 'length: 60'), 3),
};
writeFileSync(target, JSON.stringify(fixtures));
