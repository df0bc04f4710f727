/** `npm test`: every check there is, one after another, then one line that counts the tests. */
import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..');
const say = (line: string) => process.stdout.write(`${line}\n`);

function run(title: string, command: string, args: string[], env: NodeJS.ProcessEnv = {}): boolean {
  const startedAt = Date.now();
  say(`\n== ${title}`);
  const { status } = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, ...env },
  });
  say(
    `== ${title}: ${status === 0 ? 'passed' : 'FAILED'} in ${String(Math.round((Date.now() - startedAt) / 1000))} s`,
  );
  return status === 0;
}

const chromium = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'].find(
  existsSync,
);
if (!chromium && !process.env['CHROMIUM']) {
  run('find Chromium', 'sh', ['-c', 'apt-get update -qq && apt-get install -y -qq chromium']);
}

const unitReport = path.join(root, 'node_modules/.cache/unit-report.json');
const browserReport = path.join(root, 'node_modules/.cache/browser-report.json');
rmSync(unitReport, { force: true });
rmSync(browserReport, { force: true });

const npx = (tool: string, ...args: string[]): [string, string[]] => ['npx', ['--no-install', tool, ...args]];
const steps = [
  run('format', ...npx('prettier', '--check', '--log-level', 'warn', '.')),
  run('lint', ...npx('oxlint', 'shared', 'api', 'web', 'tests', 'e2e')),
  run('import rules', ...npx('depcruise', '--output-type', 'err', 'shared', 'api', 'web', 'e2e', 'tests')),
  run('types', ...npx('tsc', '-b')),
  run(
    'unit',
    ...npx('vitest', 'run', '--reporter=dot', '--reporter=json', `--outputFile.json=${unitReport}`),
  ),
  run('browser', ...npx('playwright', 'test', '-c', 'e2e'), { BROWSER_REPORT: browserReport }),
];

interface UnitReport {
  numPassedTests: number;
  numFailedTests: number;
}
interface BrowserReport {
  stats: { expected: number; unexpected: number; flaky: number };
}
const read = (file: string): unknown =>
  existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined;

const unit = read(unitReport) as UnitReport | undefined;
const browser = read(browserReport) as BrowserReport | undefined;
const passed = (unit?.numPassedTests ?? 0) + (browser?.stats.expected ?? 0);
const failedTests =
  (unit?.numFailedTests ?? 0) + (browser ? browser.stats.unexpected + browser.stats.flaky : 0);
const failedSteps = steps.filter((isPassed) => !isPassed).length;
// A step can fail without a failing test (lint, a crash); it must not be counted as nothing.
const failed = Math.max(failedTests, failedSteps);
say(`\n${String(passed)} passed, ${String(failed)} failed`);
process.exit(failed === 0 && passed > 0 ? 0 : 1);
