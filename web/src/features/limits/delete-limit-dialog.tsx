import { useState } from 'react';
import { errorMessage } from '../../lib/error-code';
import { announce } from '../../ui/announce';
import { ConfirmDialog } from '../../ui/dialog';
import { Notice } from '../../ui/notice';
import { useDeleteLimit } from './use-delete-limit';

interface DeleteLimitDialogProps {
  limit: { id: string; name: string };
  onClose: () => void;
}

export function DeleteLimitDialog({ limit, onClose }: DeleteLimitDialogProps) {
  const { remove, loading } = useDeleteLimit();
  const [problem, setProblem] = useState<string>();

  async function confirm() {
    try {
      await remove(limit.id);
      announce('Limit removed');
      onClose();
    } catch (error) {
      setProblem(errorMessage(error));
    }
  }

  return (
    <ConfirmDialog
      title="Remove this limit?"
      confirm="Remove the limit"
      danger
      loading={loading}
      onConfirm={() => void confirm()}
      onClose={onClose}
    >
      {problem && <Notice tone="bad" title={problem} alert />}
      <p>
        “{limit.name}” will no longer bind the search. Runs that have finished keep it. The audit trail says
        who removed it.
      </p>
    </ConfirmDialog>
  );
}
