import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { Navigate, useLoaderData, useSearchParams } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import { QuoteFilters } from '../features/quotes/quote-filters';
import { QUOTE_ROW, QuoteTable } from '../features/quotes/quote-table';
import { preloadQuery } from '../lib/apollo';
import { formatDate } from '../lib/dates';
import { currencySign } from '../lib/money';
import { paths } from '../lib/paths';
import { useViewer } from '../lib/viewer';
import { Button, ButtonLink } from '../ui/button';
import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Pager } from '../ui/pager';
import { readPage, withFilter } from '../ui/use-table-params';
import type { RoundQuotesQuery, RoundQuotesQueryVariables } from './round-quotes.generated';

const PAGE_SIZE = 50;

const ROUND_QUOTES: TypedDocumentNode<RoundQuotesQuery, RoundQuotesQueryVariables> = gql`
  query RoundQuotes($roundId: ID!, $filter: QuoteFilter, $page: Int!, $pageSize: Int!) {
    quotes(roundId: $roundId, filter: $filter, page: $page, pageSize: $pageSize) {
      total
      items {
        id
        ...QuoteRow
      }
    }
    round(id: $roundId) {
      id
      name
      decisionDate
      counts {
        quotes
        quotesToSettle
      }
    }
  }
  ${QUOTE_ROW}
`;

export function loader({ params, request }: LoaderFunctionArgs) {
  const query = new URL(request.url).searchParams;
  const variables = {
    roundId: params.roundId!,
    filter: { search: query.get('q') ?? '', faultyOnly: query.get('only') === 'to-settle' },
    page: readPage(query),
    pageSize: PAGE_SIZE,
  };
  return preloadQuery.toPromise(preloadQuery(ROUND_QUOTES, { variables, fetchPolicy: 'cache-and-network' }));
}

/** All quotes of the round, to find one and to see what is wrong with any. */
export function Component() {
  const queryRef = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { quotes, round } = useReadQuery(queryRef).data;
  const { organisation } = useViewer();
  const { filtered, faultyOnly, page, setFaultyOnly, clear } = useFilters();
  const pages = Math.ceil(quotes.total / PAGE_SIZE);
  if (page > Math.max(1, pages)) return <Navigate to={paths.quotes(round.id)} replace />;
  return (
    <Page>
      <PageHeader
        title="Quotes"
        windowTitle={pages > 1 ? `Quotes, page ${page} of ${pages}` : 'Quotes'}
        sub={summary(round)}
      />
      <QuoteFilters faultyOnly={faultyOnly} onFaultyOnly={setFaultyOnly} />
      <QuoteTable
        quotes={quotes.items}
        currencySign={currencySign(organisation.currency)}
        pathTo={(candidateId) => paths.candidateQuotes(round.id, candidateId)}
        empty={filtered ? <NothingFound onClear={clear} /> : <NoQuotes roundId={round.id} />}
        footer={
          quotes.total > 0 && <Pager page={page} pageSize={PAGE_SIZE} total={quotes.total} noun="quotes" />
        }
      />
    </Page>
  );
}

function summary({ counts, decisionDate }: RoundQuotesQuery['round']): string {
  const { quotes, quotesToSettle: without } = counts;
  if (quotes === 0) return 'None has come in yet.';
  const count = `${quotes} ${quotes === 1 ? 'quote' : 'quotes'}. Each must hold until the decision on ${formatDate(decisionDate)}.`;
  if (without === 0) return count;
  return `${count} ${without} ${without === 1 ? 'candidate has' : 'candidates have'} none that can be bought by.`;
}

function useFilters() {
  const [params, setParams] = useSearchParams();
  const faultyOnly = params.get('only') === 'to-settle';
  return {
    filtered: faultyOnly || params.has('q'),
    faultyOnly,
    page: readPage(params),
    setFaultyOnly: (only: boolean) =>
      setParams((before) => withFilter(before, 'only', only ? 'to-settle' : '')),
    clear: () => setParams({}),
  };
}

function NothingFound({ onClear }: { onClear: () => void }) {
  return <Empty plain title="No quote matches" actions={<Button onClick={onClear}>Clear filters</Button>} />;
}

function NoQuotes({ roundId }: { roundId: string }) {
  return (
    <Empty
      title="No quote has come in yet"
      actions={
        <ButtonLink to={paths.candidates(roundId)} variant="primary">
          Open the candidates
        </ButtonLink>
      }
    >
      A quote belongs to a candidate: open one, upload what the vendor sent and enter its figures.
    </Empty>
  );
}
