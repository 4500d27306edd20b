import styled from 'styled-components';
import { daysUntil, formatDayMonth } from '../../lib/dates';
import { Tag } from '../../ui/tag';
import type { TagTone } from '../../ui/tag';
import type { IconName } from '../../ui/icon';
import type { CandidateRowFragment } from './candidate-row.generated';

interface Flag {
  words: string;
  tone: TagTone;
  icon: IconName;
}

/** A quote this close to the decision leaves little time to order. */
const SHORT_DAYS = 14;

/** What sets a candidate apart, the gravest first. */
export function flagsOf(candidate: CandidateRowFragment, decisionDate: string): Flag[] {
  return [...quoteFlags(candidate, decisionDate), ...mandatoryFlags(candidate), ...linkFlags(candidate)];
}

function quoteFlags({ quotes, quoteInForce }: CandidateRowFragment, decisionDate: string): Flag[] {
  if (quotes.length === 0) return [{ words: 'No quote', tone: 'bad', icon: 'doc' }];
  if (!quoteInForce) return [{ words: 'No open quote', tone: 'bad', icon: 'clock' }];
  const { validUntil } = quoteInForce;
  if (daysBetween(decisionDate, validUntil) > SHORT_DAYS) return [];
  return [{ words: `Ends ${formatDayMonth(validUntil)}`, tone: 'caution', icon: 'clock' }];
}

function mandatoryFlags({ mandatory }: CandidateRowFragment): Flag[] {
  return mandatory ? [{ words: 'Mandatory', tone: 'mandatory', icon: 'must' }] : [];
}

function linkFlags({ id, links }: CandidateRowFragment): Flag[] {
  return links.flatMap((link): Flag[] => {
    const others = link.members.filter((member) => member.id !== id).map(({ code }) => code);
    if (link.kind === 'NEEDS' && link.candidate?.id === id)
      return [{ words: `Needs ${others.join(', ')}`, tone: 'needs', icon: 'need' }];
    if (link.kind === 'EITHER_OR')
      return [{ words: `Either–or ${others.join(', ')}`, tone: 'overlaps', icon: 'over' }];
    return [];
  });
}

function daysBetween(from: string, to: string): number {
  const now = new Date();
  return daysUntil(to, now) - daysUntil(from, now);
}

/** The flags in a row. */
export function CandidateFlags({ flags }: { flags: readonly Flag[] }) {
  return (
    <Row>
      {flags.map(({ words, tone, icon }) => (
        <Tag key={words} tone={tone} icon={icon}>
          {words}
        </Tag>
      ))}
    </Row>
  );
}

const Row = styled.span`
  display: inline-flex;
  flex-wrap: wrap;
  gap: 4px;
  @media (max-width: 767px) {
    justify-content: flex-end;
    max-width: 136px;
  }
`;
