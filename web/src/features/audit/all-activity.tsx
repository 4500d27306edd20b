import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useQuery } from '@apollo/client/react';
import styled from 'styled-components';
import { errorMessage } from '../../lib/error-code';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { Notice } from '../../ui/notice';
import { Skeleton } from '../../ui/skeleton';
import type { AllActivityQuery, AllActivityQueryVariables } from './all-activity.generated';
import { FEED_ENTRY, FeedList } from './feed-list';

const ALL_ACTIVITY: TypedDocumentNode<AllActivityQuery, AllActivityQueryVariables> = gql`
  query AllActivity($roundId: ID!, $after: String) {
    auditFeed(roundId: $roundId, first: 30, after: $after) {
      endCursor
      hasMore
      items {
        ...FeedEntry
      }
    }
  }
  ${FEED_ENTRY}
`;

/** The whole trail of the round, thirty entries at a time. */
export function AllActivity({ roundId, onClose }: { roundId: string; onClose: () => void }) {
  const { data, error, loading, fetchMore, refetch } = useQuery(ALL_ACTIVITY, {
    variables: { roundId },
    fetchPolicy: 'network-only',
    notifyOnNetworkStatusChange: true,
  });
  const feed = data?.auditFeed;

  function loadMore(after: string | null) {
    return fetchMore({
      variables: { after },
      updateQuery: (before, { fetchMoreResult }) => ({
        ...before,
        auditFeed: {
          ...fetchMoreResult.auditFeed,
          items: [...before.auditFeed.items, ...fetchMoreResult.auditFeed.items],
        },
      }),
    });
  }

  return (
    <Dialog
      title="All activity"
      sub="The audit trail of this round, newest first"
      position="right"
      onClose={onClose}
    >
      {error && (
        <Notice
          tone="bad"
          alert
          title={errorMessage(error)}
          actions={<Button onClick={() => void refetch()}>Try again</Button>}
        />
      )}
      {!feed && !error && <Skeleton rows={12} />}
      {feed && <FeedList entries={feed.items} />}
      {feed?.hasMore && (
        <More>
          <Button loading={loading} onClick={() => void loadMore(feed.endCursor)}>
            Load more
          </Button>
        </More>
      )}
    </Dialog>
  );
}

const More = styled.div`
  padding: 16px 0;
`;
