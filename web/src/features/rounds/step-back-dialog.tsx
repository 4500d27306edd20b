import { useId, useState } from 'react';
import type { RoundStage } from '../../generated/graphql';
import { refusalOf } from '../../lib/refusal';
import type { FieldProblems } from '../../lib/refusal';
import { typedText } from '../../lib/typed-text';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { CheckedForm } from '../../ui/checked-form';
import { Dialog } from '../../ui/dialog';
import { TextAreaField } from '../../ui/field';
import { BACK } from './stage-words';
import { useStepBackRound } from './use-step-back-round';

interface StepBackDialogProps {
  round: { id: string; version: number; stage: RoundStage };
  onClose: () => void;
}

/** Takes the round one step back; the reason goes into the record. */
export function StepBackDialog({ round, onClose }: StepBackDialogProps) {
  const formId = useId();
  const { stepBack, loading } = useStepBackRound();
  const [problems, setProblems] = useState<FieldProblems>({});
  const [message, setMessage] = useState<string>();
  const [words] = useState(BACK[round.stage]);
  if (!words) return null;

  async function submit(form: HTMLFormElement, done: string) {
    const reason = typedText(new FormData(form), 'reason');
    setMessage(undefined);
    if (reason.length < 3) return setProblems({ reason: 'Write why the round goes back.' });
    setProblems({});
    try {
      await stepBack(round, reason);
      announce(done);
      onClose();
    } catch (error) {
      const refusal = refusalOf(error, { reason: 'Reason' });
      if (refusal.kind === 'fields') setProblems(refusal.problems);
      else setMessage(refusal.message);
    }
  }

  return (
    <Dialog
      title={words.question}
      width="medium"
      onClose={onClose}
      footer={
        <>
          <Button variant="primary" type="submit" form={formId} loading={loading}>
            {words.action}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      <CheckedForm
        id={formId}
        problems={problems}
        message={message}
        onSubmit={(form) => void submit(form, words.done)}
      >
        <p>{words.effect}</p>
        <TextAreaField
          label="Reason"
          name="reason"
          help="Kept in the audit trail, where everybody can read it."
          error={problems.reason}
          maxLength={1000}
        />
      </CheckedForm>
    </Dialog>
  );
}
