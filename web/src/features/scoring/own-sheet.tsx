import { useRef, useState } from 'react';
import styled from 'styled-components';
import { Button } from '../../ui/button';
import { Notice } from '../../ui/notice';
import { Section } from '../../ui/section';
import { useNarrow } from '../../ui/use-media';
import { CriterionPanel } from './criterion-panel';
import { OneCandidate } from './one-candidate';
import { ScoreGrid } from './score-grid';
import { SheetKeys } from './sheet-keys-line';
import type { SheetCandidate, SheetCriterion } from './sheet-parts';
import type { OwnScores } from './use-own-scores';

interface OwnSheetProps {
  candidates: readonly SheetCandidate[];
  criteria: readonly SheetCriterion[];
  scores: OwnScores;
}

/** The assessor's own sheet while scoring is open: no score of anybody else is on it. */
export function OwnSheet({ candidates, criteria, scores }: OwnSheetProps) {
  const narrow = useNarrow();
  const [place, setPlace] = useState({ row: 0, column: 0 });
  const [problem, setProblem] = useState<string>();
  const reason = useRef<HTMLTextAreaElement>(null);
  const candidate = candidates[place.row]!;
  const criterion = criteria[place.column]!;
  const score = scores.at(candidate.id, criterion.id);

  function saveReason(words: string) {
    if (!score) return;
    const { points, cannotJudge } = score;
    void scores.save({
      candidateId: candidate.id,
      criterionId: criterion.id,
      points,
      cannotJudge,
      reason: words,
    });
  }

  return (
    <>
      {problem && <Notice tone="caution" title={problem} alert />}
      {scores.failure && (
        <Notice
          tone="bad"
          title="Some scores have not arrived. They stay on this page."
          actions={<Button onClick={scores.retry}>Send them again</Button>}
          alert
        >
          {scores.failure}
        </Notice>
      )}
      {narrow ? (
        <OneCandidate
          {...{ candidates, criteria, scores }}
          row={place.row}
          onRow={(row) => setPlace({ row, column: 0 })}
        />
      ) : (
        <Beside>
          <Section>
            <ScoreGrid
              {...{ candidates, criteria, scores, place }}
              onMove={setPlace}
              onNote={() => reason.current?.focus()}
              onProblem={setProblem}
            />
            <SheetKeys savedAt={scores.savedAt} />
          </Section>
          <CriterionPanel {...{ candidate, criterion, score }} onReason={saveReason} reasonRef={reason} />
        </Beside>
      )}
    </>
  );
}

const Beside = styled.div`
  display: grid;
  grid-template-columns: minmax(0, 1fr) 318px;
  gap: 16px;
  align-items: start;
  @media (max-width: 1279px) {
    grid-template-columns: minmax(0, 1fr);
  }
`;
