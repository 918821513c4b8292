import type { ReadoutState } from '../extension/protocol/readout.ts';
import { element, prose, section } from './dom.ts';
import { cautionFoot } from './parts/caution.ts';
import { groups, headline } from './parts/figures.ts';
import { countOf, problemList } from './parts/problems.ts';
import { requirementTable, surfaceTable } from './parts/verdicts.ts';
import { button } from './ui/index.ts';
import { createWaveform } from './waveform/waveform.ts';

export interface ViewActions {
  copy(state: ReadoutState): void;
  reveal(line: number): void;
  tableShown(shown: boolean): void;
}

export interface View {
  show(state: ReadoutState): void;
  unavailable(reason: string): void;
}

/** Builds the page once; a new state replaces the bodies of its parts, so that nothing jumps or loses the focus. */
export function createView(root: HTMLElement, tableShown: boolean, actions: ViewActions): View {
  let shown: ReadoutState | undefined;
  let announced: string | undefined;
  const title = element('h1', {}, 'Pulse readout');
  const model = element('p', { class: 'model' });
  const copy = button({ label: 'Copy figures', onPress: () => shown !== undefined && actions.copy(shown) });
  const notice = element('p', { class: 'notice', role: 'status', hidden: '' });
  const readings = element('div', {});
  const waveform = createWaveform(tableShown, actions.tableShown);
  const requirements = section('requirements', 'Requirements');
  const surfaces = section('surfaces', 'Surfaces');
  const figures = section('figures', 'Figures');
  const validity = section('validity', 'Where the model is stretched');
  const problems = section('problems', 'Problems');
  const problemHeading = element('span', { class: 'count' });
  problems.root.querySelector('h2')?.append(' ', problemHeading);

  const fill = (part: { root: HTMLElement; body: HTMLElement }, content: HTMLElement | undefined): void => {
    part.root.hidden = content === undefined;
    part.body.replaceChildren(...(content === undefined ? [] : [content]));
  };
  const announce = (text: string | undefined): void => {
    notice.hidden = text === undefined;
    // Spoken by screen readers whenever it is set: only when it has changed.
    if (announced !== text) notice.replaceChildren(...prose(text ?? ''));
    announced = text;
  };

  root.replaceChildren(
    element('header', {}, element('div', {}, title, model), copy),
    notice,
    readings,
    waveform.root,
    element('div', { class: 'verdicts' }, requirements.root, surfaces.root),
    figures.root,
    validity.root,
    problems.root,
    cautionFoot(),
  );

  return {
    show(state) {
      shown = state;
      title.textContent = state.title;
      model.textContent = state.model === undefined ? 'No prediction' : `Predicted by the ${state.model}`;
      announce(state.absence);
      readings.replaceChildren(headline(state.headline));
      waveform.show(state.waveform);
      fill(requirements, state.requirements.length === 0 ? undefined : requirementTable(state.requirements));
      fill(surfaces, state.surfaces.length === 0 ? undefined : surfaceTable(state.surfaces));
      fill(figures, state.groups.length === 0 ? undefined : groups(state.groups));
      fill(validity, state.validity.length === 0 ? undefined : notes(state.validity));
      problemHeading.textContent = countOf(state.problems);
      fill(problems, problemList(state.problems, actions.reveal));
    },
    unavailable: announce,
  };
}

function notes(validity: readonly string[]): HTMLElement {
  return element('ul', { class: 'notes' }, ...validity.map((note) => element('li', {}, ...prose(note))));
}
