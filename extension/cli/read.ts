import type { World } from './world.ts';

/** A file's text, or undefined with the reason on stderr. */
export function readOrTell(file: string, world: World): string | undefined {
  const kind = world.kindOf(file);
  if (kind !== 'file') {
    world.err(
      kind === 'folder' ? `giantpulse: a folder, not a design: ${file}\n` : `giantpulse: no such file: ${file}\n`,
    );
    return undefined;
  }
  try {
    return world.read(file);
  } catch (error) {
    world.err(`giantpulse: cannot read ${file}: ${error instanceof Error ? error.message : String(error)}\n`);
    return undefined;
  }
}
