import { useId, useState } from 'react';
import type { LimitFieldsInput } from '../../generated/graphql';
import { refusalOf } from '../../lib/refusal';
import type { FieldProblems } from '../../lib/refusal';
import { useReload } from '../../lib/use-reload';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { CheckedForm } from '../../ui/checked-form';
import { Dialog } from '../../ui/dialog';
import { Notice } from '../../ui/notice';
import { LIMIT_LABELS, LimitFields } from './limit-fields';
import type { LimitChoices } from './limit-fields';
import type { LimitRowFragment } from './limit-row.generated';
import { readLimitForm } from './read-limit-form';
import { useSaveLimit } from './use-save-limit';
import type { SavedLimit } from './use-save-limit';

interface LimitDialogProps {
  roundId: string;
  /** The limit to change as it now is; none adds one. */
  limit?: LimitRowFragment;
  choices: LimitChoices;
  onClose: () => void;
}

export function LimitDialog({ roundId, limit, choices, onClose }: LimitDialogProps) {
  const formId = useId();
  const [version, setVersion] = useState(limit?.version ?? 0);
  const { create, update } = useSaveLimit();
  const save = (fields: LimitFieldsInput) =>
    limit ? update({ id: limit.id, version, fields }) : create({ roundId, fields });
  const { send, saving, problems, message, conflict, settle } = useSending(save, onClose);

  function keepMine() {
    setVersion(limit!.version);
    settle();
  }

  return (
    <Dialog
      title={limit ? 'Edit the limit' : 'Add a limit'}
      sub="Every portfolio of the search keeps to it."
      onClose={onClose}
      footer={
        <>
          <Button variant="primary" type="submit" form={formId} loading={saving}>
            {limit ? 'Save limit' : 'Add limit'}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      <CheckedForm id={formId} problems={problems} message={message} onSubmit={(form) => void send(form)}>
        {conflict && (
          <Notice
            tone="caution"
            alert
            title="Somebody else saved this limit meanwhile"
            actions={<Button onClick={keepMine}>Go on with mine</Button>}
          >
            Nothing of yours was saved, and what you typed stands below. Theirs is in the table behind.
          </Notice>
        )}
        <LimitFields limit={limit} choices={choices} problems={problems} />
      </CheckedForm>
    </Dialog>
  );
}

function useSending(save: (fields: LimitFieldsInput) => Promise<SavedLimit>, onSaved: () => void) {
  const reload = useReload();
  const [saving, setSaving] = useState(false);
  const [conflict, setConflict] = useState(false);
  const [problems, setProblems] = useState<FieldProblems>({});
  const [message, setMessage] = useState<string>();

  async function send(form: HTMLFormElement) {
    const { fields, problems: unread } = readLimitForm(new FormData(form));
    setMessage(undefined);
    setProblems(unread);
    if (Object.keys(unread).length > 0) return;
    setSaving(true);
    try {
      const answer = await save(fields);
      if (answer.__typename === 'LimitNameTaken') return setProblems({ name: answer.message });
      if (answer.__typename === 'LimitEmpty') return setProblems({ most: answer.message });
      announce('Limit saved');
      onSaved();
    } catch (error) {
      await refuse(error);
    } finally {
      setSaving(false);
    }
  }

  async function refuse(error: unknown) {
    const refusal = refusalOf(error, LIMIT_LABELS);
    if (refusal.kind === 'fields') return setProblems(refusal.problems);
    if (refusal.kind === 'message') return setMessage(refusal.message);
    await reload();
    setConflict(true);
  }

  return { send, saving, problems, message, conflict, settle: () => setConflict(false) };
}
