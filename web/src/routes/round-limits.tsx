import { useEffect } from 'react';
import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useReadQuery } from '@apollo/client/react';
import { useLoaderData, useLocation } from 'react-router-dom';
import type { LoaderFunctionArgs } from 'react-router-dom';
import styled from 'styled-components';
import { DeleteLimitDialog } from '../features/limits/delete-limit-dialog';
import { LimitDialog } from '../features/limits/limit-dialog';
import { LIMIT_ROW } from '../features/limits/limit-row';
import { LimitTable } from '../features/limits/limit-table';
import { LINK_LINE, LinkList } from '../features/limits/link-list';
import { CeilingDialog } from '../features/rounds/ceiling-dialog';
import { CeilingSection } from '../features/rounds/ceiling-section';
import { ROUND_CEILING } from '../features/rounds/round-ceiling';
import { preloadQuery } from '../lib/apollo';
import { canChangeContents } from '../lib/can-change-contents';
import { useCan } from '../lib/use-can';
import { Page, PageHeader } from '../ui/page';
import { unlessOnly, useOpenParam } from '../ui/use-open-param';
import type { RoundLimitsQuery, RoundLimitsQueryVariables } from './round-limits.generated';

const ROUND_LIMITS: TypedDocumentNode<RoundLimitsQuery, RoundLimitsQueryVariables> = gql`
  query RoundLimits($roundId: ID!) {
    viewer {
      organisation {
        id
        currency
        sites {
          id
          name
        }
      }
    }
    round(id: $roundId) {
      id
      name
      ...RoundCeiling
      limits {
        ...LimitRow
      }
      links {
        ...LinkLine
      }
    }
    roundOverview(roundId: $roundId) {
      asked {
        amount
        currency
      }
    }
  }
  ${ROUND_CEILING}
  ${LIMIT_ROW}
  ${LINK_LINE}
`;

export const shouldRevalidate = unlessOnly('open');

export function loader({ params }: LoaderFunctionArgs) {
  const variables = { roundId: params.roundId! };
  return preloadQuery.toPromise(preloadQuery(ROUND_LIMITS, { variables, fetchPolicy: 'cache-and-network' }));
}

export function Component() {
  const queryRef = useLoaderData<Awaited<ReturnType<typeof loader>>>();
  const { round, roundOverview, viewer } = useReadQuery(queryRef).data;
  const [, setOpen] = useOpenParam();
  const can = useCan();
  useScrollToHash();
  const changeable = can('createLimit') && canChangeContents(round.stage);
  const change = {
    onAdd: () => setOpen('add'),
    onEdit: (id: string) => setOpen(`edit-${id}`),
    onDelete: (id: string) => setOpen(`remove-${id}`),
  };
  return (
    <Page>
      <PageHeader
        title={answer(round.limits.length)}
        windowTitle={`Limits, ${round.name}`}
        sub="The search looks only for portfolios that keep to all of them, and to the links between candidates."
      />
      <Stack>
        <CeilingSection
          title="Ceiling"
          round={round}
          asked={roundOverview.asked}
          onEdit={() => setOpen('ceiling')}
        />
        <LimitTable
          limits={round.limits}
          currency={viewer.organisation.currency}
          change={changeable ? change : undefined}
        />
        <LinkList roundId={round.id} links={round.links} />
      </Stack>
      <OpenDialog round={round} organisation={viewer.organisation} changeable={changeable} />
    </Page>
  );
}

interface OpenDialogProps {
  round: RoundLimitsQuery['round'];
  organisation: RoundLimitsQuery['viewer']['organisation'];
  changeable: boolean;
}

function OpenDialog({ round, organisation, changeable }: OpenDialogProps) {
  const [open, setOpen] = useOpenParam();
  const close = () => setOpen(null);
  const limitOf = (action: string) => round.limits.find(({ id }) => open === `${action}-${id}`);
  const [edited, removed] = [limitOf('edit'), limitOf('remove')];
  if (open === 'ceiling') return <CeilingDialog round={round} onClose={close} />;
  if (!changeable) return null;
  if (removed) return <DeleteLimitDialog limit={removed} onClose={close} />;
  if (open !== 'add' && !edited) return null;
  return <LimitDialog roundId={round.id} limit={edited} choices={organisation} onClose={close} />;
}

/** The router changes the address without going to the place its hash names. */
function useScrollToHash() {
  const { hash } = useLocation();
  useEffect(() => {
    if (hash) document.getElementById(hash.slice(1))?.scrollIntoView();
  }, [hash]);
}

function answer(limits: number): string {
  if (limits === 0) return 'The ceiling alone binds this round';
  return `The ceiling and ${limits} ${limits === 1 ? 'limit' : 'limits'} bind this round`;
}

const Stack = styled.div`
  display: grid;
  gap: 16px;
`;
