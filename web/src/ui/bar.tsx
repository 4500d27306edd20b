import styled from 'styled-components';

interface BarProps {
  /** Share 0–1 of the greatest. */
  share: number;
  /** Share 0–1 where a bound crosses the bar; what lies beyond it is hatched. */
  bound?: number;
}

/** A plain bar for comparing amounts. Decoration: the figure stands beside it. */
export function Bar({ share, bound }: BarProps) {
  const within = bound === undefined ? share : Math.min(share, bound);
  return (
    <Track aria-hidden>
      <Part style={{ width: percent(within) }} />
      {share > within && <Beyond style={{ left: percent(within), width: percent(share - within) }} />}
      {bound !== undefined && <Bound style={{ left: percent(bound) }} />}
    </Track>
  );
}

function percent(share: number): string {
  return `${Math.min(1, Math.max(0, share)) * 100}%`;
}

const Track = styled.span`
  position: relative;
  display: block;
  height: 8px;
  background: var(--mw-sunken);
  @media (forced-colors: active) {
    outline: 1px solid CanvasText;
  }
`;

const Part = styled.i`
  position: absolute;
  inset-block: 0;
  left: 0;
  background: var(--mw-chart-c4);
  forced-color-adjust: none;
`;

const Beyond = styled.i`
  position: absolute;
  inset-block: 0;
  background: repeating-linear-gradient(-45deg, var(--mw-caution) 0 2px, transparent 2px 5px);
  forced-color-adjust: none;
`;

const Bound = styled.i`
  position: absolute;
  inset-block: -3px;
  width: 4px;
  margin-left: -2px;
  border-inline: 1.5px solid var(--mw-ink);
`;
