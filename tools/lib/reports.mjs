import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { at } from './workspace.mjs';

const folder = at('dist/reports');

/** Counts of one report, whichever of the three runners wrote it. */
function countsOf(report) {
  if (report.stats) {
    const { expected, unexpected, flaky, skipped } = report.stats;
    return { passed: expected + flaky, failed: unexpected, skipped };
  }
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + (report.numRuntimeErrorTestSuites ?? 0),
    skipped: report.numPendingTests + (report.numTodoTests ?? 0),
  };
}

/** The reports that the runners left, by project. */
export function readReports() {
  if (!existsSync(folder)) return [];
  return readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .sort()
    .map((name) => ({
      project: name.replace('.json', ''),
      ...countsOf(JSON.parse(readFileSync(`${folder}/${name}`, 'utf8'))),
    }));
}
