import { RoundStage } from '../rounds/round-stages.js';
import { Decision, SelectionState, transitionOf } from './selection-transitions.js';

describe('a submitted portfolio', () => {
  it.each([
    [Decision.APPROVE, SelectionState.APPROVED, RoundStage.ORDER, false],
    [Decision.RETURN, SelectionState.RETURNED, RoundStage.SEARCH, true],
    [Decision.DECLINE, SelectionState.DECLINED, RoundStage.SEARCH, true],
  ])('%s makes it %s and takes the round to %s', (decision, state, stage, needsComment) => {
    expect(transitionOf(SelectionState.SUBMITTED, decision)).toMatchObject({ state, stage, needsComment });
  });
});

describe('a decided portfolio', () => {
  const decided = [SelectionState.APPROVED, SelectionState.RETURNED, SelectionState.DECLINED];

  it.each(decided.flatMap((state) => Object.values(Decision).map((decision) => [state, decision] as const)))(
    'that is %s knows no %s',
    (state, decision) => expect(transitionOf(state, decision)).toBeUndefined(),
  );
});
