import { useEffect, useState } from 'react';
import { formatNumber } from '../../lib/money';
import type { Answer } from './wording';
import { isActive, stateTag } from './run-state';
import type { Run } from './use-run';

const EVERY_MS = 10_000;

/** Says how a search goes to those who do not see it: at most every ten seconds, and at once when its state changes. */
export function RunNews({ run, answer }: { run: Run; answer: Answer | undefined }) {
  const { state } = run;
  const text = newsOf(run, answer);
  const [said, setSaid] = useState({ state, text });
  if (said.state !== state) setSaid({ state, text });
  const stale = isActive(state) && said.text !== text;
  useEffect(() => {
    if (!stale) return;
    // Begins with the first difference and is not put off by the next ones, which come each second.
    const timer = setTimeout(() => setSaid((before) => ({ ...before, text: latest.text })), EVERY_MS);
    const latest = { text };
    return () => clearTimeout(timer);
  }, [stale, text]);
  return (
    <p role="status" className="visually-hidden">
      {said.text}
    </p>
  );
}

function newsOf(run: Run, answer: Answer | undefined): string {
  const head = `Run ${run.number}: ${stateTag(run).text}.`;
  if (!run.progress || !answer) return head;
  const found = `${formatNumber(run.progress.kept)} portfolios kept; ${answer.cost} buys ${answer.benefit}.`;
  return `${head} ${found}`;
}
