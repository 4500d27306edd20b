import { useEffect, useRef } from 'react';
import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { Navigate, useLoaderData, useSearchParams } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import { AddCandidateDialog } from '../features/candidates/add-candidate-dialog';
import { CandidatePanel } from '../features/candidates/candidate-panel';
import { CANDIDATE_ROW } from '../features/candidates/candidate-row';
import { CandidateTable, rowLinkId } from '../features/candidates/candidate-table';
import { CandidateToolbar } from '../features/candidates/candidate-toolbar';
import { listVariables, withPanel } from '../features/candidates/candidate-list-params';
import { CandidatesAnswer } from '../features/candidates/candidates-answer';
import { NoMatch, NothingAskedFor } from '../features/candidates/no-candidates';
import { TableFooter } from '../features/candidates/table-footer';
import { preloadQuery } from '../lib/apollo';
import { canChangeContents } from '../lib/can-change-contents';
import { useCan } from '../lib/use-can';
import { Button } from '../ui/button';
import { Page, PageHeader } from '../ui/page';
import { unlessOnly, useOpenParam } from '../ui/use-open-param';
import type { RoundCandidatesQuery, RoundCandidatesQueryVariables } from './round-candidates.generated';

const ROUND_CANDIDATES: TypedDocumentNode<RoundCandidatesQuery, RoundCandidatesQueryVariables> = gql`
  query RoundCandidates(
    $roundId: ID!
    $filter: CandidateFilter
    $sort: CandidateSort
    $page: Int!
    $pageSize: Int!
  ) {
    viewer {
      organisation {
        id
        currency
        departments {
          id
          name
        }
        sites {
          id
          name
        }
      }
    }
    round(id: $roundId) {
      id
      name
      stage
      decisionDate
      discountRate
      ceiling {
        amount
        currency
      }
    }
    candidates(roundId: $roundId, filter: $filter, sort: $sort, page: $page, pageSize: $pageSize) {
      total
      page
      pageSize
      all
      somethingMissing
      mandatory
      askedFor {
        amount
        currency
      }
      items {
        ...CandidateRow
      }
    }
  }
  ${CANDIDATE_ROW}
`;

export const shouldRevalidate = unlessOnly('candidate', 'open');

export function loader({ params, request }: LoaderFunctionArgs) {
  const variables = listVariables(params.roundId!, new URL(request.url).searchParams);
  return preloadQuery.toPromise(
    preloadQuery(ROUND_CANDIDATES, { variables, fetchPolicy: 'cache-and-network' }),
  );
}

export function Component() {
  const queryRef = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { round, candidates, viewer } = useReadQuery(queryRef).data;
  const { organisation } = viewer;
  const can = useCan();
  const [params] = useSearchParams();
  const [open, setOpen] = useOpenParam();
  const { chosenId, choose } = useChosen();
  const mayAdd = can('createCandidate') && canChangeContents(round.stage);
  const add = mayAdd && (
    <Button variant="primary" icon="plus" onClick={() => setOpen('add')}>
      Add candidate
    </Button>
  );
  // A page that has vanished, as after a filter, is page 1.
  if (candidates.items.length === 0 && candidates.total > 0)
    return <Navigate to={`?${firstPage(params)}`} replace />;
  return (
    <Page
      panel={
        chosenId && (
          <CandidatePanel
            roundId={round.id}
            candidateId={chosenId}
            choices={organisation}
            editing={open === 'edit'}
            onEdit={(editing) => setOpen(editing ? 'edit' : null)}
            onClose={() => choose(null)}
          />
        )
      }
    >
      <PageHeader
        title="Candidates"
        windowTitle={windowTitle(candidates, round.name)}
        sub={
          <CandidatesAnswer count={candidates.all} askedFor={candidates.askedFor} ceiling={round.ceiling} />
        }
        actions={candidates.all > 0 && add}
      />
      {candidates.all === 0 ? (
        <NothingAskedFor action={add} />
      ) : (
        <>
          <CandidateToolbar
            counts={{
              ALL: candidates.all,
              SOMETHING_MISSING: candidates.somethingMissing,
              MANDATORY: candidates.mandatory,
            }}
            departments={organisation.departments}
            sites={organisation.sites}
          />
          <CandidateTable
            rows={candidates.items}
            currency={organisation.currency}
            decisionDate={round.decisionDate}
            scored={round.stage !== 'GATHER' && round.stage !== 'SCORE'}
            selectedId={chosenId}
            empty={<NoMatch />}
            footer={<TableFooter {...candidates} discountRate={round.discountRate} />}
          />
        </>
      )}
      {open === 'add' && mayAdd && (
        <AddCandidateDialog
          roundId={round.id}
          choices={organisation}
          onAdded={choose}
          onClose={() => setOpen(null)}
        />
      )}
    </Page>
  );
}

/** The candidate whose panel is open; when it closes, the focus goes back to its row. */
function useChosen() {
  const [params, setParams] = useSearchParams();
  const chosenId = params.get('candidate');
  const before = useRef(chosenId);
  useEffect(() => {
    if (before.current && !chosenId) document.getElementById(rowLinkId(before.current))?.focus();
    before.current = chosenId;
  }, [chosenId]);
  return { chosenId, choose: (id: string | null) => setParams((now) => withPanel(now, id)) };
}

function firstPage(params: URLSearchParams): URLSearchParams {
  const next = new URLSearchParams(params);
  next.delete('page');
  return next;
}

function windowTitle({ page, pageSize, total }: RoundCandidatesQuery['candidates'], round: string): string {
  const pages = Math.ceil(total / pageSize);
  return pages > 1 ? `Candidates, page ${page} of ${pages}, ${round}` : `Candidates, ${round}`;
}
