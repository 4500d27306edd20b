import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { useLoaderData, useParams } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import { COMPARED_QUOTE, COSTED_CANDIDATE, COST_TERMS } from '../features/costing/compared-quote';
import { LISTED_DOCUMENT } from '../features/documents/document-list';
import { loadNeighbours } from '../features/quotes/candidate-order';
import type { Neighbours } from '../features/quotes/candidate-order';
import { KEPT_QUOTE } from '../features/quotes/kept-quote';
import { QUOTE_FIGURES } from '../features/quotes/quote-figures';
import { preloadQuery } from '../lib/apollo';
import { canChangeContents } from '../lib/can-change-contents';
import { paths } from '../lib/paths';
import { useCan } from '../lib/use-can';
import { useReload } from '../lib/use-reload';
import { Button, ButtonLink } from '../ui/button';
import { Notice } from '../ui/notice';
import { Page, PageHeader } from '../ui/page';
import { unlessOnly } from '../ui/use-open-param';
import type { CandidateQuotesQuery, CandidateQuotesQueryVariables } from './candidate-quotes.generated';
import { CandidateQuotesBody } from './candidate-quotes-body';
import { useQuoteDialog } from './use-quote-dialog';

const CANDIDATE_QUOTES: TypedDocumentNode<CandidateQuotesQuery, CandidateQuotesQueryVariables> = gql`
  query CandidateQuotes($roundId: ID!, $candidateId: ID!) {
    candidate(id: $candidateId) {
      id
      code
      name
      quantity
      department {
        id
        name
      }
      site {
        id
        name
      }
      ...CostedCandidate
      ...KeptQuote
      quotes {
        ...ComparedQuote
        ...QuoteFigures
      }
      documents {
        ...ListedDocument
      }
    }
    round(id: $roundId) {
      id
      stage
      ...CostTerms
    }
  }
  ${COSTED_CANDIDATE}
  ${KEPT_QUOTE}
  ${COMPARED_QUOTE}
  ${QUOTE_FIGURES}
  ${LISTED_DOCUMENT}
  ${COST_TERMS}
`;

export type PageData = CandidateQuotesQuery;

export async function loader({ params }: LoaderFunctionArgs) {
  const { roundId, candidateId } = params as { roundId: string; candidateId: string };
  const variables = { roundId, candidateId };
  const [queryRef, neighbours] = await Promise.all([
    preloadQuery.toPromise(preloadQuery(CANDIDATE_QUOTES, { variables, fetchPolicy: 'cache-and-network' })),
    loadNeighbours(roundId, candidateId),
  ]);
  return { queryRef, neighbours };
}

export const shouldRevalidate = unlessOnly('quote', 'document');

/** The quotes of one candidate: documents, what each costs over its life, and which one counts. */
export function Component() {
  const { queryRef, neighbours } = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { data } = useReadQuery(queryRef);
  const dialog = useQuoteDialog();
  const can = useCan();
  const reload = useReload();
  const { candidate, round } = data;
  const { code, name, department, site, quotes } = candidate;
  const frozen = !canChangeContents(round.stage);
  const mayEnter = can('createQuote') && !frozen;
  return (
    <Page>
      <PageHeader
        title={`Quotes for the ${inSentence(name)}`}
        windowTitle={`Quotes, ${code} ${name}`}
        sub={`${code} · ${department.name}, ${site.name} · ${quotes.length} ${quotes.length === 1 ? 'quote' : 'quotes'}`}
        actions={
          <>
            <NeighbourLinks {...neighbours} />
            {mayEnter && (
              <Button icon="plus" onClick={() => dialog.open('new')}>
                Enter a quote
              </Button>
            )}
          </>
        }
      />
      {frozen && (
        <Notice tone="info" title="The quotes of this round are frozen">
          They can be read. A submitted portfolio rests on them, so they change again only if it is returned.
        </Notice>
      )}
      <CandidateQuotesBody
        key={candidate.id}
        data={data}
        dialog={dialog}
        mayEnter={mayEnter}
        frozen={frozen}
        onStored={() => void reload()}
      />
    </Page>
  );
}

function NeighbourLinks({ previous, next }: Neighbours) {
  const { roundId } = useParams() as { roundId: string };
  return (
    <>
      {previous && (
        <ButtonLink
          icon="left"
          to={paths.candidateQuotes(roundId, previous.id)}
          aria-label={`Previous candidate, ${previous.code}`}
        >
          {previous.code}
        </ButtonLink>
      )}
      {next && (
        <ButtonLink
          trailingIcon="right"
          to={paths.candidateQuotes(roundId, next.id)}
          aria-label={`Next candidate, ${next.code}`}
        >
          {next.code}
        </ButtonLink>
      )}
    </>
  );
}

/** "Echo scanner" → "echo scanner"; "CT scanner" and "X-ray unit" stay as they are. */
function inSentence(name: string): string {
  return /^\p{Lu}\p{Ll}/u.test(name) ? name.charAt(0).toLowerCase() + name.slice(1) : name;
}
