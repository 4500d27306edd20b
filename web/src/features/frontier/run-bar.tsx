import type { ReactNode } from 'react';
import styled from 'styled-components';
import { formatNumber } from '../../lib/money';
import { Button } from '../../ui/button';
import { Progress } from '../../ui/progress';
import { Tag } from '../../ui/tag';
import { RunChoice } from './run-choice';
import type { RunListed } from './run-choice';
import { sharePercent } from './proven-note';
import { elapsedText, isActive, stateTag } from './run-state';
import { useElapsed } from './use-elapsed';
import type { Run } from './use-run';
import { useStopSearch } from './use-stop-search';

interface RunBarProps {
  run: Run;
  runs: readonly RunListed[];
  mayStop: boolean;
  /** At the right while no search goes on, such as "Run again". */
  actions?: ReactNode;
}

/** How the run stands: state, time, progress, figures, and the one thing to do about it. */
export function RunBar({ run, runs, mayStop, actions }: RunBarProps) {
  const active = isActive(run.state);
  const tag = stateTag(run);
  const elapsed = useElapsed(run);
  return (
    <Bar>
      <Tag tone={tag.tone} icon={tag.icon}>
        {tag.text}
      </Tag>
      <RunChoice run={run} runs={runs} />
      {elapsed !== undefined && <span>{elapsedText(elapsed)}</span>}
      {active && (
        <Rod>
          <Progress label={`Run ${run.number}, proven`} hideLabel share={run.certificate.provenShare} />
        </Rod>
      )}
      {run.progress && (
        <span className="muted">
          {formatNumber(run.progress.lookedAt)} looked at, {formatNumber(run.progress.kept)} kept
          {run.certificate.status === 'BOUNDED' &&
            `, ${sharePercent(run.certificate.provenShare)} of the axis proven`}
        </span>
      )}
      <Actions data-screen-only>{active ? mayStop && <Stop run={run} /> : actions}</Actions>
    </Bar>
  );
}

function Stop({ run }: { run: Run }) {
  const { stop, loading, problem } = useStopSearch();
  return (
    <>
      {problem && <span role="alert">{problem}</span>}
      <Button
        size="small"
        icon="stop"
        loading={loading || run.stopRequested}
        onClick={() => void stop(run.id)}
      >
        Stop and keep
      </Button>
    </>
  );
}

const Bar = styled.div`
  display: flex;
  flex-wrap: wrap;
  align-items: center;
  gap: 6px 12px;
  min-height: 44px;
  margin-top: 10px;
  padding: 7px 10px;
  font-size: 13px;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
`;

const Rod = styled.div`
  flex: 1;
  min-width: 90px;
  max-width: 190px;
`;

const Actions = styled.div`
  display: flex;
  align-items: center;
  gap: 8px;
  margin-left: auto;
`;
