import { useEffect, useState } from 'react';
import styled from 'styled-components';
import { CheckboxField, TextField } from '../../ui/field';

const PAUSE_MS = 300;

interface QuoteFiltersProps {
  search: string;
  onSearch: (search: string) => void;
  faultyOnly: boolean;
  onFaultyOnly: (faultyOnly: boolean) => void;
}

/** Search while typing, after a short pause, and the filter for what is still to settle. */
export function QuoteFilters({ search, onSearch, faultyOnly, onFaultyOnly }: QuoteFiltersProps) {
  const [typed, setTyped] = useState(search);
  const [shown, setShown] = useState(search);
  // Going back in the history changes the search from outside.
  if (search !== shown) {
    setShown(search);
    setTyped(search);
  }
  useEffect(() => {
    if (typed.trim() === search) return;
    const timer = setTimeout(() => onSearch(typed.trim()), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [typed, search, onSearch]);
  return (
    <Line role="search" aria-label="Quotes">
      <TextField
        label="Search"
        type="search"
        icon="search"
        placeholder="Number, vendor or candidate"
        value={typed}
        onChange={({ target }) => setTyped(target.value)}
      />
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
  align-items: flex-end;
  gap: 12px 24px;
  margin-bottom: 16px;
  > :first-child {
    flex: 0 1 320px;
    min-width: min(100%, 240px);
  }
  > :last-child {
    min-height: 36px;
  }
`;
