import { useState } from 'react';
import type { Ref } from 'react';
import { TextAreaField } from '../../ui/field';
import { useNarrow } from '../../ui/use-media';
import type { OwnScore } from './use-own-scores';

interface ScoreReasonProps {
  score: OwnScore | undefined;
  /** Called when the field is left with other words than are saved. */
  onReason: (reason: string) => void;
  reasonRef?: Ref<HTMLTextAreaElement>;
}

/** Why the assessor gave a score. A score comes first. */
export function ScoreReason({ score, onReason, reasonRef }: ScoreReasonProps) {
  const narrow = useNarrow();
  const [reason, setReason] = useState(score?.reason ?? '');
  return (
    <TextAreaField
      ref={reasonRef}
      label="Your reason"
      help={
        score
          ? 'Shown to the other assessors once scoring has closed.'
          : 'Give the score first, then its reason.'
      }
      value={reason}
      maxLength={2000}
      rows={narrow ? 1 : 3}
      disabled={!score}
      onChange={(event) => setReason(event.target.value)}
      onBlur={() => score && reason !== score.reason && onReason(reason)}
    />
  );
}
