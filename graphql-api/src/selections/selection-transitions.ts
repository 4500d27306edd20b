import { registerEnumType } from '@nestjs/graphql';
import { RoundStage } from '../rounds/round-stages.js';

export enum SelectionState {
  SUBMITTED = 'SUBMITTED',
  APPROVED = 'APPROVED',
  RETURNED = 'RETURNED',
  DECLINED = 'DECLINED',
}

export enum Decision {
  APPROVE = 'APPROVE',
  RETURN = 'RETURN',
  DECLINE = 'DECLINE',
}

registerEnumType(SelectionState, { name: 'SelectionState' });
registerEnumType(Decision, {
  name: 'Decision',
  description: 'RETURN: change it and submit again. DECLINE: not this portfolio.',
});

/** While a selection is in one of these, no other can be submitted in its round. */
export const OPEN_STATES: readonly SelectionState[] = [SelectionState.SUBMITTED, SelectionState.APPROVED];

export interface Transition {
  state: SelectionState;
  /** Where the round goes. */
  stage: RoundStage;
  action: 'selection.approved' | 'selection.returned' | 'selection.declined';
  needsComment: boolean;
}

const TRANSITIONS: Readonly<Record<Decision, Transition>> = {
  [Decision.APPROVE]: {
    state: SelectionState.APPROVED,
    stage: RoundStage.ORDER,
    action: 'selection.approved',
    needsComment: false,
  },
  [Decision.RETURN]: {
    state: SelectionState.RETURNED,
    stage: RoundStage.SEARCH,
    action: 'selection.returned',
    needsComment: true,
  },
  [Decision.DECLINE]: {
    state: SelectionState.DECLINED,
    stage: RoundStage.SEARCH,
    action: 'selection.declined',
    needsComment: true,
  },
};

/** What a decision makes of a selection; undefined when it has been decided already. */
export function transitionOf(state: SelectionState, decision: Decision): Transition | undefined {
  return state === SelectionState.SUBMITTED ? TRANSITIONS[decision] : undefined;
}
