import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import styled from 'styled-components';
import type { CostAxis } from '../../generated/graphql';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { SelectField } from '../../ui/field';
import { StartRefused } from './start-refused';
import { useStartSearch } from './use-start-search';

const AXES: { value: CostAxis; label: string }[] = [
  { value: 'CAPITAL', label: 'Capital, which the ceiling is on' },
  { value: 'LIFE_CYCLE', label: 'Life-cycle cost' },
];

/** Which cost to weigh against benefit, and the button that starts the search. */
export function StartSearch({ roundId, onStarted }: { roundId: string; onStarted?: () => void }) {
  const navigate = useNavigate();
  const { start, loading, refusal } = useStartSearch(roundId);
  const [costAxis, setCostAxis] = useState<CostAxis>('CAPITAL');
  async function submit() {
    const number = await start(costAxis);
    if (number === undefined) return;
    onStarted?.();
    await navigate(`?run=${number}`);
  }
  return (
    <Form
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <SelectField
        label="Cost to weigh against benefit"
        options={AXES}
        value={costAxis}
        onChange={(event) => setCostAxis(event.target.value as CostAxis)}
      />
      {refusal && <StartRefused refusal={refusal} roundId={roundId} />}
      <div>
        <Button type="submit" variant="primary" icon="play" loading={loading}>
          Start search
        </Button>
      </div>
    </Form>
  );
}

/** "Run again": the same choice in a dialog. The run on show stays as it is. */
export function RunAgain({ roundId }: { roundId: string }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button size="small" icon="play" onClick={() => setOpen(true)}>
        Run again
      </Button>
      {open && (
        <Dialog
          title="Run again"
          sub="A new run with the round as it is now. Earlier runs stay as they are."
          width="medium"
          onClose={() => setOpen(false)}
        >
          <StartSearch roundId={roundId} onStarted={() => setOpen(false)} />
        </Dialog>
      )}
    </>
  );
}

const Form = styled.form`
  display: grid;
  gap: 16px;
  width: 100%;
  max-width: 640px;
  > :first-child {
    max-width: 320px;
  }
`;
