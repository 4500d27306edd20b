import styled from 'styled-components';
import { Tag } from '../../ui/tag';
import type { ComparedQuote } from './compared-quote';

/** Vendor, with the number where the vendor has sent several, and whether the candidate counts by this quote. */
export function QuoteName({ quote, among }: { quote: ComparedQuote; among: readonly ComparedQuote[] }) {
  const several = among.filter(({ vendor }) => vendor.id === quote.vendor.id).length > 1;
  return (
    <Name>
      <span>
        <b>{quote.vendor.name}</b> {several && <small className="muted">{quote.number}</small>}
      </span>
      {quote.inForce && (
        <Tag tone="good" icon="ok">
          In force
        </Tag>
      )}
    </Name>
  );
}

const Name = styled.span`
  display: flex;
  align-items: center;
  flex-wrap: wrap;
  gap: 2px 8px;
  min-width: 0;
  padding: 4px 0;
  > span:first-child {
    min-width: 0;
    line-height: 1.2;
    overflow-wrap: anywhere;
  }
  b {
    font-weight: 600;
  }
`;
