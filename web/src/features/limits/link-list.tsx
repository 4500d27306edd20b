import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { Link } from 'react-router-dom';
import styled from 'styled-components';
import { paths } from '../../lib/paths';
import { Empty } from '../../ui/empty';
import { Icon } from '../../ui/icon';
import { Section } from '../../ui/section';
import type { LinkLineFragment } from './link-list.generated';

export const LINK_LINE: TypedDocumentNode<LinkLineFragment> = gql`
  fragment LinkLine on Link {
    id
    kind
    least
    most
    reason
    candidate {
      id
      code
      name
    }
    members {
      id
      code
      name
    }
  }
`;

type Linked = LinkLineFragment['members'][number];

/** What candidates need and exclude, in sentences. */
export function LinkList({ roundId, links }: { roundId: string; links: readonly LinkLineFragment[] }) {
  return (
    <Section title="Links between candidates" aside={links.length > 0 && `${links.length} bind the search`}>
      {links.length === 0 ? (
        <Empty plain title="No candidate depends on another">
          Candidates can need one another, or exclude one another.
        </Empty>
      ) : (
        <List id="links">
          {links.map((link) => (
            <li key={link.id}>
              <Mark $kind={link.kind}>
                <Icon name={link.kind === 'NEEDS' ? 'need' : link.kind === 'EITHER_OR' ? 'over' : 'list'} />
              </Mark>
              <span>
                <Sentence roundId={roundId} link={link} />
                {link.reason && <Reason>: {link.reason}</Reason>}
              </span>
            </li>
          ))}
        </List>
      )}
    </Section>
  );
}

function Sentence({ roundId, link }: { roundId: string; link: LinkLineFragment }) {
  const members = (word: string) => <Names roundId={roundId} candidates={link.members} word={word} />;
  if (link.kind === 'NEEDS' && link.candidate)
    return (
      <>
        <Names roundId={roundId} candidates={[link.candidate]} word="" /> needs {members('and')}
      </>
    );
  if (link.kind === 'EITHER_OR') return <>Either {members('or')}</>;
  return (
    <>
      {boundsOf(link)} of {members('and')}
    </>
  );
}

function boundsOf({ least, most }: LinkLineFragment): string {
  if (least !== null && most !== null) return `Between ${least} and ${most}`;
  return least !== null ? `At least ${least}` : `At most ${most}`;
}

function Names({
  roundId,
  candidates,
  word,
}: {
  roundId: string;
  candidates: readonly Linked[];
  word: string;
}) {
  return candidates.map(({ id, code, name }, index) => (
    <span key={id}>
      {index > 0 && ` ${word} `}
      <Link to={`${paths.candidates(roundId)}?candidate=${id}`}>{code}</Link> {name}
    </span>
  ));
}

const List = styled.ul`
  scroll-margin-top: 120px;
  li {
    display: grid;
    grid-template-columns: 16px minmax(0, 1fr);
    gap: 12px;
    padding: 9px 16px;
    border-top: 1px solid var(--mw-line);
    line-height: 1.4;
  }
`;

const Mark = styled.span<{ $kind: LinkLineFragment['kind'] }>`
  color: var(${({ $kind }) => ($kind === 'NEEDS' ? '--mw-sea' : '--mw-rod-text')});
`;

const Reason = styled.span`
  color: var(--mw-ink-2);
`;
