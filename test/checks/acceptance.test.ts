import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { acceptanceFix } from '../../extension/core/checks/acceptance.ts';
import { countText, findingLines } from '../../extension/core/report/findings-text.ts';
import { demo } from '../explore/designs.ts';

const missed = demo.replace('max: 12 ns }', 'max: 5 ns }');
const line = 'pulse_width: { max: 5 ns }';
const reason = 'the receiver integrates over 20 ns';

const problems = (text: string) => analyse(text).problems;
const ofCode = (text: string, code: string) => problems(text).filter((problem) => problem.code === code);

describe('an acceptance with a reason', () => {
  test.each([
    ['on the line', missed.replace(line, `${line} # accept requirement-missed: ${reason}`)],
    ['above the line', missed.replace(line, `# accept requirement-missed: ${reason}\n  ${line}`)],
    [
      'above, with other comments between',
      missed.replace(line, `# accept requirement-missed: ${reason}\n  # agreed\n  ${line}`),
    ],
    [
      'with Windows line ends',
      missed.replace(line, `${line} # accept requirement-missed: ${reason}`).replaceAll('\n', '\r\n'),
    ],
    ['with blanks wherever they may be', missed.replace(line, `${line} #accept  requirement-missed :  ${reason}  `)],
  ])('%s turns the problem into a note that keeps it', (_, text) => {
    const [problem, ...others] = ofCode(text, 'requirement-missed');
    expect(others).toEqual([]);
    expect(problem).toMatchObject({ severity: 'information', accepted: { reason, severity: 'error' } });
    expect(problem?.message).toBe(ofCode(missed, 'requirement-missed')[0]?.message);
    expect(ofCode(text, 'acceptance-unused')).toEqual([]);
    expect(analyse(text).prediction?.requirements.find(({ name }) => name === 'pulse_width')?.met).toBe(false);
  });

  test('is counted, and told with its reason', () => {
    const text = missed.replace(line, `${line} # accept requirement-missed: ${reason}`);
    expect(countText(problems(text))).toBe('0 errors, 0 warnings, 1 accepted');
    expect(countText(problems(missed))).toBe('1 error, 0 warnings');
    const [told = ''] = findingLines('a', text, problems(text));
    expect(told).toContain('information:');
    expect(told).toContain(`Accepted: ${reason} [requirement-missed]`);
  });

  test('holds for its own line and code only', () => {
    const elsewhere = problems(
      missed.replace('peak_power: { min', `# accept requirement-missed: ${reason}\n  peak_power: { min`),
    );
    expect(elsewhere.map(({ code, severity }) => `${severity} ${code}`).sort()).toEqual([
      'error requirement-missed',
      'warning acceptance-unused',
    ]);
    expect(elsewhere.find(({ code }) => code === 'acceptance-unused')?.message).toContain('on another line');
    const otherCode = problems(missed.replace(line, `${line} # accept hold-off: ${reason}`));
    expect(otherCode.map(({ code }) => code).sort()).toEqual(['acceptance-unused', 'requirement-missed']);
  });

  test('works for an unusual value too', () => {
    const odd = demo.replace('round_trip_loss: 6 %', 'round_trip_loss: 75 % # accept unusual-value: a test bench');
    expect(ofCode(odd, 'unusual-value')[0]).toMatchObject({
      severity: 'information',
      accepted: { severity: 'warning' },
    });
  });
});

describe('an acceptance that does not say what it must', () => {
  test.each([
    ['no reason', '# accept requirement-missed:', /needs a reason/],
    ['nothing but the code', '# accept requirement-missed', /needs a reason/],
    ['a misspelt code', `# accept requirement-mised: ${reason}`, /did you mean `requirement-missed`/],
    ['an unknown code', `# accept everything: ${reason}`, /nothing that can be accepted/],
    ['what cannot be built', `# accept no-pulse: ${reason}`, /cannot be built/],
    ['an invalid design', `# accept missing-unit: ${reason}`, /nothing that can be accepted/],
  ])('%s accepts nothing and is told', (_, comment, message) => {
    const text = missed.replace(line, `${line} ${comment}`);
    expect(ofCode(text, 'requirement-missed')[0]?.severity).toBe('error');
    const [told] = ofCode(text, 'acceptance-invalid');
    expect(told?.message).toMatch(message);
    expect(told?.severity).toBe('warning');
    expect(comment).toContain(text.slice(told?.range.start, told?.range.end));
  });

  test('mends a misspelt code', () => {
    const text = missed.replace(line, `${line} # accept requirement-mised: ${reason}`);
    const [fix] = ofCode(text, 'acceptance-invalid')[0]?.fixes ?? [];
    const mended = fix ? text.slice(0, fix.range.start) + fix.text + text.slice(fix.range.end) : '';
    expect(ofCode(mended, 'requirement-missed')[0]?.accepted?.reason).toBe(reason);
  });
});

test('an unreadable or invalid design stays one, and its acceptances are not called stale', () => {
  const text = missed
    .replace('length: 60 mm', 'length: 60 # accept missing-unit: we know')
    .replace(line, `${line} # accept requirement-missed: ${reason}`);
  expect(ofCode(text, 'missing-unit')[0]?.severity).toBe('error');
  expect(ofCode(text, 'acceptance-unused')).toEqual([]);
});

test('an acceptance of what is no longer found is a warning with a removal', () => {
  const text = demo.replace(
    'pulse_width: { max: 12 ns }',
    `pulse_width: { max: 12 ns } # accept requirement-missed: ${reason}`,
  );
  const [told] = problems(text);
  expect(told).toMatchObject({ code: 'acceptance-unused', severity: 'warning' });
  expect(told?.message).toContain('not found any more');
  const [fix] = told?.fixes ?? [];
  const mended = fix ? text.slice(0, fix.range.start) + fix.text + text.slice(fix.range.end) : '';
  expect(problems(mended)).toEqual([]);
});

test.each([
  ['in quotes', `title: "a # accept hold-off: ${reason}"`],
  ['in a block of text', `x-note: |\n  a\n  # accept hold-off: ${reason}\ntitle: b`],
  ['as prose', 'title: b # accept the fact that hail is round'],
  ['glued to a word', 'title: b# accept hold-off'],
])('the words %s are no acceptance', (_, title) => {
  const text = demo.replace(/^title: .*$/m, title);
  expect(problems(text)).toEqual([]);
});

test('the fix writes a comment above the line that lacks nothing but the reason', () => {
  const [problem] = ofCode(missed, 'requirement-missed');
  if (problem === undefined) throw new Error('nothing to accept');
  const { range, text } = acceptanceFix(missed, problem);
  const edited = missed.slice(0, range.start) + text + missed.slice(range.end);
  expect(ofCode(edited, 'acceptance-invalid')[0]?.message).toMatch(/needs a reason/);
  const reasoned = edited.replace('requirement-missed: \n', `requirement-missed: ${reason}\n`);
  expect(ofCode(reasoned, 'requirement-missed')[0]?.accepted?.reason).toBe(reason);
  expect(reasoned.replace(`  # accept requirement-missed: ${reason}\n`, '')).toBe(missed);
});
