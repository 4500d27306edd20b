import { useId, useState } from 'react';
import styled from 'styled-components';
import { formatPercent } from '../../lib/money';
import { Button } from '../../ui/button';
import { CheckboxField, TextField } from '../../ui/field';
import { Section } from '../../ui/section';
import { ScoreReason } from './score-reason';
import type { SheetCandidate, SheetCriterion } from './sheet-parts';
import type { OwnScores } from './use-own-scores';

interface OneCandidateProps {
  candidates: readonly SheetCandidate[];
  criteria: readonly SheetCriterion[];
  scores: OwnScores;
  row: number;
  onRow: (row: number) => void;
}

/** The sheet on a phone: one candidate at a time, anchors beside each criterion. */
export function OneCandidate({ candidates, criteria, scores, row, onRow }: OneCandidateProps) {
  const candidate = candidates[row]!;
  return (
    <Section padded>
      <p className="muted small">{`${row + 1} of ${candidates.length} · ${candidate.department.name}, ${candidate.site.name}`}</p>
      <h2>{candidate.name}</h2>
      <p className="muted">{candidate.need}</p>
      {criteria.map((criterion) => (
        <OneCriterion key={`${candidate.id} ${criterion.id}`} {...{ candidate, criterion, scores }} />
      ))}
      <Steps>
        <Button size="large" icon="left" disabled={row === 0} onClick={() => onRow(row - 1)}>
          Previous
        </Button>
        <Button
          size="large"
          variant="primary"
          trailingIcon="right"
          disabled={row === candidates.length - 1}
          onClick={() => onRow(row + 1)}
        >
          Next candidate
        </Button>
      </Steps>
    </Section>
  );
}

interface OneCriterionProps {
  candidate: SheetCandidate;
  criterion: SheetCriterion;
  scores: OwnScores;
}

function OneCriterion({ candidate, criterion, scores }: OneCriterionProps) {
  const score = scores.at(candidate.id, criterion.id);
  const [text, setText] = useState(score?.points?.toString() ?? '');
  const [problem, setProblem] = useState<string>();
  const anchors = useId();

  function save(points: number | null, cannotJudge: boolean, reason = score?.reason ?? '') {
    void scores.save({ candidateId: candidate.id, criterionId: criterion.id, points, cannotJudge, reason });
  }

  function leave() {
    const kept = score?.points?.toString() ?? '';
    if (text === kept) return setProblem(undefined);
    if (!/^\d{1,3}$/u.test(text) || Number(text) > 100)
      return setProblem('Write a whole number from 0 to 100.');
    setProblem(undefined);
    save(Number(text), false);
  }

  function giveUp() {
    setText('');
    setProblem(undefined);
    save(null, true);
  }

  return (
    <Criterion role="group" aria-label={criterion.name}>
      <TextField
        label={criterion.name}
        labelAside={
          <span className="muted small">{`weight ${formatPercent(Number(criterion.weight))}`}</span>
        }
        inputMode="numeric"
        size="large"
        value={text}
        error={problem}
        aria-describedby={anchors}
        onChange={(event) => setText(event.target.value.trim())}
        onBlur={leave}
      />
      <dl id={anchors} className="small muted">
        <dt>0</dt>
        <dd>{criterion.lowAnchor}</dd>
        <dt>100</dt>
        <dd>{criterion.highAnchor}</dd>
      </dl>
      <CheckboxField
        label="I cannot judge this"
        help={score?.cannotJudge && 'Write a score above to take this back.'}
        checked={score?.cannotJudge ?? false}
        onChange={(event) => event.target.checked && giveUp()}
      />
      {score && (
        <ScoreReason score={score} onReason={(reason) => save(score.points, score.cannotJudge, reason)} />
      )}
    </Criterion>
  );
}

const Criterion = styled.div`
  display: grid;
  gap: 8px;
  margin-top: 20px;
  padding-top: 16px;
  border-top: 1px solid var(--mw-line);
  dl {
    display: grid;
    grid-template-columns: 32px 1fr;
    gap: 4px;
  }
`;

const Steps = styled.div`
  position: sticky;
  bottom: 0;
  display: grid;
  grid-template-columns: 1fr 1.4fr;
  gap: 8px;
  margin: 20px -16px -16px;
  padding: 12px 16px;
  background: var(--mw-chalk);
  border-top: 1px solid var(--mw-line-strong);
`;
