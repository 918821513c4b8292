import type { Subject } from '../language/subject.ts';
import { pause } from './answers.ts';

/**
 * Works out, while nothing else is asked, what hover, fixes and readout will want to know of a version: what lies beside
 * each of its values. Gives way after every value; false where the version has passed meanwhile.
 */
export async function deepen({ explorer }: Subject, isCurrent: () => boolean): Promise<boolean> {
  for (const { path } of explorer.parameters()) {
    await pause();
    if (!isCurrent()) return false;
    explorer.around(path);
  }
  await pause();
  return isCurrent();
}
