import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import styled from 'styled-components';
import { formatDayMonth, timeLeft } from '../../lib/dates';
import { formatNumber } from '../../lib/money';
import { STEPS, stepIndex, stepProgress } from '../../lib/round-stage';
import { StepRod } from '../../ui/step-rod';
import type { RoundStepsFragment, StepCountsFragment } from './round-steps.generated';

export const ROUND_STEPS: TypedDocumentNode<RoundStepsFragment> = gql`
  fragment RoundSteps on Round {
    id
    stage
    openedOn
    scoringClosesOn
    decisionDate
    runs {
      id
      number
      state
    }
  }
`;

export const STEP_COUNTS: TypedDocumentNode<StepCountsFragment> = gql`
  fragment StepCounts on RoundOverview {
    candidates
    quotes
    scoresGiven
    scoresWanted
  }
`;

type Notes = readonly [first: string, second: string];

/** The five steps of the round on the broad rod, each with its date and its count. */
export function RoundSteps({ round, counts }: { round: RoundStepsFragment; counts: StepCountsFragment }) {
  const current = stepIndex(round.stage);
  const notes = [gatherNotes, scoreNotes, searchNotes, decideNotes, orderNotes];
  const steps = STEPS.map((step, index) => {
    const [first, second] = notes[index]!(round, counts, current - index);
    return { ...step, note: <Note first={first} second={second} /> };
  });
  return (
    <Box>
      <StepRod
        size="page"
        label="Steps of the round with dates"
        steps={steps}
        current={current}
        progress={stepProgress(round)}
      />
    </Box>
  );
}

function Note({ first, second }: { first: string; second: string }) {
  return (
    <>
      <Ink>{first}</Ink>
      <br />
      {second}
    </>
  );
}

// `since` is 0 for the step under way, positive for steps that are done.
type NotesOf = (round: RoundStepsFragment, counts: StepCountsFragment, since: number) => Notes;

const gatherNotes: NotesOf = ({ openedOn }, { candidates, quotes }, since) => [
  since > 0 ? 'Closed' : `Since ${formatDayMonth(openedOn)}`,
  `${count(candidates, 'candidate')}, ${count(quotes, 'quote')}`,
];

const scoreNotes: NotesOf = ({ scoringClosesOn }, { scoresGiven, scoresWanted }, since) => [
  since > 0 ? 'Closed' : `Until ${formatDayMonth(scoringClosesOn)}`,
  since < 0
    ? `${count(scoresWanted, 'score')} to give`
    : `${formatNumber(scoresGiven)} of ${count(scoresWanted, 'score')} given`,
];

const searchNotes: NotesOf = ({ runs }, _counts, since) => {
  const latest = runs[0];
  if (!latest) return since < 0 ? ['When scoring has closed', ''] : ['Under way', 'No run yet'];
  return [RUN_STATES[latest.state](latest.number), count(runs.length, 'run')];
};

const decideNotes: NotesOf = ({ decisionDate }, _counts, since) => [
  `${since > 0 ? 'Was due' : 'Due'} ${formatDayMonth(decisionDate)}`,
  since > 0 ? 'Decided' : timeLeft(decisionDate),
];

const orderNotes: NotesOf = (_round, _counts, since) => [
  since > 0 ? 'Closed' : since === 0 ? 'Under way' : 'Once approved',
  'By vendor',
];

const RUN_STATES: Record<RoundStepsFragment['runs'][number]['state'], (number: number) => string> = {
  WAITING: (number) => `Run ${number} is waiting`,
  SEARCHING: (number) => `Run ${number} in progress`,
  FINISHED: (number) => `Run ${number} finished`,
  STOPPED: (number) => `Run ${number} stopped and kept`,
  INFEASIBLE: (number) => `Run ${number}: limits collide`,
  FAILED: (number) => `Run ${number} failed`,
};

function count(number: number, noun: string): string {
  return `${formatNumber(number)} ${noun}${number === 1 ? '' : 's'}`;
}

const Box = styled.div`
  margin-bottom: 20px;
`;

const Ink = styled.span`
  color: var(--mw-ink);
`;
