// The hook as a team installs it: pre-commit (Debian's package) clones this repository at HEAD, builds it and runs it on a commit.
import assert from 'node:assert/strict';
import { spawnSync } from 'node:child_process';
import { copyFileSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const project = join(dirname(fileURLToPath(import.meta.url)), '../..');
const place = mkdtempSync(join(tmpdir(), 'giantpulse-hook-'));
const repository = join(place, 'team');
const design = join(repository, 'transmitter.gainmodule.yaml');
const env = {
  ...Object.fromEntries(Object.entries(process.env).filter(([name]) => !/^(npm_|GIT_)/.test(name))),
  PRE_COMMIT_HOME: join(place, 'cache'),
};

function run(command, args, cwd = repository) {
  const { status, stdout, stderr, error } = spawnSync(command, args, { cwd, env, encoding: 'utf8' });
  if (error) throw error;
  return { status, output: stdout + stderr };
}

function git(...args) {
  const { status, output } = run('git', ['-c', 'user.name=Team', '-c', 'user.email=team@example.org', ...args]);
  return { status, output };
}

let passed = 0;
let failed = 0;
function check(name, act) {
  try {
    act();
    passed++;
    console.log(`ok - ${name}`);
  } catch (error) {
    failed++;
    console.log(`not ok - ${name}: ${error instanceof Error ? error.message : error}`);
  }
}

try {
  run('git', ['init', '-q', repository], place);
  const { output: head } = run('git', ['rev-parse', 'HEAD'], project);
  writeFileSync(
    join(repository, '.pre-commit-config.yaml'),
    `repos:\n  - repo: ${project}\n    rev: ${head.trim()}\n    hooks:\n      - id: giantpulse\n`,
  );
  copyFileSync(join(project, 'extension/demo/hail_lidar.gainmodule.yaml'), design);
  git('add', '-A');
  check('the hook installs', () => {
    const { status, output } = run('pre-commit', ['install']);
    assert.equal(status, 0, output);
  });
  check('a sound design is committed', () => {
    const { status, output } = git('commit', '-q', '-m', 'Add the transmitter');
    assert.equal(status, 0, output);
    assert.match(output, /giantpulse check\.+Passed/);
  });
  check('a design that loses its pulse is refused, with the line that did it', () => {
    writeFileSync(design, readFileSync(design, 'utf8').replace('power: 600 W', 'power: 100 W'));
    const { status, output } = git('commit', '-q', '-a', '-m', 'Save pump power');
    assert.equal(status, 1, output);
    assert.match(output, /transmitter\.gainmodule\.yaml:\d+:\d+: error: .*\[no-pulse\]/);
  });
  check('other files are none of its business', () => {
    git('checkout', '-q', '--', '.');
    writeFileSync(join(repository, 'notes.yaml'), 'power: 100 W\n');
    git('add', '-A');
    const { status, output } = git('commit', '-q', '-m', 'Add notes');
    assert.equal(status, 0, output);
    assert.match(output, /giantpulse check\.+\(no files to check\)Skipped/);
  });
} catch (error) {
  failed++;
  console.log(`not ok - ${error instanceof Error ? error.message : error}`);
} finally {
  rmSync(place, { recursive: true, force: true });
}
console.log(`${passed} passed, ${failed} failed`);
