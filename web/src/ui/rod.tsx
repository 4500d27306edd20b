import type { CSSProperties } from 'react';
import styled, { css } from 'styled-components';

interface RodProps {
  orientation?: 'horizontal' | 'vertical';
  /** Across the rod, px. The rod fills its container along its length. */
  thickness?: number;
  /** Share 0–1 that is settled or spent: boxwood. */
  filled?: number;
  /** Share 0–1 up to which the rest is still open: pale boxwood. Beyond it the rod is plain. */
  open?: number;
  /** Share 0–1 where the slide cursor stands. */
  cursor?: number;
  /** Share 0–1 where a double line, the ceiling, crosses the rod. */
  ceiling?: number;
  /** Distance between long and between short graduations, any CSS length or percentage. */
  long?: string;
  short?: string;
  className?: string;
}

/** The measuring rod. Decoration: the value it shows always stands beside it as text. */
export function Rod({
  orientation = 'horizontal',
  thickness = 26,
  filled = 1,
  open = filled,
  cursor,
  ceiling,
  long = '46px',
  short = '9.2px',
  className,
}: RodProps) {
  const style = {
    '--rod-thickness': `${thickness}px`,
    '--rod-filled': share(filled),
    '--rod-open': share(Math.max(open, filled)),
    '--rod-long': long,
    '--rod-short': short,
  } as CSSProperties;
  return (
    <Body $vertical={orientation === 'vertical'} className={className} style={style} aria-hidden>
      {ceiling !== undefined && <Ceiling style={{ left: share(ceiling) }} />}
      {cursor !== undefined && <Cursor style={{ left: share(cursor) }} $thickness={thickness} />}
    </Body>
  );
}

function share(value: number): string {
  return `${Math.min(1, Math.max(0, value)) * 100}%`;
}

const graduations = (axis: string) => css`
  repeating-linear-gradient(to ${axis}, var(--mw-rod-ink) 0 1px, transparent 1px var(--rod-long)),
  repeating-linear-gradient(to ${axis}, var(--mw-rod-ink) 0 1px, transparent 1px var(--rod-short))
`;

const wood = (axis: string) => css`
  linear-gradient(
    to ${axis},
    var(--mw-rod) var(--rod-filled),
    var(--mw-rod-soft) var(--rod-filled) var(--rod-open),
    var(--mw-sunken) var(--rod-open)
  )
`;

const horizontal = css`
  height: var(--rod-thickness);
  width: 100%;
  border-block: 1px solid var(--mw-rod-edge);
  background-image: ${graduations('right')}, ${wood('right')};
  background-size:
    100% 54%,
    100% 27%,
    100% 100%;
  background-repeat: no-repeat;
`;

const vertical = css`
  width: var(--rod-thickness);
  height: 100%;
  border-right: 1px solid var(--mw-rod-edge);
  background-image: ${graduations('bottom')}, ${wood('bottom')};
  background-size:
    100% 100%,
    43% 100%,
    100% 100%;
  background-position:
    right 20px,
    right 20px,
    0 0;
  background-repeat: repeat-y, repeat-y, no-repeat;
`;

const Body = styled.div<{ $vertical: boolean }>`
  position: relative;
  flex: none;
  ${({ $vertical }) => ($vertical ? vertical : horizontal)}
  @media (forced-colors: active) {
    border: 1px solid CanvasText;
  }
`;

const Ceiling = styled.i`
  position: absolute;
  inset-block: -6px;
  width: 5px;
  margin-left: -2px;
  border-inline: 1.5px solid var(--mw-ink);
`;

const Cursor = styled.i<{ $thickness: number }>`
  position: absolute;
  top: -7px;
  width: 14px;
  height: ${({ $thickness }) => $thickness + 12}px;
  margin-left: -7px;
  border: 2.5px solid var(--mw-action);
  border-radius: 2px;
  background: linear-gradient(to right, transparent 4px, var(--mw-action) 4px 5px, transparent 5px);
  transition: left 160ms;
`;
