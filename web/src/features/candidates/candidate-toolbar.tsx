import { useEffect, useRef, useState } from 'react';
import { SegmentedControl, TextInput } from '@primer/react';
import { Link, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { Icon } from '../../ui/icon';
import { useNarrow } from '../../ui/use-media';
import { useTableParams } from '../../ui/use-table-params';
import { FIRST_SORT, VIEWS, isFiltered, viewOf, withoutFilters } from './candidate-list-params';
import { FilterMenu } from './filter-menu';
import type { Choice } from './filter-menu';

interface CandidateToolbarProps {
  /** Candidates in each saved view. */
  counts: Record<(typeof VIEWS)[number]['view'], number>;
  departments: readonly Choice[];
  sites: readonly Choice[];
}

/** Saved views, search and filters of the candidates; all of it lives in the address. */
export function CandidateToolbar({ counts, departments, sites }: CandidateToolbarProps) {
  const [params] = useSearchParams();
  const { setFilter } = useTableParams(FIRST_SORT);
  const narrow = useNarrow();
  const chosen = viewOf(params);
  return (
    <Bar>
      <SegmentedControl
        aria-label="Saved views"
        size={narrow ? 'small' : 'medium'}
        onChange={(index) => setFilter('view', VIEWS[index]!.param)}
      >
        {VIEWS.map(({ view, name }) => (
          <SegmentedControl.Button key={view} selected={view === chosen.view}>
            {`${name}\u2002${counts[view]}`}
          </SegmentedControl.Button>
        ))}
      </SegmentedControl>
      <Filters>
        <SearchBox />
        <FilterMenu name="Department" param="department" choices={departments} />
        <FilterMenu name="Site" param="site" choices={sites} />
        {isFiltered(params) && <Link to={`?${withoutFilters(params)}`}>Clear filters</Link>}
      </Filters>
    </Bar>
  );
}

const TYPING_MS = 250;

function SearchBox() {
  const [params, setParams] = useSearchParams();
  const inAddress = params.get('q') ?? '';
  const [text, setText] = useState(inAddress);
  const [sent, setSent] = useState(inAddress);
  const [seen, setSeen] = useState(inAddress);
  // A change that did not come from here, such as Back or cleared filters; what is being typed stays otherwise.
  if (inAddress !== seen) {
    setSeen(inAddress);
    if (inAddress !== sent) setText(inAddress);
  }
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);

  function change(next: string) {
    setText(next);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => search(next.trim()), TYPING_MS);
  }

  // Replaces the address, so that Back leaves the search and does not spell it backwards.
  function search(words: string) {
    setSent(words);
    setParams(
      (before) => {
        const next = new URLSearchParams(before);
        next.delete('page');
        if (words) next.set('q', words);
        else next.delete('q');
        return next;
      },
      { replace: true },
    );
  }

  return (
    <TextInput
      type="search"
      aria-label="Find a need"
      placeholder="Find a need"
      leadingVisual={() => <Icon name="search" />}
      value={text}
      onChange={(event) => change(event.target.value)}
    />
  );
}

const Bar = styled.div`
  display: flex;
  flex-wrap: wrap;
  align-items: center;
  gap: 8px 16px;
  margin-bottom: 12px;
`;

const Filters = styled.div`
  display: flex;
  flex-wrap: wrap;
  align-items: center;
  gap: 8px;
  margin-left: auto;
  > span {
    width: 168px;
  }
  @media (max-width: 767px) {
    width: 100%;
    > span {
      width: 100%;
    }
  }
`;
