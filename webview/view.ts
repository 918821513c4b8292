import { type Chart, type ChartId, chartIds } from '../extension/protocol/chart.ts';
import type { ExplorationState, Pinned, ReadoutState } from '../extension/protocol/readout.ts';
import { type ChartActions, type ChartPart, createChartPart } from './chart/chart-part.ts';
import { element, prose, section } from './dom.ts';
import { cautionFoot } from './parts/caution.ts';
import { amountsOf, groups, headline } from './parts/figures.ts';
import { createParameters } from './parts/parameters.ts';
import { countOf, problemList } from './parts/problems.ts';
import { requirementTable, surfaceTable } from './parts/verdicts.ts';
import { button } from './ui/index.ts';

export interface ViewActions extends ChartActions {
  copy(): void;
  pin(pin: boolean): void;
  reveal(line: number): void;
}

export interface View {
  show(state: ReadoutState, pinned: Pinned | undefined): void;
  explored(exploration: ExplorationState): void;
  cursor(line: number): void;
  unavailable(reason: string): void;
}

const headings: Readonly<Record<ChartId, string>> = {
  waveform: 'Waveform',
  reflectivity: 'Over output reflectivity',
  pump: 'Over the pump',
  repetition_rate: 'Over repetition rate',
  surfaces: 'Fluence on the surfaces',
};

/** The charts that come a moment after the state. */
const curveIds = ['reflectivity', 'pump', 'repetition_rate'] as const;

/** Builds the page once; a new state replaces the bodies of its parts, so that nothing jumps or loses the focus. */
export function createView(root: HTMLElement, tables: readonly ChartId[], actions: ViewActions): View {
  let shown: ReadoutState | undefined;
  let pinned: Pinned | undefined;
  let curves: ExplorationState | undefined;
  let announced: string | undefined;
  const title = element('h1', {}, 'Pulse readout');
  const model = element('p', { class: 'model' });
  const pin = button({ label: 'Pin this state', onPress: () => actions.pin(pinned === undefined) });
  const copy = button({ label: 'Copy figures', onPress: actions.copy });
  const notice = element('p', { class: 'notice', role: 'status', hidden: '' });
  const pinNote = element('p', { class: 'pinned-note', hidden: '' });
  const readings = element('div', {});
  const charts = new Map<ChartId, ChartPart>(
    chartIds.map((id) => [id, createChartPart(id, headings[id], tables.includes(id), actions)]),
  );
  const requirements = section('requirements', 'Requirements');
  const surfaces = section('surfaces', 'Surfaces');
  const parameters = section('parameters', 'What +1 % of each value does');
  const parameterTable = createParameters(actions.reveal);
  parameters.body.append(parameterTable.root);
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
  const showChart = (
    id: ChartId,
    from: readonly Chart[],
    before: readonly Chart[] | undefined,
    reason: string,
  ): void => {
    const isIt = (chart: Chart): boolean => chart.id === id;
    charts.get(id)?.show(from.find(isIt), before?.find(isIt), reason);
  };
  const showPin = (): void => {
    pin.textContent = pinned === undefined ? 'Pin this state' : 'Unpin';
    pinNote.hidden = pinned === undefined;
    pinNote.textContent =
      pinned === undefined ? '' : `Changes are against “${pinned.state.title}” as pinned, drawn dotted in the charts.`;
  };
  const showCurves = (): void => {
    for (const id of curveIds) showChart(id, curves?.charts ?? [], pinned?.exploration?.charts, 'Nothing to draw');
  };
  const partOf = (id: ChartId): HTMLElement | undefined => charts.get(id)?.root;

  root.replaceChildren(
    element('header', {}, element('div', {}, title, model), element('div', { class: 'tools' }, pin, copy)),
    notice,
    pinNote,
    readings,
    element('div', { class: 'pair' }, partOf('waveform'), partOf('surfaces')),
    element('div', { class: 'pair' }, requirements.root, surfaces.root),
    element('div', { class: 'pair' }, partOf('reflectivity'), partOf('pump')),
    element('div', { class: 'pair' }, partOf('repetition_rate'), figures.root),
    parameters.root,
    validity.root,
    problems.root,
    cautionFoot(),
  );

  return {
    show(state, nowPinned) {
      const isNewText = state.version !== shown?.version || state.uri !== shown.uri;
      const isOtherDesign = state.uri !== shown?.uri;
      shown = state;
      pinned = nowPinned;
      const before = amountsOf(pinned?.state);
      title.textContent = state.title;
      model.textContent = state.model === undefined ? 'No prediction' : `Predicted by the ${state.model}`;
      announce(state.absence);
      showPin();
      readings.replaceChildren(headline(state.headline, before));
      const none = state.absence === undefined ? 'Nothing to draw' : 'No pulse to draw';
      showChart('waveform', state.charts, pinned?.state.charts, none);
      showChart(
        'surfaces',
        state.charts,
        pinned?.state.charts,
        state.absence === undefined ? 'No surfaces in the design' : none,
      );
      if (isNewText || isOtherDesign) {
        curves = undefined;
        for (const id of curveIds) {
          // Curves of an earlier text stay, marked as such, only while those of this one are on their way.
          if (state.absence === undefined && !isOtherDesign) charts.get(id)?.wait();
          else showChart(id, [], undefined, state.absence === undefined ? 'Being worked out' : none);
        }
        parameters.root.hidden = state.absence !== undefined || isOtherDesign;
      } else if (curves !== undefined) {
        // The same text: what is pinned may have changed.
        showCurves();
      }
      fill(requirements, state.requirements.length === 0 ? undefined : requirementTable(state.requirements));
      fill(surfaces, state.surfaces.length === 0 ? undefined : surfaceTable(state.surfaces));
      fill(figures, state.groups.length === 0 ? undefined : groups(state.groups, before));
      fill(validity, state.validity.length === 0 ? undefined : notes(state.validity));
      problemHeading.textContent = countOf(state.problems);
      fill(problems, problemList(state.problems, actions.reveal));
    },
    explored(exploration) {
      if (shown?.version !== exploration.version || shown.uri !== exploration.uri) return;
      curves = exploration;
      showCurves();
      parameters.root.hidden = exploration.parameters.length === 0;
      parameterTable.show(exploration.parameters);
    },
    cursor: parameterTable.cursor,
    unavailable(reason) {
      const ended = /[.!?]$/.test(reason) ? reason : `${reason}.`;
      // What stands below stays readable, but not as if it were of the text named in the reason.
      announce(shown === undefined ? ended : `${ended} Below stands what was last read of “${shown.title}”.`);
    },
  };
}

function notes(validity: readonly string[]): HTMLElement {
  return element('ul', { class: 'notes' }, ...validity.map((note) => element('li', {}, ...prose(note))));
}
