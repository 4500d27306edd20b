import type { RoundStage } from '../../generated/graphql';
import { paths } from '../../lib/paths';
import { useCan } from '../../lib/use-can';
import { Button, ButtonLink } from '../../ui/button';
import { BACK, FORWARD } from './stage-words';

interface StageActionsProps {
  round: { id: string; stage: RoundStage };
  onAdvance: () => void;
  onStepBack: () => void;
}

/** The buttons of the round: one step on, one step back, or to where the work now lies. */
export function StageActions({ round, onAdvance, onStepBack }: StageActionsProps) {
  const can = useCan();
  const forward = can('advanceRound') ? FORWARD[round.stage] : undefined;
  const back = can('stepBackRound') ? BACK[round.stage] : undefined;
  return (
    <>
      {back && (
        <Button icon="back" onClick={onStepBack}>
          {back.action}
        </Button>
      )}
      {forward && (
        <Button variant="primary" onClick={onAdvance}>
          {forward.action}
        </Button>
      )}
      {round.stage === 'SEARCH' && can('run') && (
        <ButtonLink variant="primary" to={paths.frontier(round.id)}>
          Open the frontier
        </ButtonLink>
      )}
      {round.stage === 'DECIDE' && can('selection') && (
        <ButtonLink variant="primary" to={paths.approval(round.id)}>
          Open the approval
        </ButtonLink>
      )}
    </>
  );
}
