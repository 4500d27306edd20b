import type { RoundStage } from '../../generated/graphql';
import styled from 'styled-components';
import { paths } from '../../lib/paths';
import { ButtonLink } from '../../ui/button';
import { Empty } from '../../ui/empty';
import { PageHeader } from '../../ui/page';
import { Section } from '../../ui/section';
import { StartSearch } from './start-search';

interface NoRunYetProps {
  round: { id: string; stage: RoundStage };
  mayStart: boolean;
}

/** The page before the first run: what a search does, and how to start one. */
export function NoRunYet({ round, mayStart }: NoRunYetProps) {
  return (
    <>
      <PageHeader title="Frontier" sub="What each further amount of money buys in benefit." />
      <Section>
        {isScoring(round.stage) ? <ScoringFirst round={round} /> : <Ready {...{ round, mayStart }} />}
      </Section>
    </>
  );
}

/** Scores are what a search adds up: until they are closed there is nothing to weigh. */
function isScoring(stage: RoundStage): boolean {
  return stage === 'GATHER' || stage === 'SCORE';
}

function ScoringFirst({ round }: { round: { id: string } }) {
  return (
    <Empty
      title="Scoring must be closed first"
      actions={<ButtonLink to={paths.scoring(round.id)}>Open scoring</ButtonLink>}
    >
      A search weighs the scores of all assessors against cost. It can start once the coordinator has closed
      scoring and the scores are frozen.
    </Empty>
  );
}

function Ready({ round, mayStart }: NoRunYetProps) {
  return (
    <>
      <Empty title="No search has run yet">
        A search looks at up to 20 million portfolios of this round’s candidates, under all limits and links,
        and keeps those that no other one beats in both benefit and cost. It takes well under a minute, shows
        the best found so far at once, and can be stopped at any time; what it has found is kept.
        {!mayStart &&
          ' A purchasing coordinator or finance director starts it while the round is at its search.'}
      </Empty>
      {mayStart && (
        <Form>
          <StartSearch roundId={round.id} />
        </Form>
      )}
    </>
  );
}

// In line with the text above it.
const Form = styled.div`
  margin-top: -40px;
  padding: 0 clamp(16px, 9%, 120px) 64px;
`;
