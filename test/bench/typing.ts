import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { generator, mutate } from '../fuzz/mutate.ts';
import { typeThrough } from '../language/typing.ts';
import { seconds } from './stopwatch.ts';

/** Types 200 designs character by character through every feature; prints what was not right, which is nothing. */
export function typing(root: string): void {
  const folder = join(root, 'test/designs');
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((name) => name.endsWith('.yaml'));
  const designs = files.map((name) => readFileSync(join(folder, name), 'utf8'));
  const all = Array.from({ length: 200 }, (_, index) => {
    const text = designs[index % designs.length] ?? '';
    return index < designs.length ? text : mutate(text, generator(index));
  });
  const begin = seconds();
  let states = 0;
  let predicted = 0;
  const faults: string[] = [];
  for (const [index, text] of all.entries()) {
    const typed = typeThrough(text);
    states += typed.states;
    predicted += typed.predicted;
    faults.push(...typed.faults.map((fault) => `design ${index}, ${fault}`));
  }
  const elapsed = seconds() - begin;
  console.log(
    `${all.length} designs typed: ${states} texts, ${predicted} of them with a pulse, ${faults.length} faults`,
  );
  console.log(`${((elapsed / states) * 1e3).toFixed(2)} ms a character, every feature asked for after each`);
  for (const fault of faults.slice(0, 20)) console.log(fault);
}
