import { element } from '../dom.ts';

const svg = 'http://www.w3.org/2000/svg';

/** Text beside a sample of each line, solid and dashed as in the chart. */
export function legend(): HTMLElement {
  return element(
    'ul',
    { class: 'legend' },
    element('li', {}, sample('power', undefined), 'Output power'),
    element('li', {}, sample('inversion', '7 4'), 'Inversion'),
  );
}

function sample(name: string, dashes: string | undefined): SVGSVGElement {
  const picture = document.createElementNS(svg, 'svg');
  picture.setAttribute('class', `sample ${name}`);
  picture.setAttribute('viewBox', '0 0 29 8');
  picture.setAttribute('aria-hidden', 'true');
  const line = document.createElementNS(svg, 'path');
  line.setAttribute('d', 'M0 4h29');
  if (dashes !== undefined) line.setAttribute('stroke-dasharray', dashes);
  picture.append(line);
  return picture;
}
