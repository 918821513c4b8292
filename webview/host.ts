import { isPageMemory } from '../extension/protocol/guard.ts';
import type { PageMemory, PageMessage } from '../extension/protocol/messages.ts';

/** What VS Code gives a page to speak to its extension with. */
interface VsCodeApi {
  postMessage(message: unknown): void;
  getState(): unknown;
  setState(state: unknown): void;
}

declare function acquireVsCodeApi(): VsCodeApi;

export interface Host {
  send(message: PageMessage): void;
  recall(): PageMemory | undefined;
  remember(memory: PageMemory): void;
}

/** VS Code hands its interface out once a page: call this once. */
export function connectHost(): Host {
  const api = acquireVsCodeApi();
  return {
    send: (message) => api.postMessage(message),
    recall() {
      const memory = api.getState();
      return isPageMemory(memory) ? memory : undefined;
    },
    remember: (memory) => api.setState(memory),
  };
}
