import type { World } from './world.ts';

/** A file's text, or undefined with the reason on stderr. */
export function readOrTell(file: string, world: World): string | undefined {
  if (world.kindOf(file) !== 'file') {
    world.err(`giantpulse: no such file: ${file}\n`);
    return undefined;
  }
  try {
    return world.read(file);
  } catch (error) {
    world.err(`giantpulse: cannot read ${file}: ${error instanceof Error ? error.message : String(error)}\n`);
    return undefined;
  }
}
