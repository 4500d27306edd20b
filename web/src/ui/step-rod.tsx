import type { ReactNode } from 'react';
import styled, { css } from 'styled-components';

export interface Step {
  id: string;
  name: string;
  /** Up to two lines below the name, on the page size only. */
  note?: ReactNode;
}

interface StepRodProps {
  steps: readonly Step[];
  /** Index of the step under way; `steps.length` when all are done. */
  current: number;
  /** Share 0–1 of the step under way. */
  progress?: number;
  /** "strip": the narrow one in the header. "page": the broad one of the overview, with notes. */
  size?: 'strip' | 'page';
  label?: string;
}

/** The steps of the round on one rod: done steps boxwood, the one under way part filled, the rest plain. */
export function StepRod({
  steps,
  current,
  progress = 0,
  size = 'strip',
  label = 'Steps of the round',
}: StepRodProps) {
  return (
    <List $size={size} style={{ gridTemplateColumns: `repeat(${steps.length}, 1fr)` }} aria-label={label}>
      {steps.map((step, index) => {
        const state = index < current ? 'done' : index === current ? 'now' : 'ahead';
        return (
          <Item key={step.id} $size={size} $state={state} aria-current={state === 'now' ? 'step' : undefined}>
            <Piece
              $size={size}
              $state={state}
              style={{ '--step-progress': `${progress * 100}%` }}
              aria-hidden
            />
            <span>{step.name}</span>
            {state === 'done' && <span className="visually-hidden"> (done)</span>}
            {size === 'page' && step.note && <Note>{step.note}</Note>}
          </Item>
        );
      })}
    </List>
  );
}

type State = 'done' | 'now' | 'ahead';
type Size = 'strip' | 'page';

const List = styled.ol<{ $size: Size }>`
  display: grid;
  gap: ${({ $size }) => ($size === 'strip' ? '2px' : '0')};
  width: ${({ $size }) => ($size === 'strip' ? '470px' : '100%')};
  min-width: 0;
  @media (max-width: 767px) {
    ${({ $size }) => $size === 'page' && 'grid-template-columns: 1fr !important;'}
  }
`;

const Item = styled.li<{ $size: Size; $state: State }>`
  min-width: 0;
  ${({ $size, $state }) =>
    $size === 'strip'
      ? css`
          font-size: 12px;
          line-height: 1.2;
          color: var(${$state === 'ahead' ? '--mw-ink-3' : $state === 'done' ? '--mw-ink-2' : '--mw-ink'});
          font-weight: ${$state === 'now' ? 700 : 400};
        `
      : css`
          font-weight: 700;
          color: var(${$state === 'ahead' ? '--mw-ink-2' : '--mw-ink'});
          @media (max-width: 767px) {
            display: grid;
            grid-template-columns: 72px minmax(0, 1fr);
            column-gap: 12px;
            padding-bottom: 12px;
          }
        `}
`;

const lines = (ink: string, size: Size) =>
  size === 'strip'
    ? css`repeating-linear-gradient(to right, var(${ink}) 0 1px, transparent 1px 9px)`
    : css`
        repeating-linear-gradient(to right, var(${ink}) 0 1px, transparent 1px 46px),
        repeating-linear-gradient(to right, var(${ink}) 0 1px, transparent 1px 9.2px)
      `;

const fill = css`linear-gradient(to right, var(--mw-rod) var(--step-progress), var(--mw-rod-soft) var(--step-progress))`;

const Piece = styled.i<{ $size: Size; $state: State }>`
  display: block;
  position: relative;
  background-repeat: no-repeat;
  background-color: var(${({ $state }) => ($state === 'ahead' ? '--mw-sunken' : '--mw-rod')});
  border: 0 solid var(${({ $state }) => ($state === 'ahead' ? '--mw-line-strong' : '--mw-rod-edge')});
  background-image:
    ${({ $size, $state }) => lines($state === 'ahead' ? '--mw-line-strong' : '--mw-rod-ink', $size)},
    ${({ $state }) => ($state === 'now' ? fill : 'none')};
  ${({ $size }) => ($size === 'strip' ? stripPiece : pagePiece)}
  &::after {
    content: ${({ $state }) => ($state === 'now' ? "''" : 'none')};
    position: absolute;
    left: var(--step-progress);
  }
  @media (forced-colors: active) {
    border: 1px solid CanvasText;
  }
`;

const stripPiece = css`
  height: 9px;
  margin-bottom: 4px;
  border-bottom-width: 1px;
  background-size:
    100% 4px,
    100% 100%;
  background-position:
    0 100%,
    0 0;
  &::after {
    top: -3px;
    width: 8px;
    height: 15px;
    margin-left: -4px;
    background: var(--mw-action);
    clip-path: polygon(0 0, 100% 0, 100% 70%, 50% 100%, 0 70%);
  }
`;

const pagePiece = css`
  height: 26px;
  margin-bottom: 8px;
  border-block-width: 1px;
  background-size:
    100% 14px,
    100% 7px,
    100% 100%;
  &::after {
    top: -7px;
    width: 14px;
    height: 38px;
    margin-left: -7px;
    border: 2.5px solid var(--mw-action);
    border-radius: 2px;
    background: linear-gradient(to right, transparent 4px, var(--mw-action) 4px 5px, transparent 5px);
  }
  @media (max-width: 767px) {
    height: 14px;
    grid-row: span 2;
    background-size:
      100% 8px,
      100% 4px,
      100% 100%;
    &::after {
      height: 26px;
    }
  }
`;

const Note = styled.div`
  padding-right: 12px;
  font-size: 13px;
  font-weight: 400;
  line-height: 1.35;
  color: var(--mw-ink-2);
`;
