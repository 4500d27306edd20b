import { ProgressBar } from '@primer/react';
import styled from 'styled-components';

interface ProgressProps {
  /** What is under way, spoken and shown. */
  label: string;
  /** Share 0–1. */
  share: number;
  /** Figures below, such as "5.1 of 8.0 MB". */
  detail?: string;
  hideLabel?: boolean;
}

/** A piece of rod with its cursor. */
export function Progress({ label, share, detail, hideLabel = false }: ProgressProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100);
  return (
    <div>
      {!hideLabel && (
        <Line>
          <span>{label}</span>
          <span className="muted">{percent}&nbsp;%</span>
        </Line>
      )}
      <ProgressBar progress={percent} aria-label={label} aria-valuetext={detail} />
      {detail && <Detail>{detail}</Detail>}
    </div>
  );
}

const Line = styled.div`
  display: flex;
  justify-content: space-between;
  gap: 12px;
  margin-bottom: 6px;
  font-weight: 600;
`;

const Detail = styled.p`
  margin-top: 6px;
  font-size: 12px;
  color: var(--mw-ink-2);
`;
