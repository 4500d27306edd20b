import { parseFrontier, parseProblem, verifyFrontier } from '@metewand/frontier';
import { fingerprintOf } from './fingerprint.mjs';
import { ProgressLine } from './progress-line.mjs';
import { proveFrontier } from './prove-frontier.mjs';
import { readDocument } from './read-document.mjs';

/** Ends with 0 if a frontier holds, with 1 and the reasons on standard error if not. */
export async function verifyCommand({ problemPath, resultPath, prove, seconds }) {
  const problem = readDocument(problemPath, parseProblem);
  const claimed = readDocument(resultPath, parseFrontier);
  const findings = verifyFrontier(problem, claimed, fingerprintOf(problem));
  if (findings.length === 0 && prove) findings.push(...(await proof(problem, claimed, seconds)));
  for (const { path, sentence } of findings.slice(0, MOST_SHOWN)) console.error(`${path}: ${sentence}`);
  if (findings.length > MOST_SHOWN) console.error(`… and ${findings.length - MOST_SHOWN} more.`);
  return findings.length === 0 ? 0 : 1;
}

const MOST_SHOWN = 50;

async function proof(problem, claimed, seconds) {
  const progress = new ProgressLine();
  const findings = [];
  const onStep = (done, of) => progress.show(() => `${done} of ${of} steps proven`);
  for await (const finding of proveFrontier(problem, claimed, { seconds, onStep })) findings.push(finding);
  progress.end(findings.length === 0 ? 'proven' : `not proven: ${findings.length} findings`);
  return findings;
}
