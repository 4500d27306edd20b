import type { ReactNode } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { Button } from '../../ui/button';
import { Empty } from '../../ui/empty';
import { Section } from '../../ui/section';
import { withoutFilters } from './candidate-list-params';

/** A round in which nothing has been asked for. */
export function NothingAskedFor({ action }: { action: ReactNode }) {
  return (
    <Section>
      <Empty title="Lay the first candidate along the rod" actions={action}>
        A candidate is a piece of equipment that someone needs: what for, at which site, and what it takes up.
        Quotes and scores come later.
      </Empty>
    </Section>
  );
}

/** Candidates there are, but none that the filters leave. */
export function NoMatch() {
  const [params] = useSearchParams();
  const navigate = useNavigate();
  return (
    <Empty
      plain
      title="No candidate matches"
      actions={<Button onClick={() => void navigate(`?${withoutFilters(params)}`)}>Clear filters</Button>}
    >
      The view, the search and the filters together leave none.
    </Empty>
  );
}
