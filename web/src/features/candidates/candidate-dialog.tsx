import { useCallback, useId, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import styled from 'styled-components';
import type { CandidateFieldsInput } from '../../generated/graphql';
import { refusalOf } from '../../lib/refusal';
import type { FieldProblems } from '../../lib/refusal';
import { Button } from '../../ui/button';
import { CheckedForm } from '../../ui/checked-form';
import { Dialog } from '../../ui/dialog';
import { LeaveGuard } from '../../ui/leave-guard';
import { CandidateFields } from './candidate-fields';
import type { FormChoices } from './candidate-fields';
import { LABELS } from './candidate-labels';
import { readCandidateForm } from './read-candidate-form';
import type { Saved } from './use-save-candidate';

type SavedCandidate = Extract<Saved, { __typename: 'Candidate' }>;

interface CandidateDialogProps {
  title: string;
  sub?: string;
  submit: string;
  initial: CandidateFieldsInput;
  choices: FormChoices;
  save: (fields: CandidateFieldsInput) => Promise<Saved>;
  onSaved: (candidate: SavedCandidate) => void;
  /** Somebody else saved the same candidate first; what was typed stays. */
  onConflict?: () => Promise<void>;
  onClose: () => void;
  /** Above the fields. */
  notice?: ReactNode;
}

/** The form of a candidate in a dialog. Keeps what was typed whatever the answer, and asks before it is lost. */
export function CandidateDialog(props: CandidateDialogProps) {
  const { title, sub, submit, initial, choices, notice, onClose } = props;
  const formId = useId();
  const [dirty, setDirty] = useState(false);
  const { send, saving, problems, message, unsaved } = useSending(props);
  return (
    <Dialog
      title={title}
      sub={sub}
      onClose={onClose}
      width="xlarge"
      footer={
        <>
          <Button variant="primary" type="submit" form={formId} loading={saving}>
            {submit}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      <CheckedForm id={formId} problems={problems} message={message} onSubmit={(form) => void send(form)}>
        {notice}
        <Fields onInput={() => setDirty(true)}>
          <CandidateFields initial={initial} choices={choices} problems={problems} />
        </Fields>
      </CheckedForm>
      <LeaveGuard when={dirty} blocks={unsaved} title="Leave without saving?" leave="Leave">
        What you typed into this form would be lost.
      </LeaveGuard>
    </Dialog>
  );
}

function useSending({ save, onSaved, onConflict }: CandidateDialogProps) {
  // A ref, because the dialog closes in the same breath in which it is saved.
  const saved = useRef(false);
  const unsaved = useCallback(() => !saved.current, []);
  const [saving, setSaving] = useState(false);
  const [problems, setProblems] = useState<FieldProblems>({});
  const [message, setMessage] = useState<string>();

  async function send(form: HTMLFormElement) {
    const { fields, problems: unread } = readCandidateForm(new FormData(form));
    setMessage(undefined);
    setProblems(unread);
    if (Object.keys(unread).length > 0) return;
    setSaving(true);
    try {
      const answer = await save(fields);
      if (answer.__typename === 'MandatoryNeedsReason')
        return setProblems({ mandatoryReason: answer.message });
      saved.current = true;
      onSaved(answer);
    } catch (error) {
      const refusal = refusalOf(error, LABELS);
      if (refusal.kind === 'fields') setProblems(refusal.problems);
      else if (refusal.kind === 'conflict' && onConflict) await onConflict();
      else setMessage(refusal.message);
    } finally {
      setSaving(false);
    }
  }

  return { send, saving, problems, message, unsaved };
}

const Fields = styled.div`
  display: grid;
  gap: 24px;
`;
