import type { ReactNode } from 'react';
import styled from 'styled-components';

interface EmptyProps {
  title: string;
  /** What belongs here. */
  children?: ReactNode;
  /** The one thing to do, and perhaps a second. */
  actions?: ReactNode;
  /** Without the drawing: for a filter that left nothing. */
  plain?: boolean;
}

/** An empty place: the rod with nothing laid along it, what belongs here, and what to do. Never for an outage. */
export function Empty({ title, children, actions, plain = false }: EmptyProps) {
  return (
    <Box $plain={plain}>
      {!plain && <EmptyRod />}
      <h2>{title}</h2>
      {children && <Text>{children}</Text>}
      {actions && <Actions>{actions}</Actions>}
    </Box>
  );
}

const PLACES = [
  [1, 120],
  [125, 84],
  [213, 156],
  [373, 60],
] as const;

function EmptyRod() {
  return (
    <svg viewBox="0 0 561 96" aria-hidden>
      <rect x="0.5" y="56" width="560" height="28" fill="var(--mw-rod)" stroke="var(--mw-rod-edge)" />
      {Array.from({ length: 56 }, (_, i) => (
        <path
          key={i}
          d={`M${i * 10 + 0.5} 56v${i % 10 === 0 ? 18 : i % 5 === 0 ? 13 : 8}`}
          stroke="var(--mw-rod-ink)"
          strokeWidth={i % 10 === 0 ? 1.6 : 0.9}
        />
      ))}
      {PLACES.map(([x, width]) => (
        <rect
          key={x}
          x={x}
          y="18"
          width={width}
          height="32"
          fill="none"
          stroke="var(--mw-line-strong)"
          strokeWidth="1.5"
          strokeDasharray="5 4"
        />
      ))}
      <path d="M500 4V92M504 4V92" stroke="var(--mw-ink)" strokeWidth="1.4" />
    </svg>
  );
}

const Box = styled.div<{ $plain: boolean }>`
  display: flex;
  flex-direction: column;
  align-items: flex-start;
  justify-content: center;
  padding: ${({ $plain }) => ($plain ? '32px' : '64px')} clamp(16px, 9%, 120px);
  > svg {
    width: min(100%, 560px);
    margin-bottom: 28px;
  }
  > h2 {
    font-size: var(--mw-t-20);
  }
`;

const Text = styled.div`
  max-width: 56ch;
  margin-top: 6px;
  color: var(--mw-ink-2);
`;

const Actions = styled.div`
  display: flex;
  flex-wrap: wrap;
  gap: 8px;
  margin-top: 20px;
`;
