import { useParams } from 'react-router-dom';
import styled from 'styled-components';
import { paths } from '../../lib/paths';
import { ButtonLink } from '../../ui/button';
import { Notice } from '../../ui/notice';
import type { StartRefusal } from './use-start-search';

/** Why no search began: what collides, line by line, and where to mend it. */
export function StartRefused({ refusal, roundId }: { refusal: StartRefusal; roundId: string }) {
  const { message, notes, mendAt } = refusal;
  return (
    <Notice tone="bad" title={message} alert actions={mendAt && <Mend {...{ mendAt, roundId }} />}>
      {notes.length > 0 && <Notes notes={notes} />}
    </Notice>
  );
}

/** One line per limit that is in the way. */
export function Notes({ notes }: { notes: readonly string[] }) {
  return (
    <List>
      {notes.map((note) => (
        <li key={note}>{note}</li>
      ))}
    </List>
  );
}

export function OpenLimits() {
  const { roundId = '' } = useParams();
  return <Mend mendAt="limits" roundId={roundId} />;
}

function Mend({ mendAt, roundId }: { mendAt: 'limits' | 'quotes'; roundId: string }) {
  return mendAt === 'limits' ? (
    <ButtonLink size="small" to={paths.limits(roundId)}>
      Open the limits
    </ButtonLink>
  ) : (
    <ButtonLink size="small" to={paths.quotes(roundId)}>
      Open the quotes
    </ButtonLink>
  );
}

const List = styled.ul`
  display: grid;
  gap: 4px;
  li {
    padding-left: 12px;
    text-indent: -12px;
  }
  li::before {
    content: '–\\00a0';
  }
`;
