import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { useLoaderData, useSearchParams } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import styled from 'styled-components';
import { FEED_ENTRY, FeedList } from '../features/audit/feed-list';
import { DecisionBox } from '../features/selections/decision-box';
import { MemoChoice } from '../features/selections/memo-choice';
import { MemoPage } from '../features/selections/memo-page';
import { NoSelectionYet } from '../features/selections/no-selection-yet';
import { SELECTION_MEMO } from '../features/selections/selection-memo';
import { Signatures } from '../features/selections/signatures';
import { preloadQuery } from '../lib/apollo';
import { useCan } from '../lib/use-can';
import { useViewer } from '../lib/viewer';
import { Button } from '../ui/button';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';
import { unlessOnly } from '../ui/use-open-param';
import type { RoundSelectionQuery, RoundSelectionQueryVariables } from './round-selection.generated';

const ROUND_SELECTION: TypedDocumentNode<RoundSelectionQuery, RoundSelectionQueryVariables> = gql`
  query RoundSelection($roundId: ID!) {
    round(id: $roundId) {
      id
      name
      decisionDate
      counts {
        candidates
      }
      selections {
        ...SelectionMemo
      }
    }
    auditFeed(roundId: $roundId, first: 12) {
      items {
        ...FeedEntry
      }
    }
  }
  ${SELECTION_MEMO}
  ${FEED_ENTRY}
`;

export const shouldRevalidate = unlessOnly('memo');

export function loader({ params }: LoaderFunctionArgs) {
  const variables = { roundId: params.roundId! };
  return preloadQuery.toPromise(
    preloadQuery(ROUND_SELECTION, { variables, fetchPolicy: 'cache-and-network' }),
  );
}

export function Component() {
  const queryRef = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { data } = useReadQuery(queryRef);
  const [params, setParams] = useSearchParams();
  const can = useCan();
  const { membership } = useViewer();
  const { round, auditFeed } = data;
  const asked = Number(params.get('memo'));
  const selection = round.selections.find(({ number }) => number === asked) ?? round.selections[0];
  if (!selection) {
    return (
      <Page>
        <PageHeader title="Approval" windowTitle={`Approval, ${round.name}`} />
        <NoSelectionYet roundId={round.id} />
      </Page>
    );
  }
  return (
    <Page>
      <title>{`Approval, ${round.name} · Metewand`}</title>
      <Grid>
        <MemoPage
          selection={selection}
          decisionDate={round.decisionDate}
          candidates={round.counts.candidates}
        />
        <Beside data-screen-only>
          <Tools>
            <MemoChoice
              selections={round.selections}
              decisionDate={round.decisionDate}
              chosen={selection.number}
              onChoose={(number) => setParams({ memo: String(number) })}
            />
            <Button icon="print" onClick={() => window.print()}>
              Print the memo
            </Button>
          </Tools>
          <Signatures selection={selection} awaited={can('decideSelection') ? membership.name : undefined} />
          <Decide>
            <DecisionBox key={selection.id} selection={selection} />
          </Decide>
          <Section title="Audit trail" padded>
            <FeedList entries={auditFeed.items} />
          </Section>
        </Beside>
      </Grid>
    </Page>
  );
}

const Grid = styled.div`
  display: grid;
  grid-template-columns: minmax(0, 1fr) 356px;
  gap: 20px;
  align-items: start;
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
  }
  @media (max-width: 767px) {
    margin: -16px -16px 0;
  }
`;

const Beside = styled.div`
  display: grid;
  gap: 16px;
  @media (max-width: 767px) {
    display: contents;
    > * {
      margin-inline: 16px;
    }
  }
`;

const Tools = styled.div`
  display: flex;
  flex-wrap: wrap;
  justify-content: flex-end;
  gap: 8px;
`;

/** On a phone the decision sticks to the bottom, within the thumb's reach. */
const Decide = styled.div`
  @media (max-width: 767px) {
    position: sticky;
    bottom: 0;
    z-index: 5;
    order: 1;
    && {
      margin-inline: 0;
    }
  }
`;
