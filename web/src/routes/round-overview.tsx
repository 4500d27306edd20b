import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { useLoaderData } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import styled from 'styled-components';
import { AllActivity } from '../features/audit/all-activity';
import { FEED_ENTRY } from '../features/audit/feed-list';
import { LatestFeed } from '../features/audit/latest-feed';
import { DEPARTMENT_BAR, DepartmentBars } from '../features/overview/department-bars';
import { overviewAnswer, whatGoesOn } from '../features/overview/overview-answer';
import { ROUND_STEPS, RoundSteps, STEP_COUNTS } from '../features/overview/round-steps';
import { TO_SETTLE_ITEM, ToSettleList } from '../features/overview/to-settle-list';
import { AdvanceDialog } from '../features/rounds/advance-dialog';
import { CeilingDialog } from '../features/rounds/ceiling-dialog';
import { CeilingSection } from '../features/rounds/ceiling-section';
import { ROUND_CEILING } from '../features/rounds/round-ceiling';
import { StageActions } from '../features/rounds/stage-actions';
import { StepBackDialog } from '../features/rounds/step-back-dialog';
import { preloadQuery } from '../lib/apollo';
import { formatPercent } from '../lib/money';
import { stepIndex } from '../lib/round-stage';
import { Page, PageHeader } from '../ui/page';
import { unlessOnly, useOpenParam } from '../ui/use-open-param';
import type { RoundOverviewQuery, RoundOverviewQueryVariables } from './round-overview.generated';

const ROUND_OVERVIEW: TypedDocumentNode<RoundOverviewQuery, RoundOverviewQueryVariables> = gql`
  query RoundOverview($roundId: ID!) {
    round(id: $roundId) {
      id
      name
      ...RoundSteps
      ...RoundCeiling
    }
    roundOverview(roundId: $roundId) {
      settled
      quotesUsable
      toSettle {
        ...ToSettleItem
      }
      asked {
        amount
        currency
      }
      askedByDepartment {
        ...DepartmentBar
      }
      ...StepCounts
    }
    auditFeed(roundId: $roundId, first: 8) {
      items {
        ...FeedEntry
      }
    }
  }
  ${ROUND_STEPS}
  ${ROUND_CEILING}
  ${TO_SETTLE_ITEM}
  ${DEPARTMENT_BAR}
  ${STEP_COUNTS}
  ${FEED_ENTRY}
`;

export const shouldRevalidate = unlessOnly('open');

export function loader({ params }: LoaderFunctionArgs) {
  const variables = { roundId: params.roundId! };
  return preloadQuery.toPromise(
    preloadQuery(ROUND_OVERVIEW, { variables, fetchPolicy: 'cache-and-network' }),
  );
}

export function Component() {
  const queryRef = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { data } = useReadQuery(queryRef);
  const [open, setOpen] = useOpenParam();
  const { round, roundOverview: overview, auditFeed } = data;
  const close = () => setOpen(null);
  return (
    <Page>
      <PageHeader
        title={overviewAnswer(round, overview.toSettle.length)}
        windowTitle={`Overview, ${round.name}`}
        sub={whatGoesOn(round)}
        actions={
          <StageActions
            round={round}
            onAdvance={() => setOpen('advance')}
            onStepBack={() => setOpen('step-back')}
          />
        }
      />
      <RoundSteps round={round} counts={overview} />
      <Grid>
        <ToSettleList
          roundId={round.id}
          items={overview.toSettle}
          settled={overview.settled}
          decided={stepIndex(round.stage) > stepIndex('DECIDE')}
        />
        <Feed>
          <LatestFeed entries={auditFeed.items} onOpenAll={() => setOpen('activity')} />
        </Feed>
        <CeilingSection
          title="Asked for against the ceiling"
          round={round}
          asked={overview.asked}
          figures={figuresOf(overview)}
          onEdit={() => setOpen('ceiling')}
        >
          <DepartmentBars asks={overview.askedByDepartment} />
        </CeilingSection>
      </Grid>
      {open === 'advance' && <AdvanceDialog round={round} onClose={close} />}
      {open === 'step-back' && <StepBackDialog round={round} onClose={close} />}
      {open === 'ceiling' && <CeilingDialog round={round} onClose={close} />}
      {open === 'activity' && <AllActivity roundId={round.id} onClose={close} />}
    </Page>
  );
}

function figuresOf({ quotes, quotesUsable, scoresGiven, scoresWanted }: RoundOverviewQuery['roundOverview']) {
  return [
    { value: `${quotesUsable} of ${quotes}`, name: 'quotes usable' },
    // Rounded down: all scores are given only when none is missing.
    { value: scoresWanted === 0 ? '—' : formatPercent(Math.floor((scoresGiven / scoresWanted) * 100) / 100), name: 'of scores given' }, // prettier-ignore
  ];
}

const Grid = styled.div`
  flex: 1;
  display: grid;
  grid-template-columns: minmax(0, 1fr) 340px;
  grid-template-rows: auto 1fr;
  gap: 16px;
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
    grid-template-rows: auto;
  }
`;

const Feed = styled.div`
  grid-column: 2;
  grid-row: 1 / span 2;
  @media (max-width: 1023px) {
    grid-column: 1;
    grid-row: auto;
    order: 1;
  }
`;
