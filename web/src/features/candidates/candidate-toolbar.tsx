import { SegmentedControl } from '@primer/react';
import { Link, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { SearchBox } from '../../ui/search-box';
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
        <SearchBox label="Find a need" />
        <FilterMenu name="Department" param="department" choices={departments} />
        <FilterMenu name="Site" param="site" choices={sites} />
        {isFiltered(params) && <Link to={`?${withoutFilters(params)}`}>Clear filters</Link>}
      </Filters>
    </Bar>
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
