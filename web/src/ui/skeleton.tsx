import { useEffect, useState } from 'react';
import styled, { keyframes } from 'styled-components';

/** Grey rows in place of content that is on its way. Shows nothing for the first 300 ms. */
export function Skeleton({ rows = 6, label = 'Loading' }: { rows?: number; label?: string }) {
  const late = useLate(300);
  return (
    <div role="status" aria-label={label}>
      {late &&
        Array.from({ length: rows }, (_, row) => (
          <Bar key={row} style={{ width: `${92 - ((row * 17) % 40)}%` }} />
        ))}
    </div>
  );
}

function useLate(ms: number): boolean {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), ms);
    return () => clearTimeout(timer);
  }, [ms]);
  return late;
}

const breathe = keyframes`
  50% { opacity: 0.55; }
`;

const Bar = styled.span`
  display: block;
  height: 14px;
  margin: 13px 0;
  border-radius: 2px;
  background: var(--mw-sunken);
  animation: ${breathe} 1.6s ease-in-out infinite;
`;
