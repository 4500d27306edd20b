import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { useLoaderData } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import styled from 'styled-components';
import { ASSESSOR_GIVEN, AssessorProgress } from '../features/scoring/assessor-progress';
import { CombinedSheet } from '../features/scoring/combined-sheet';
import { CriteriaList } from '../features/scoring/criteria-list';
import { OwnSheet } from '../features/scoring/own-sheet';
import { scoresAnswer } from '../features/scoring/scores-answer';
import { SHEET_CANDIDATE, SHEET_CRITERION, SHEET_SCORE } from '../features/scoring/sheet-parts';
import { useOwnScores } from '../features/scoring/use-own-scores';
import { preloadQuery } from '../lib/apollo';
import { stepIndex } from '../lib/round-stage';
import { useCan } from '../lib/use-can';
import { useViewer } from '../lib/viewer';
import { Page, PageHeader } from '../ui/page';
import type { RoundScoresQuery, RoundScoresQueryVariables } from './round-scores.generated';

const ROUND_SCORES: TypedDocumentNode<RoundScoresQuery, RoundScoresQueryVariables> = gql`
  query RoundScores($roundId: ID!) {
    scoreSheet(roundId: $roundId) {
      round {
        id
        name
        stage
        scoringClosesOn
      }
      candidates {
        ...SheetCandidate
      }
      criteria {
        ...SheetCriterion
      }
      own {
        ...SheetScore
      }
      others {
        ...SheetScore
      }
      assessors {
        ...AssessorGiven
      }
    }
  }
  ${SHEET_CANDIDATE}
  ${SHEET_CRITERION}
  ${SHEET_SCORE}
  ${ASSESSOR_GIVEN}
`;

export function loader({ params }: LoaderFunctionArgs) {
  const variables = { roundId: params.roundId! };
  return preloadQuery.toPromise(preloadQuery(ROUND_SCORES, { variables, fetchPolicy: 'network-only' }));
}

export function Component() {
  const queryRef = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { scoreSheet: sheet } = useReadQuery(queryRef).data;
  const { membership } = useViewer();
  const assesses = useCan()('saveScore');
  const scores = useOwnScores(sheet.round.id, sheet.own);
  const { round, candidates, criteria, own, others, assessors } = sheet;
  const closed = stepIndex(round.stage) > stepIndex('SCORE');
  const scoring = round.stage === 'SCORE' && assesses && candidates.length > 0 && criteria.length > 0;
  const given = candidates.flatMap(({ id }) =>
    criteria.filter((criterion) => scores.at(id, criterion.id)),
  ).length;
  const answer = scoresAnswer({ round, assesses, given, of: candidates.length * criteria.length, assessors });
  return (
    <Page>
      <PageHeader title={answer.title} sub={answer.sub} windowTitle={`Scoring, ${round.name}`} />
      {scoring && <OwnSheet {...{ candidates, criteria, scores }} />}
      {closed && (
        <CombinedSheet
          {...{ candidates, criteria }}
          scores={[...own, ...others]}
          membershipId={membership.id}
        />
      )}
      {!scoring && (
        <Two>
          <AssessorProgress assessors={assessors} />
          <CriteriaList criteria={criteria} frozen={round.stage !== 'GATHER'} />
        </Two>
      )}
    </Page>
  );
}

const Two = styled.div`
  display: grid;
  grid-template-columns: minmax(0, 1fr) minmax(0, 1fr);
  gap: 16px;
  align-items: start;
  * + & {
    margin-top: 16px;
  }
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
  }
`;
