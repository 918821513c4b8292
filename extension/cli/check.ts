import { analyse } from '../core/analyse.ts';
import { countText, findingLines } from '../core/report/findings-text.ts';
import type { Problem } from '../core/report/problem.ts';
import { designFiles } from './files.ts';
import { readOrTell } from './read.ts';
import type { World } from './world.ts';

/** Prints the findings of all designs named. 0 without errors, 1 with errors, 2 could not run. */
export async function check(args: readonly string[], world: World): Promise<number> {
  const designs = await designFiles(args, world);
  if ('refusal' in designs) {
    world.err(`giantpulse: ${designs.refusal}\n`);
    return 2;
  }
  if (designs.files.length === 0) {
    world.err(`giantpulse: no *.gainmodule.yaml in ${args.join(', ')}\n`);
    return 2;
  }
  const all: Problem[] = [];
  let unreadable = false;
  for (const file of designs.files) {
    const text = readOrTell(file, world);
    if (text === undefined) {
      unreadable = true;
      continue;
    }
    const { problems } = analyse(text);
    all.push(...problems);
    world.out(
      findingLines(file, text, problems)
        .map((line) => `${line}\n`)
        .join(''),
    );
  }
  const count = designs.files.length;
  world.err(`${count} design${count === 1 ? '' : 's'} checked: ${countText(all)}\n`);
  if (unreadable) return 2;
  return all.some((problem) => problem.severity === 'error') ? 1 : 0;
}
