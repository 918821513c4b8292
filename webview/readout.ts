import type { ChartId } from '../extension/protocol/chart.ts';
import { isHostMessage } from '../extension/protocol/guard.ts';
import { unreachable } from '../extension/protocol/messages.ts';
import { connectHost } from './host.ts';
import { registerControls } from './ui/index.ts';
import { createView } from './view.ts';

/** Wires the page to its editor: what arrives is checked and shown, what is pressed is sent. */
function start(root: HTMLElement): void {
  registerControls();
  const host = connectHost();
  const memory = host.recall();
  let uri = memory?.uri ?? '';
  const tables = new Set<ChartId>(memory?.tables);
  const remember = (): void => {
    if (uri !== '') host.remember({ uri, tables: [...tables] });
  };
  const view = createView(root, [...tables], {
    copy: () => host.send({ type: 'copy' }),
    pin: (pin) => host.send({ type: 'pin', pin }),
    reveal: (line) => host.send({ type: 'reveal', line }),
    export: (chart, format) => host.send({ type: 'export', chart, format }),
    picture: (chart, data) => host.send({ type: 'picture', chart, data }),
    tableShown(id, shown) {
      if (shown) tables.add(id);
      else tables.delete(id);
      remember();
    },
  });

  window.addEventListener('message', ({ data }: MessageEvent<unknown>) => {
    if (!isHostMessage(data)) return;
    switch (data.type) {
      case 'state':
        uri = data.state.uri;
        remember();
        return view.show(data.state, data.pinned);
      case 'exploration':
        return view.explored(data.exploration);
      case 'cursor':
        return view.cursor(data.line);
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
