import { useEffect, useState } from 'react';
import { isActive } from './run-state';
import type { Run } from './use-run';

/** Seconds a run has taken, ticking while it searches; undefined before it began. */
export function useElapsed({
  state,
  startedAt,
  finishedAt,
}: Pick<Run, 'state' | 'startedAt' | 'finishedAt'>) {
  const ticking = isActive(state);
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    if (!ticking) return;
    const timer = setInterval(() => setNow(Date.now()), 1_000);
    return () => clearInterval(timer);
  }, [ticking]);
  if (!startedAt) return undefined;
  const end = finishedAt ? Date.parse(finishedAt) : now;
  return (end - Date.parse(startedAt)) / 1_000;
}
