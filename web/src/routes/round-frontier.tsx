import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useSuspenseQuery } from '@apollo/client/react';
import { useParams, useSearchParams } from 'react-router-dom';
import type { LoaderFunctionArgs, ShouldRevalidateFunctionArgs } from 'react-router-dom';
import { NoRunYet } from '../features/frontier/no-run-yet';
import { RUN_LISTED } from '../features/frontier/run-choice';
import { RunPage } from '../features/frontier/run-page';
import { RunAgain } from '../features/frontier/start-search';
import { loadRun } from '../features/frontier/use-run';
import { client } from '../lib/apollo';
import { useCan } from '../lib/use-can';
import { Page } from '../ui/page';
import type { RoundFrontierQuery, RoundFrontierQueryVariables } from './round-frontier.generated';

const ROUND_FRONTIER: TypedDocumentNode<RoundFrontierQuery, RoundFrontierQueryVariables> = gql`
  query RoundFrontier($id: ID!) {
    round(id: $id) {
      id
      name
      stage
      runs {
        ...RunListed
      }
    }
  }
  ${RUN_LISTED}
`;

export async function loader({ params, request }: LoaderFunctionArgs) {
  const variables = { id: params.roundId! };
  const { data } = await client.query({ query: ROUND_FRONTIER, variables, fetchPolicy: 'network-only' });
  const run = chosenRun(data!.round.runs, new URL(request.url).searchParams.get('run'));
  if (run) await loadRun(run.id);
  return null;
}

/** Choosing a portfolio or the table changes the address too, but asks for nothing. */
export function shouldRevalidate({
  currentUrl,
  nextUrl,
  defaultShouldRevalidate,
}: ShouldRevalidateFunctionArgs) {
  const samePage = currentUrl.pathname === nextUrl.pathname && currentUrl.search !== nextUrl.search;
  const sameRun = currentUrl.searchParams.get('run') === nextUrl.searchParams.get('run');
  return samePage && sameRun ? false : defaultShouldRevalidate;
}

export function Component() {
  const { roundId = '' } = useParams();
  const [params] = useSearchParams();
  const { round } = useSuspenseQuery(ROUND_FRONTIER, { variables: { id: roundId } }).data;
  const can = useCan();
  const searching = round.stage === 'SEARCH';
  const run = chosenRun(round.runs, params.get('run'));
  if (!run)
    return (
      <Page>
        <NoRunYet round={round} mayStart={searching && can('startSearch')} />
      </Page>
    );
  return (
    <RunPage
      key={run.id}
      round={round}
      runId={run.id}
      runs={round.runs}
      mayStop={can('stopSearch')}
      maySend={searching && can('submitSelection')}
      actions={searching && can('startSearch') && <RunAgain roundId={round.id} />}
    />
  );
}

/** The run the address names by its number, else the newest. */
function chosenRun<Run extends { number: number }>(runs: readonly Run[], number: string | null) {
  return runs.find((run) => String(run.number) === number) ?? runs[0];
}
