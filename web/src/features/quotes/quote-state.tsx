import styled from 'styled-components';
import type { QuoteFault } from '../../generated/graphql';
import { Tag } from '../../ui/tag';

const FAULT_WORDS: Record<QuoteFault, string> = {
  RUN_OUT: 'Run out',
  SERVICE_PRICE_MISSING: 'Service price missing',
  LEAD_TIME_TOO_LONG: 'Delivery too late',
};

interface QuoteStateProps {
  inForce: boolean;
  faults: readonly QuoteFault[];
}

/** Whether the candidate counts by the quote, and what keeps it from being bought by. */
export function QuoteState({ inForce, faults }: QuoteStateProps) {
  return (
    <Tags>
      {inForce && (
        <Tag tone="good" icon="ok">
          In force
        </Tag>
      )}
      {faults.map((fault) => (
        <Tag key={fault} tone="caution" icon={fault === 'SERVICE_PRICE_MISSING' ? 'warn' : 'clock'}>
          {FAULT_WORDS[fault]}
        </Tag>
      ))}
    </Tags>
  );
}

const Tags = styled.span`
  display: inline-flex;
  flex-wrap: wrap;
  gap: 4px;
`;
