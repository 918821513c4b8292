/** Typing settles within this time (ms) before a document is analysed. */
const typingPause = 100;

export interface Publisher {
  /** Publishes once the typing has paused; at once for a document that has just been opened. */
  changed(uri: string): void;
  /** Publishes nothing more for this document. */
  closed(uri: string): void;
}

/** Calls `publish` for each document that changed, once per burst of changes. */
export function createPublisher(publish: (uri: string) => void): Publisher {
  const waiting = new Map<string, ReturnType<typeof setTimeout>>();
  const open = new Set<string>();
  return {
    changed(uri) {
      clearTimeout(waiting.get(uri));
      const delay = open.has(uri) ? typingPause : 0;
      open.add(uri);
      const due = (): void => {
        waiting.delete(uri);
        publish(uri);
      };
      waiting.set(uri, setTimeout(due, delay));
    },
    closed(uri) {
      clearTimeout(waiting.get(uri));
      waiting.delete(uri);
      open.delete(uri);
    },
  };
}
