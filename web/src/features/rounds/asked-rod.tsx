import styled from 'styled-components';

interface AskedRodProps {
  /** All in the same currency units; for drawing only. */
  asked: number;
  spendable: number;
  ceiling: number;
  /** Said on the rod: what is more, or what is left. */
  children: string;
}

/** What is asked for laid along the ceiling: filled up to what may be spent, pale what is held back, hatched beyond. */
export function AskedRod({ asked, spendable, ceiling, children }: AskedRodProps) {
  const length = Math.max(asked, ceiling) || 1;
  const share = (value: number) => `${Math.min(1, value / length) * 100}%`;
  const over = asked > ceiling;
  return (
    <Ground $over={over}>
      <Wood style={{ width: share(Math.min(asked, spendable)) }} aria-hidden />
      <Held style={{ left: share(spendable), width: share(ceiling - spendable) }} aria-hidden />
      <Ceiling style={{ left: share(ceiling) }} $end={!over} aria-hidden />
      <Words>{children}</Words>
    </Ground>
  );
}

const graduation = `repeating-linear-gradient(to right, var(--mw-rod-ink) 0 1px, transparent 1px calc(100% / 24))`;

const Ground = styled.div<{ $over: boolean }>`
  position: relative;
  height: 30px;
  border: 1px solid var(--mw-ink-3);
  background: ${({ $over }) =>
    $over
      ? 'repeating-linear-gradient(-45deg, var(--mw-surface) 0 6px, var(--mw-sunken) 6px 9px)'
      : 'var(--mw-sunken)'};
`;

const Wood = styled.i`
  position: absolute;
  inset: 0 auto 0 0;
  background: ${graduation} 0 0 / 100% 8px no-repeat var(--mw-rod);
`;

const Held = styled.i`
  position: absolute;
  inset-block: 0;
  background: var(--mw-rod-soft);
`;

const Ceiling = styled.b<{ $end: boolean }>`
  position: absolute;
  inset-block: -6px;
  width: 5px;
  margin-left: ${({ $end }) => ($end ? '-4px' : '-2px')};
  border: solid var(--mw-ink);
  border-width: 0 1.5px;
`;

const Words = styled.span`
  position: absolute;
  right: 8px;
  top: 5px;
  padding: 0 6px;
  background: var(--mw-surface);
  font-size: 12px;
  font-weight: 600;
`;
