// Steps of a check: each prints its name and time and gives back how many passed and failed.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Runs one named step, says how it went and how long it took, and gives back its counts. */
export function step(name, work) {
  console.log(`\n── ${name}`);
  const started = performance.now();
  const counts = work();
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  console.log(`── ${name}: ${counts.passed} passed, ${counts.failed} failed, ${seconds} s`);
  return counts;
}

function run(args) {
  const result = spawnSync(process.execPath, args, { stdio: 'inherit' });
  if (result.error) console.error(result.error.message);
  return result.status === 0;
}

/** A program that only succeeds or fails counts as one. */
export function command(...args) {
  return run(args) ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

function readReport(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : null;
}

/**
 * Counts from Vitest's JSON report. A file that could not be loaded, a skipped test and a run that
 * ended badly in any other way (an error outside every test, no tests at all) count as failed too.
 */
export function countsOf(report, succeeded) {
  if (!report) return { passed: 0, failed: 1 };
  const unloaded = report.testResults.filter((file) => file.status === 'failed' && file.assertionResults.length === 0);
  const skipped = report.numPendingTests + (report.numTodoTests ?? 0);
  if (skipped > 0) console.error(`${skipped} skipped: a skipped test counts as failed.`);
  const failed = report.numFailedTests + unloaded.length + skipped;
  return { passed: report.numPassedTests, failed: succeeded || failed > 0 ? failed : 1 };
}

/** One project of vitest.config.ts, its failures shown in full and its tests counted. */
export function vitestProject(project, { mayBeEmpty = false } = {}) {
  const folder = mkdtempSync(join(tmpdir(), 'check-'));
  const report = join(folder, 'report.json');
  const succeeded = run([
    'node_modules/vitest/vitest.mjs', 'run', '--project', project,
    '--reporter=default', '--reporter=json', `--outputFile.json=${report}`,
    ...(mayBeEmpty ? ['--passWithNoTests'] : []),
  ]);
  const counts = countsOf(readReport(report), succeeded);
  rmSync(folder, { recursive: true, force: true });
  return counts;
}

/** The last line, and the exit code that goes with it. */
export function conclude(results) {
  const sum = (key) => results.reduce((total, counts) => total + counts[key], 0);
  console.log(`\n${sum('passed')} passed, ${sum('failed')} failed`);
  process.exitCode = sum('failed') === 0 ? 0 : 1;
}
