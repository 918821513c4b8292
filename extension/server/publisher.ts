/** Typing settles within this time (ms) before a document is analysed. */
const typingPause = 100;

export interface Publisher {
  /** Publishes once the typing has paused; soon for a document that has just been opened. */
  changed(uri: string): void;
  /** Publishes nothing more for this document. */
  closed(uri: string): void;
}

/**
 * Calls `publish` for each document that changed, once per burst of changes: one document at a time, what has changed
 * last first, and messages are read between two of them. So five hundred opened designs don't hold up the edited one.
 */
export function createPublisher(publish: (uri: string) => void): Publisher {
  const waiting = new Map<string, ReturnType<typeof setTimeout>>();
  const open = new Set<string>();
  const ready: string[] = [];
  let publishing = false;

  const drop = (uri: string): void => {
    clearTimeout(waiting.get(uri));
    waiting.delete(uri);
    const at = ready.indexOf(uri);
    if (at >= 0) ready.splice(at, 1);
  };
  const publishNext = (): void => {
    const uri = ready.pop();
    publishing = ready.length > 0;
    if (publishing) setTimeout(publishNext, 0);
    if (uri !== undefined) publish(uri);
  };
  return {
    changed(uri) {
      drop(uri);
      const delay = open.has(uri) ? typingPause : 0;
      open.add(uri);
      const due = (): void => {
        waiting.delete(uri);
        ready.push(uri);
        if (!publishing) setTimeout(publishNext, 0);
        publishing = true;
      };
      waiting.set(uri, setTimeout(due, delay));
    },
    closed(uri) {
      drop(uri);
      open.delete(uri);
    },
  };
}
