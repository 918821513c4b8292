import { isHostMessage } from '../extension/protocol/guard.ts';
import { unreachable } from '../extension/protocol/messages.ts';
import { copyText } from './copy-text.ts';
import { connectHost } from './host.ts';
import { registerControls } from './ui/index.ts';
import { createView } from './view.ts';

/** Wires the page to its editor: what arrives is checked and shown, what is pressed is sent. */
function start(root: HTMLElement): void {
  registerControls();
  const host = connectHost();
  const memory = host.recall();
  let uri = memory?.uri ?? '';
  let tableShown = memory?.tableShown ?? false;
  const remember = (): void => {
    if (uri !== '') host.remember({ uri, tableShown });
  };
  const view = createView(root, tableShown, {
    copy: (state) => host.send({ type: 'copy', text: copyText(state) }),
    reveal: (line) => host.send({ type: 'reveal', line }),
    tableShown(shown) {
      tableShown = shown;
      remember();
    },
  });

  window.addEventListener('message', ({ data }: MessageEvent<unknown>) => {
    if (!isHostMessage(data)) return;
    switch (data.type) {
      case 'state':
        uri = data.state.uri;
        remember();
        return view.show(data.state);
      case 'unavailable':
        return view.unavailable(data.reason);
      default:
        return unreachable(data);
    }
  });
  host.send({ type: 'ready' });
}

const root = document.getElementById('readout');
if (root !== null) start(root);
