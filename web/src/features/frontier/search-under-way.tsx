import type { RunState } from '../../generated/graphql';
import { Empty } from '../../ui/empty';
import { Section } from '../../ui/section';

/** In place of the chart until the first portfolio has been found. */
export function SearchUnderWay({ state }: { state: RunState }) {
  return (
    <Section>
      <Empty title={state === 'WAITING' ? 'The search waits for its turn' : 'The search has begun'}>
        {state === 'WAITING'
          ? 'It begins as soon as a worker is free, usually within a second or two. You can leave this page.'
          : 'The first portfolios appear within a second or two. You can leave this page; the search goes on.'}
      </Empty>
    </Section>
  );
}
