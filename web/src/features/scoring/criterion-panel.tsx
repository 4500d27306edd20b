import type { Ref } from 'react';
import styled from 'styled-components';
import { formatPercent } from '../../lib/money';
import { Rod } from '../../ui/rod';
import { Section } from '../../ui/section';
import { ScoreReason } from './score-reason';
import type { SheetCandidate, SheetCriterion } from './sheet-parts';
import type { OwnScore } from './use-own-scores';

interface CriterionPanelProps {
  candidate: SheetCandidate;
  criterion: SheetCriterion;
  score: OwnScore | undefined;
  onReason: (reason: string) => void;
  reasonRef?: Ref<HTMLTextAreaElement>;
}

/** The criterion of the current cell: both anchors on the rod, the own score, and its reason. */
export function CriterionPanel({ candidate, criterion, score, onReason, reasonRef }: CriterionPanelProps) {
  return (
    <Section padded>
      <p className="muted small">{`${candidate.name} · weight ${formatPercent(Number(criterion.weight))}`}</p>
      <h2>{criterion.name}</h2>
      <Anchors>
        <Rod orientation="vertical" thickness={30} long="40px" short="8px" />
        <ol>
          <li>
            <b>100</b>
            <span>{criterion.highAnchor}</span>
          </li>
          <li>
            <b>0</b>
            <span>{criterion.lowAnchor}</span>
          </li>
        </ol>
        {score?.points != null && <You style={{ bottom: `${score.points}%` }}>{`You ${score.points}`}</You>}
      </Anchors>
      <ScoreReason key={`${candidate.id} ${criterion.id}`} {...{ score, onReason, reasonRef }} />
    </Section>
  );
}

const Anchors = styled.div`
  position: relative;
  display: grid;
  grid-template-columns: 30px 1fr;
  height: 300px;
  margin: 16px 0;
  ol {
    display: flex;
    flex-direction: column;
    justify-content: space-between;
    padding-left: 72px;
  }
  li {
    display: grid;
    grid-template-columns: 34px 1fr;
    font-size: 13px;
    color: var(--mw-ink-2);
  }
  li b {
    color: var(--mw-ink);
  }
`;

const You = styled.span`
  position: absolute;
  left: 0;
  padding-left: 38px;
  font-size: 12px;
  font-weight: 700;
  translate: 0 50%;
  white-space: nowrap;
  &::before {
    content: '';
    position: absolute;
    left: -1px;
    top: 50%;
    width: 35px;
    border-top: 4px solid var(--mw-action);
    translate: 0 -50%;
  }
`;
