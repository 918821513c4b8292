import type { ExportParams } from '../protocol/requests.ts';
import type { Subject } from './subject.ts';

export async function exported(
  _subject: Subject,
  _params: ExportParams,
  _stillWanted: () => Promise<boolean>,
): Promise<string | undefined> {
  return undefined;
}
