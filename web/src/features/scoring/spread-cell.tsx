import styled from 'styled-components';
import { formatNumber } from '../../lib/money';
import type { SheetScore } from './sheet-parts';
import { spreadOf } from './spread';

/** Mean, range and own score of one candidate on one criterion. */
export function SpreadCell({
  scores,
  membershipId,
}: {
  scores: readonly SheetScore[];
  membershipId: string;
}) {
  const spread = spreadOf(scores);
  if (!spread) return <td>—</td>;
  const own = scores.find((score) => score.membershipId === membershipId)?.points;
  const { lowest, highest, mean, wide } = spread;
  const words = `${lowest} to ${highest}${wide ? ', far apart' : ''}${own == null ? '' : `, yours ${own}`}`;
  return (
    <td>
      <Line>
        {formatNumber(mean)}
        <svg width="52" height="14" role="img" aria-label={words}>
          <title>{words}</title>
          <path d="M0 7h52" stroke="var(--mw-line-strong)" />
          <Range x={1 + lowest * 0.5} width={Math.max(2, (highest - lowest) * 0.5)} wide={wide} />
          {own != null && <path d={`M${1 + own * 0.5} 0v14`} stroke="var(--mw-ink)" strokeWidth="2.5" />}
        </svg>
      </Line>
    </td>
  );
}

function Range({ x, width, wide }: { x: number; width: number; wide: boolean }) {
  if (!wide) return <rect x={x} y="4.5" width={width} height="5" fill="var(--mw-chart-c4)" />;
  const lines = Array.from({ length: Math.ceil(width / 4) }, (_, i) => {
    const left = x + i * 4;
    return `M${left} 12l${Math.min(4, x + width - left)} -10`;
  });
  return (
    <g stroke="var(--mw-caution)" fill="none">
      <rect x={x} y="2" width={width} height="10" fill="var(--mw-caution-soft)" />
      <path d={lines.join('')} strokeWidth="1.3" />
    </g>
  );
}

const Line = styled.span`
  display: flex;
  align-items: center;
  justify-content: space-between;
  gap: 10px;
`;
