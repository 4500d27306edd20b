import styled from 'styled-components';
import { formatDate, timeLeft } from '../../lib/dates';
import { STEPS, stepIndex, stepProgress } from '../../lib/round-stage';
import type { ViewerRound } from '../../lib/viewer';
import { StepRod } from '../../ui/step-rod';

/** Which round, which of its five steps, and how long until the decision. */
export function RoundStrip({ round }: { round: ViewerRound }) {
  return (
    <Strip aria-label="Round" data-screen-only>
      <Name>{round.name}</Name>
      <Steps>
        <StepRod steps={STEPS} current={stepIndex(round.stage)} progress={stepProgress(round)} />
      </Steps>
      <Deadline>
        {stepIndex(round.stage) < stepIndex('ORDER') && <b>{timeLeft(round.decisionDate)}</b>}
        <span>Decision due {formatDate(round.decisionDate)}</span>
      </Deadline>
    </Strip>
  );
}

const Strip = styled.section`
  position: sticky;
  top: 0;
  z-index: 10;
  display: flex;
  align-items: center;
  gap: 24px;
  height: var(--mw-strip);
  flex: none;
  padding: 0 24px;
  background: var(--mw-surface);
  border-bottom: 1px solid var(--mw-line);
  @media (max-width: 767px) {
    position: static;
    height: 36px;
    gap: 8px;
    padding: 0 16px;
  }
`;

const Name = styled.span`
  flex: none;
  max-width: 40%;
  overflow: hidden;
  text-overflow: ellipsis;
  white-space: nowrap;
  font-size: 16px;
  font-weight: 700;
  @media (max-width: 767px) {
    flex: 0 1 auto;
    max-width: none;
    font-size: 13px;
  }
`;

const Steps = styled.div`
  min-width: 0;
  flex: 0 1 470px;
  ol {
    width: 100%;
  }
  @media (max-width: 767px) {
    display: none;
  }
`;

const Deadline = styled.span`
  margin-left: auto;
  text-align: right;
  font-size: 12px;
  line-height: 1.25;
  white-space: nowrap;
  color: var(--mw-ink-2);
  b {
    display: block;
    font-size: 14px;
    font-weight: 700;
    color: var(--mw-ink);
  }
  @media (max-width: 767px) {
    b {
      font-size: 13px;
    }
    span {
      display: none;
    }
  }
`;
