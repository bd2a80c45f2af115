import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { findChromium } from './find-chromium.ts';

// npm test: build, then everything under Vitest, then the journeys in a real browser. The last line counts both.

interface Counts {
  passed: number;
  failed: number;
}

const folder = mkdtempSync(join(tmpdir(), 'tallyloft-results-'));
const chromium = findChromium();
let broken = 0;

function step(name: string, command: string, args: string[], environment: Record<string, string> = {}): void {
  process.stdout.write(`\n== ${name}\n`);
  const { status } = spawnSync(command, args, { stdio: 'inherit', env: { ...process.env, ...environment } });
  if (status !== 0) broken += 1;
}

function vitestCounts(file: string): Counts {
  const report = JSON.parse(readFileSync(file, 'utf8')) as { numPassedTests: number; numFailedTests: number };
  return { passed: report.numPassedTests, failed: report.numFailedTests };
}

function playwrightCounts(file: string): Counts {
  const { stats } = JSON.parse(readFileSync(file, 'utf8')) as {
    stats: { expected: number; unexpected: number; flaky: number };
  };
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky };
}

/** A run that died before it could report counts as one failure. */
function countsOf(read: (file: string) => Counts, file: string): Counts {
  try {
    return read(file);
  } catch {
    return { passed: 0, failed: 1 };
  }
}

const vitestReport = join(folder, 'vitest.json');
const playwrightReport = join(folder, 'playwright.json');
step('build', 'npm', ['run', '--silent', 'build']);
step('unit, reference, API and component tests', 'npx', [
  'vitest',
  'run',
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${vitestReport}`,
]);
step('browser tests', 'npx', ['playwright', 'test', '--reporter=list,json'], {
  CHROMIUM_PATH: chromium,
  PLAYWRIGHT_JSON_OUTPUT_NAME: playwrightReport,
});

const all = [countsOf(vitestCounts, vitestReport), countsOf(playwrightCounts, playwrightReport)];
const passed = all.reduce((sum, counts) => sum + counts.passed, 0);
const counted = all.reduce((sum, counts) => sum + counts.failed, 0);
// Unhandled rejections fail a run without failing a test.
const failed = counted === 0 && broken > 0 ? broken : counted;
rmSync(folder, { recursive: true, force: true });
process.stdout.write(`\n${passed} passed, ${failed} failed\n`);
process.exit(failed === 0 ? 0 : 1);
