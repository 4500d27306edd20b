import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import styled from 'styled-components';
import { formatInstant } from '../../lib/dates';
import type { FeedEntryFragment } from './feed-list.generated';
import { feedTime } from './feed-time';

export const FEED_ENTRY: TypedDocumentNode<FeedEntryFragment> = gql`
  fragment FeedEntry on AuditEntry {
    seq
    at
    sentence
    detail
    by {
      id
      name
    }
  }
`;

/** Entries of the trail, newest first: when, what, and by whom. */
export function FeedList({ entries }: { entries: readonly FeedEntryFragment[] }) {
  return (
    <List>
      {entries.map((entry) => (
        <li key={entry.seq}>
          <time dateTime={entry.at} title={formatInstant(entry.at)}>
            {feedTime(entry.at)}
          </time>
          <span>
            {entry.sentence}
            <small>{detailOf(entry)}</small>
          </span>
        </li>
      ))}
    </List>
  );
}

/** "C-57 Test scanner, by Hanne Vos". A reason somebody wrote may end in a full stop, which the name would follow. */
function detailOf({ detail, by }: FeedEntryFragment): string {
  return [detail?.replace(/\.$/u, ''), by?.name].filter(Boolean).join(', by ');
}

const List = styled.ol`
  li {
    display: grid;
    grid-template-columns: 52px minmax(0, 1fr);
    gap: 8px;
    padding: 9px 0;
    border-top: 1px solid var(--mw-line);
    line-height: 1.35;
    overflow-wrap: anywhere;
  }
  time {
    font-size: 13px;
    color: var(--mw-ink-2);
  }
  small {
    display: block;
    font-size: 13px;
    color: var(--mw-ink-2);
  }
`;
