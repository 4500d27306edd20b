import { useMemo } from 'react';
import type { ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { Notice } from '../../ui/notice';
import { errorMessage } from '../../lib/error-code';
import { Page, PageHeader } from '../../ui/page';
import { frontOf } from './front';
import type { Front } from './front';
import { AnswerHeading } from './answer-heading';
import { FrontierChart } from './frontier-chart';
import { FrontierTable } from './frontier-table';
import { MarginalGains } from './marginal-gains';
import { OtherPortfolios } from './other-portfolios';
import { PortfolioPanel } from './portfolio-panel';
import { RunBar } from './run-bar';
import type { RunListed } from './run-choice';
import { RunNews } from './run-news';
import { RunOutcome } from './run-outcome';
import { isActive } from './run-state';
import { SearchUnderWay } from './search-under-way';
import { SendForApproval } from './send-for-approval';
import { useChosen } from './use-chosen';
import type { Run } from './use-run';
import { useRun } from './use-run';
import { answerOf } from './wording';

interface RunPageProps {
  round: { id: string; name: string };
  runId: string;
  runs: readonly RunListed[];
  mayStop: boolean;
  maySend: boolean;
  /** "Run again", where it is allowed. */
  actions?: ReactNode;
}

/** One run: what it answers, how it stands, its chart or table, and the portfolio chosen on it. */
export function RunPage(props: RunPageProps) {
  const { run, error } = useRun(props.runId);
  const front = useMemo(() => frontOf(run), [run]);
  const bar = (
    <Bar>
      <RunBar {...props} run={run} />
      {Boolean(error) && (
        <Notice tone="caution" title={errorMessage(error)}>
          The search goes on; what you see is the last that was heard of it.
        </Notice>
      )}
      <RunOutcome run={run} />
    </Bar>
  );
  if (front) return <WithFront {...props} {...{ run, front, bar }} />;
  return (
    <Page>
      <PageHeader title="Frontier" />
      {bar}
      <RunNews run={run} answer={undefined} />
      {isActive(run.state) && <SearchUnderWay state={run.state} />}
    </Page>
  );
}

type WithFrontProps = RunPageProps & { run: Run; front: Front; bar: ReactNode };

function WithFront({ round, maySend, run, front, bar }: WithFrontProps) {
  const [params] = useSearchParams();
  const chosen = useChosen(front.portfolios);
  const table = params.get('view') === 'table';
  const answer = answerOf(front, chosen.a);
  const selected = front.portfolios[chosen.a]!;
  const footer = maySend && <SendForApproval {...{ run, front }} selected={selected} roundId={round.id} />;
  const others = !isActive(run.state) && (
    <OtherPortfolios key={selected.index} runId={run.id} {...{ front, selected }} />
  );
  return (
    <Page panel={<PortfolioPanel {...{ front, chosen, others, footer }} leftOut={run.leftOut} />}>
      <AnswerHeading answer={answer} />
      {bar}
      <RunNews run={run} answer={answer} />
      {table ? (
        <FrontierTable {...{ front, chosen }} fileName={`${round.name} run ${run.number}`} />
      ) : (
        <FrontierChart
          {...{ front, run, chosen }}
          answer={`${answer.cost} buys ${answer.benefit}. ${answer.certainty}`}
        />
      )}
      <MarginalGains front={front} at={chosen.a} />
    </Page>
  );
}

const Bar = styled.div`
  display: grid;
  gap: 8px;
  margin-bottom: 8px;
`;
