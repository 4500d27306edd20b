import styled from 'styled-components';
import type { CostLineId } from './cost-lines';

const thin = (angle: string, step: number) =>
  `repeating-linear-gradient(${angle}, var(--mw-surface) 0 1px, transparent 1px ${step}px)`;

const dots = 'radial-gradient(var(--mw-surface) 1px, transparent 1.3px) 0 0 / 5px 5px';

const GROUNDS: Record<CostLineId, string> = {
  acquisition: 'var(--mw-chart-c1)',
  installation: `${thin('0deg', 4)}, var(--mw-chart-c4)`,
  training: `${dots}, var(--mw-chart-c6)`,
  service: 'var(--mw-chart-c2)',
  consumables: `${thin('135deg', 6)}, var(--mw-chart-c3)`,
  energy: `${thin('90deg', 4)}, var(--mw-chart-c5)`,
  residual: 'repeating-linear-gradient(45deg, var(--mw-surface) 0 2px, var(--mw-ink-3) 2px 4px)',
};

/** Colour and pattern of a cost line, so that neighbours differ in grey too; the hatch stands for what is given back. */
export const CostFill = styled.i<{ $line: CostLineId }>`
  background: ${({ $line }) => GROUNDS[$line]};
  outline: ${({ $line }) => ($line === 'residual' ? '1px solid var(--mw-ink-3)' : 'none')};
  outline-offset: -1px;
  forced-color-adjust: none;
`;
