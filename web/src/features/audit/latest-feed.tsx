import styled from 'styled-components';
import { Button } from '../../ui/button';
import { Section } from '../../ui/section';
import type { FeedEntryFragment } from './feed-list.generated';
import { FeedList } from './feed-list';

interface LatestFeedProps {
  entries: readonly FeedEntryFragment[];
  onOpenAll: () => void;
}

/** The newest entries of the trail. */
export function LatestFeed({ entries, onOpenAll }: LatestFeedProps) {
  return (
    <Tall title="Latest" aside={<OpenAll onClick={onOpenAll}>All activity</OpenAll>} padded>
      {entries.length === 0 ? (
        <p className="muted">What happens in this round is written down here.</p>
      ) : (
        <FeedList entries={entries} />
      )}
    </Tall>
  );
}

const Tall = styled(Section)`
  height: 100%;
`;

const OpenAll = styled(Button).attrs({ variant: 'quiet', size: 'small' })`
  margin: -4px -8px;
  text-decoration: underline;
`;
