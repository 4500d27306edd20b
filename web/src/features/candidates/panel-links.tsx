import { Link, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { sumOf } from '../../lib/minor-units';
import { formatMoneyWhole } from '../../lib/money';
import { Icon } from '../../ui/icon';
import type { IconName } from '../../ui/icon';
import type { CandidateDetailsFragment } from './candidate-details.generated';
import { withPanel } from './candidate-list-params';

type CandidateLink = CandidateDetailsFragment['links'][number];
type Linked = CandidateLink['members'][number];

/** What a candidate needs, what needs it, and what it excludes. */
export function PanelLinks({ candidate }: { candidate: CandidateDetailsFragment }) {
  if (candidate.links.length === 0) return null;
  return (
    <section>
      <h3>Depends on</h3>
      <List>
        {candidate.links.map((link) => (
          <li key={link.id}>
            <LinkMark kind={link.kind} />
            <div>
              <Others link={link} own={candidate.id} />
              <p className="small muted">{sentenceOf(link, candidate)}</p>
            </div>
          </li>
        ))}
      </List>
    </section>
  );
}

function Others({ link, own }: { link: CandidateLink; own: string }) {
  const [params] = useSearchParams();
  return othersOf(link, own).map(({ id, code, name }) => (
    <Other key={id} to={`?${withPanel(params, id)}`}>
      {code} {name}
    </Other>
  ));
}

/** The candidates at the far side of a link, seen from `own`. */
function othersOf(link: CandidateLink, own: string): Linked[] {
  const needsOwn = link.kind === 'NEEDS' && link.candidate && link.candidate.id !== own;
  if (needsOwn) return [link.candidate!];
  return link.members.filter(({ id }) => id !== own);
}

function sentenceOf(link: CandidateLink, candidate: CandidateDetailsFragment): string {
  const others = othersOf(link, candidate.id);
  const codes = others.map(({ code }) => code).join(' and ');
  if (link.kind === 'EITHER_OR') return `A portfolio holds at most one of them. ${reasonOf(link)}`;
  if (link.kind === 'COUNT') return `A portfolio holds ${boundsOf(link)} of these. ${reasonOf(link)}`;
  if (link.candidate?.id !== candidate.id)
    return `A portfolio with ${codes} must also hold this one. ${reasonOf(link)}`;
  return `A portfolio with this candidate must also hold ${codes}. ${together(candidate, others)}${reasonOf(link)}`;
}

function boundsOf({ least, most }: CandidateLink): string {
  const parts = [least !== null && `at least ${least}`, most !== null && `at most ${most}`];
  return parts.filter(Boolean).join(' and ');
}

function reasonOf({ reason }: CandidateLink): string {
  if (!reason) return '';
  return `${reason[0]!.toUpperCase()}${reason.slice(1).replace(/\.$/u, '')}.`;
}

/** The capital of a candidate with what it needs; nothing as long as one of them has no quote in force. */
function together(candidate: CandidateDetailsFragment, others: readonly Linked[]): string {
  const capitals = [candidate, ...others].map(({ quoteInForce }) => quoteInForce?.cost.capital);
  const known = capitals.filter((capital) => capital !== undefined);
  if (known.length < capitals.length) return '';
  return `Together ${formatMoneyWhole(sumOf(known[0]!.currency, known))}. `;
}

const MARKS: Record<CandidateLink['kind'], [icon: IconName, colour: string]> = {
  NEEDS: ['need', '--mw-sea'],
  EITHER_OR: ['over', '--mw-rod-text'],
  COUNT: ['list', '--mw-ink-2'],
};

function LinkMark({ kind }: Pick<CandidateLink, 'kind'>) {
  const [icon, colour] = MARKS[kind];
  return (
    <span style={{ color: `var(${colour})` }}>
      <Icon name={icon} />
    </span>
  );
}

const List = styled.ul`
  display: grid;
  gap: 10px;
  li {
    display: grid;
    grid-template-columns: 16px minmax(0, 1fr);
    gap: 10px;
    line-height: 1.35;
  }
`;

const Other = styled(Link)`
  display: block;
  color: var(--mw-ink);
  font-weight: 600;
  text-decoration: none;
  &:hover {
    text-decoration: underline;
  }
`;
