import type { ReactNode } from 'react';
import styled from 'styled-components';
import { formatMoneyWhole } from '../../lib/money';
import { Button } from '../../ui/button';
import { CompositionList } from './composition-list';
import type { Front } from './front';
import { LeftOutList } from './left-out-list';
import { PortfolioFigures } from './portfolio-figures';
import { PortfolioLetter } from './portfolio-letter';
import type { Chosen } from './use-chosen';
import type { Run } from './use-run';

interface PortfolioPanelProps {
  front: Front;
  chosen: Chosen;
  leftOut: Run['leftOut'];
  /** Below the figures of A: what else there is at its cost. */
  others?: ReactNode;
  /** At the foot, such as "Send A for approval". */
  footer?: ReactNode;
}

/** Portfolio A in figures and by its candidates: beside the chart where there is room, below it elsewhere. */
export function PortfolioPanel({ front, chosen, leftOut, others, footer }: PortfolioPanelProps) {
  const selected = front.portfolios[chosen.a]!;
  const compared = chosen.b === undefined ? undefined : front.portfolios[chosen.b];
  return (
    <Panel aria-label="Portfolio A">
      <Top>
        <Title>
          <PortfolioLetter letter="A" size={22} />
          <h2>Portfolio A</h2>
          <Button size="small" onClick={chosen.compare} data-screen-only>
            {chosen.b === chosen.a ? 'Take B away' : 'Put B here'}
          </Button>
        </Title>
        <PortfolioFigures front={front} selected={selected} compared={compared} />
        <p className="muted tiny">
          The ceiling is {formatMoneyWhole(front.ceiling)} of capital, the share held back taken off.
        </p>
        {others}
      </Top>
      <Scroll tabIndex={0} role="group" aria-label="Candidates of the run">
        <CompositionList front={front} selected={selected} />
        <LeftOutList leftOut={leftOut} />
      </Scroll>
      {footer && <Footer data-screen-only>{footer}</Footer>}
    </Panel>
  );
}

const Panel = styled.aside`
  position: sticky;
  top: var(--mw-strip);
  display: flex;
  flex-direction: column;
  width: var(--mw-panel);
  height: calc(100vh - var(--mw-strip));
  background: var(--mw-surface);
  border-left: 1px solid var(--mw-line-strong);
  @media (max-width: 1279px) {
    width: 308px;
  }
  @media (max-width: 1023px) {
    position: static;
    width: auto;
    height: auto;
    border-left: 0;
    border-top: 2px solid var(--mw-ink);
  }
  @media (max-width: 767px) {
    padding-bottom: 96px;
  }
  @media print {
    position: static;
    width: auto;
    height: auto;
    border-left: 0;
  }
`;

const Top = styled.div`
  padding: 12px 16px 8px;
`;

const Title = styled.div`
  display: flex;
  align-items: center;
  gap: 8px;
  > button {
    margin-left: auto;
  }
`;

const Scroll = styled.div`
  flex: 1;
  min-height: 0;
  overflow: auto;
  &:focus-visible {
    outline-offset: -3px;
  }
  @media (max-width: 1023px) {
    overflow: visible;
  }
  @media print {
    overflow: visible;
  }
`;

const Footer = styled.div`
  padding: 10px 16px 14px;
  border-top: 1px solid var(--mw-line-strong);
  background: var(--mw-surface);
  @media (max-width: 767px) {
    position: fixed;
    inset: auto 0 0;
    z-index: 5;
  }
`;
