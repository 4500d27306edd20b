import styled from 'styled-components';
import { CheckboxField } from '../../ui/field';
import { SearchBox } from '../../ui/search-box';

interface QuoteFiltersProps {
  faultyOnly: boolean;
  onFaultyOnly: (faultyOnly: boolean) => void;
}

/** The search, and the filter for what is still to settle. */
export function QuoteFilters({ faultyOnly, onFaultyOnly }: QuoteFiltersProps) {
  return (
    <Line role="search" aria-label="Quotes">
      <SearchBox label="Find a quote" placeholder="Number, vendor or candidate" />
      <CheckboxField
        label="Only with something to settle"
        checked={faultyOnly}
        onChange={({ target }) => onFaultyOnly(target.checked)}
      />
    </Line>
  );
}

const Line = styled.div`
  display: flex;
  flex-wrap: wrap;
  align-items: center;
  gap: 12px 24px;
  margin-bottom: 16px;
  > :first-child {
    flex: 0 1 320px;
    min-width: min(100%, 240px);
  }
`;
