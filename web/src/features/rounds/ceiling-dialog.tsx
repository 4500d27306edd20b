import { useId, useState } from 'react';
import { currencySign, formatMoney } from '../../lib/money';
import { formatQuantity } from '../../lib/quantity';
import { readAmount } from '../../lib/read-amount';
import { refusalOf } from '../../lib/refusal';
import type { FieldProblems } from '../../lib/refusal';
import { typedText } from '../../lib/typed-text';
import { useReload } from '../../lib/use-reload';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { CheckedForm } from '../../ui/checked-form';
import { Dialog } from '../../ui/dialog';
import { FieldGrid, TextField } from '../../ui/field';
import { MoneyInput } from '../../ui/money-input';
import { Notice } from '../../ui/notice';
import type { RoundCeilingFragment } from './round-ceiling.generated';
import { useSetCeiling } from './use-set-ceiling';

interface CeilingDialogProps {
  round: RoundCeilingFragment;
  onClose: () => void;
}

const LABELS = { ceiling: 'Budget ceiling', heldBackPercent: 'Held back' };

/** The finance director sets the ceiling and the share held back. */
export function CeilingDialog({ round, onClose }: CeilingDialogProps) {
  const formId = useId();
  const { set, loading } = useSetCeiling();
  const reload = useReload();
  const [version, setVersion] = useState(round.version);
  const [problems, setProblems] = useState<FieldProblems>({});
  const [message, setMessage] = useState<string>();
  const [conflict, setConflict] = useState(false);
  const { currency } = round.ceiling;

  async function submit(form: HTMLFormElement) {
    const { ceiling, heldBackPercent, wrong } = readForm(new FormData(form));
    setMessage(undefined);
    setProblems(wrong);
    if (Object.keys(wrong).length > 0) return;
    try {
      await set({ roundId: round.id, version, ceiling, heldBackPercent });
      announce(`Ceiling set to ${formatMoney({ amount: ceiling, currency })}`);
      onClose();
    } catch (error) {
      await refuse(error);
    }
  }

  async function refuse(error: unknown) {
    const refusal = refusalOf(error, LABELS);
    if (refusal.kind === 'fields') return setProblems(refusal.problems);
    if (refusal.kind === 'message') return setMessage(refusal.message);
    await reload();
    setConflict(true);
  }

  function keepMine() {
    setVersion(round.version);
    setConflict(false);
  }

  return (
    <Dialog
      title="Set the ceiling"
      sub="It binds the capital of everything bought in this round, VAT that cannot be reclaimed included."
      width="medium"
      onClose={onClose}
      footer={
        <>
          <Button variant="primary" type="submit" form={formId} loading={loading}>
            Set the ceiling
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      <CheckedForm id={formId} problems={problems} message={message} onSubmit={(form) => void submit(form)}>
        {conflict && <Conflict round={round} onKeepMine={keepMine} />}
        <FieldGrid>
          <MoneyInput
            label={`${LABELS.ceiling}, ${currencySign(currency)}`}
            name="ceiling"
            currency={currency}
            defaultValue={round.ceiling.amount}
            error={problems.ceiling}
          />
          <TextField
            label={LABELS.heldBackPercent}
            name="heldBackPercent"
            unit="%"
            inputMode="decimal"
            autoComplete="off"
            defaultValue={formatQuantity(round.heldBackPercent)}
            help="Kept for what comes up between the decision and the order."
            error={problems.heldBackPercent}
          />
        </FieldGrid>
      </CheckedForm>
    </Dialog>
  );
}

function Conflict({ round, onKeepMine }: { round: RoundCeilingFragment; onKeepMine: () => void }) {
  return (
    <Notice
      tone="caution"
      alert
      title={`The round was changed meanwhile. Its ceiling now is ${formatMoney(round.ceiling)}, ${formatQuantity(round.heldBackPercent)}\u00a0% held back.`}
      actions={<Button onClick={onKeepMine}>Go on with mine</Button>}
    >
      Nothing was saved. What you typed stands below.
    </Notice>
  );
}

function readForm(data: FormData) {
  const ceiling = typedText(data, 'ceiling');
  const percent = readAmount(typedText(data, 'heldBackPercent'));
  const wrong: FieldProblems = {};
  if (!ceiling) wrong.ceiling = 'Write the ceiling as an amount, such as 2 400 000.';
  if (!('amount' in percent)) wrong.heldBackPercent = 'Write the share held back as a percent, such as 4.';
  return { ceiling, heldBackPercent: 'amount' in percent ? percent.amount : '', wrong };
}
