import { useState } from 'react';
import styled from 'styled-components';
import type { RoundStage } from '../../generated/graphql';
import { errorMessage } from '../../lib/error-code';
import { announce } from '../../ui/announce';
import { ConfirmDialog } from '../../ui/dialog';
import { Notice } from '../../ui/notice';
import { FORWARD } from './stage-words';
import { useAdvanceRound } from './use-advance-round';
import type { NotReady } from './use-advance-round';

interface AdvanceDialogProps {
  round: { id: string; version: number; stage: RoundStage };
  onClose: () => void;
}

/** Says what freezes before the round goes on, and what is missing when it cannot. */
export function AdvanceDialog({ round, onClose }: AdvanceDialogProps) {
  const { advance, loading } = useAdvanceRound();
  const [refusal, setRefusal] = useState<NotReady>();
  // The words stay those of the step that was asked for while the round changes beneath the dialog.
  const [words] = useState(FORWARD[round.stage]);
  if (!words) return null;

  async function confirm(done: string) {
    try {
      const notReady = await advance(round);
      if (notReady) return setRefusal(notReady);
      announce(done);
      onClose();
    } catch (error) {
      setRefusal({ message: errorMessage(error), missing: [] });
    }
  }

  return (
    <ConfirmDialog
      title={words.question}
      confirm={words.action}
      loading={loading}
      onClose={onClose}
      onConfirm={() => void confirm(words.done)}
    >
      <Body>
        {refusal && (
          <Notice tone="bad" title={refusal.message} alert>
            {refusal.missing.length > 0 && (
              <List>
                {refusal.missing.map((what) => (
                  <li key={what}>{what}</li>
                ))}
              </List>
            )}
          </Notice>
        )}
        <List>
          {words.freezes.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </List>
      </Body>
    </ConfirmDialog>
  );
}

const Body = styled.div`
  display: grid;
  gap: 16px;
`;

const List = styled.ul`
  display: grid;
  gap: 6px;
  padding-left: 18px;
  list-style: square;
`;
