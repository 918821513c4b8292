import type { ExplorationState } from '../protocol/readout.ts';
import type { Subject } from './subject.ts';

/** Between predictions `stillWanted` is asked, which also lets the server read its messages: on no, there is no result. */
export async function exploration(
  _subject: Subject,
  _stillWanted: () => Promise<boolean>,
): Promise<ExplorationState | undefined> {
  return undefined;
}
