import { hasSecondCost, parseProblem, toFrontierDocument } from '@metewand/frontier';
import { fingerprintOf } from './fingerprint.mjs';
import { ProgressLine } from './progress-line.mjs';
import { readDocument, usingDocument } from './read-document.mjs';
import { solve } from './solve.mjs';

/** Writes the frontier of a problem on standard output. Ctrl-C ends the search, and what was found is written. */
export async function solveCommand({ problemPath, seconds, seed, threads }) {
  const problem = readDocument(problemPath, parseProblem);
  const wasInterrupted = interruption();
  const progress = new ProgressLine();
  const onProgress = (report) => progress.show(() => inWords(report));
  const settings = { seed, threads, seconds, isStopped: wasInterrupted, onProgress };
  const result = await usingDocument(problemPath, () => solve(problem, settings));
  progress.end(`${result.points.length} points, ${result.status}${result.stopped ? ', stopped' : ''}`);
  if (wasInterrupted() && result.points.length === 0) return 130;
  const facts = {
    fingerprint: fingerprintOf(problem),
    threads: hasSecondCost(problem) ? 1 : threads,
    seconds: Number(progress.seconds.toFixed(3)),
  };
  await write(toText(toFrontierDocument(problem, result, facts)));
  return 0;
}

/** Answers whether Ctrl-C was pressed; the second time it ends the process as it always does. */
function interruption() {
  let interrupted = false;
  for (const name of ['SIGINT', 'SIGTERM']) process.once(name, () => (interrupted = true));
  return () => interrupted;
}

function inWords({ evaluations, kept, bestBenefit, proven }) {
  const best = bestBenefit === undefined ? 'none kept yet' : `${kept} kept, best benefit ${bestBenefit}`;
  const { bound, provenStretches } = proven();
  const open = bound.length === 0 ? '' : `, ${provenStretches.length} stretches of cost proven`;
  return `${(evaluations / 1e6).toFixed(1)} million looked at, ${best}${open}`;
}

/** JSON with one key to a line, and in `points` one point to a line. */
function toText(document) {
  const entries = Object.entries(document).map(([key, value]) => {
    const lines =
      key === 'points' && value.length > 0 ? value.map((each) => `    ${JSON.stringify(each)}`) : undefined;
    return `  ${JSON.stringify(key)}: ${lines ? `[\n${lines.join(',\n')}\n  ]` : JSON.stringify(value)}`;
  });
  return `{\n${entries.join(',\n')}\n}\n`;
}

function write(text) {
  return new Promise((resolve) => process.stdout.write(text, resolve));
}
