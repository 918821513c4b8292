import type { Subject } from '../language/subject.ts';
import { pause } from './answers.ts';

/** Versions that wait to be deepened; of more that are opened at once, the earliest go without. */
const MOST_WAITING = 16;

export interface Deepener {
  /** Works out, while nothing else is asked, what hover, fixes and readout will want to know of a version. */
  deepen(subject: Subject): void;
}

/**
 * One version at a time, the latest first, giving way after each of its values; what lies beside a value is remembered by
 * the version's explorer. `done` is called where the version is still current at its end.
 */
export function createDeepener(isCurrent: (subject: Subject) => boolean, done: (subject: Subject) => void): Deepener {
  const waiting: Subject[] = [];
  let working = false;
  const work = async (): Promise<void> => {
    working = true;
    for (let subject = waiting.pop(); subject !== undefined; subject = waiting.pop()) {
      if (await explored(subject, isCurrent)) done(subject);
    }
    working = false;
  };
  return {
    deepen(subject) {
      waiting.push(subject);
      if (waiting.length > MOST_WAITING) waiting.shift();
      if (!working) void work();
    },
  };
}

async function explored(subject: Subject, isCurrent: (subject: Subject) => boolean): Promise<boolean> {
  for (const { path } of subject.explorer.parameters()) {
    await pause();
    if (!isCurrent(subject)) return false;
    subject.explorer.around(path);
  }
  await pause();
  return isCurrent(subject);
}
