import { useId, useState } from 'react';
import styled from 'styled-components';
import { Button } from '../../ui/button';
import type { Front } from './front';
import type { Portfolio } from './portfolio';
import { SendDialog } from './send-dialog';
import { isActive } from './run-state';
import type { Run } from './use-run';

interface SendForApprovalProps {
  run: Run;
  front: Front;
  selected: Portfolio;
  roundId: string;
}

/** "Send A for approval", or in words why A cannot be sent. */
export function SendForApproval({ run, front, selected, roundId }: SendForApprovalProps) {
  const [open, setOpen] = useState(false);
  const reasonId = useId();
  const obstacle = obstacleOf(run, selected);
  return (
    <Place>
      {obstacle && (
        <p id={reasonId} className="muted small">
          {obstacle}
        </p>
      )}
      <Button
        variant="primary"
        block
        disabled={obstacle !== undefined}
        aria-describedby={obstacle ? reasonId : undefined}
        onClick={() => setOpen(true)}
      >
        Send A for approval
      </Button>
      {open && <SendDialog {...{ run, front, selected, roundId }} onClose={() => setOpen(false)} />}
    </Place>
  );
}

/** Why a portfolio cannot be sent now; undefined when it can. */
function obstacleOf({ state }: Pick<Run, 'state'>, { aboveCeiling }: Portfolio): string | undefined {
  if (isActive(state)) return 'A can be sent once the search has ended. Stop and keep it to go on now.';
  if (aboveCeiling)
    return 'The capital of A lies above the ceiling. Choose a portfolio up to it, or raise the ceiling.';
  return undefined;
}

const Place = styled.div`
  display: grid;
  gap: 8px;
`;
