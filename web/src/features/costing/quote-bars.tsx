import styled from 'styled-components';
import { formatAmountWhole } from '../../lib/money';
import { useNarrow } from '../../ui/use-media';
import { axisOf, barOf, shareAt } from './bar-geometry';
import type { Axis, Bar } from './bar-geometry';
import { CostAxis } from './cost-axis';
import { COST_LINES, isWhole, lineAmount } from './cost-lines';
import type { ComparedQuote } from './compared-quote';
import { CostFill } from './cost-fill';
import { QuoteName } from './quote-name';

/** One bar per quote over a common rod; the right end is the life-cycle cost. The table below holds the same figures. */
export function QuoteBars({ quotes }: { quotes: readonly ComparedQuote[] }) {
  const narrow = useNarrow();
  const bars = quotes.map((quote) =>
    barOf(COST_LINES.map((line) => ({ id: line.id, value: Number(lineAmount(quote, line).amount) }))),
  );
  const axis = axisOf(bars, narrow ? 3 : 5);
  return (
    <Figure>
      <ul aria-label="Life-cycle cost of each quote">
        {quotes.map((quote, i) => (
          <Line key={quote.id}>
            <QuoteName quote={quote} among={quotes} />
            <Track bar={bars[i]!} axis={axis} />
            <Total>
              {formatAmountWhole(quote.cost.lifeCycleCost)}
              {!isWhole(quote) && <small>without service</small>}
            </Total>
          </Line>
        ))}
      </ul>
      <Line as="div" aria-hidden>
        <span />
        <CostAxis axis={axis} />
      </Line>
    </Figure>
  );
}

function Track({ bar, axis }: { bar: Bar; axis: Axis }) {
  const place = (from: number, to: number) => ({
    left: percent(shareAt(axis, from)),
    width: percent(shareAt(axis, to) - shareAt(axis, from)),
  });
  return (
    <Ground aria-hidden>
      {bar.pieces.map(({ id, from, to }) => (
        <Piece key={id} $line={id} style={place(from, to)} />
      ))}
      {bar.start < 0 && <Back $line="residual" style={place(bar.start, 0)} />}
      <Zero style={{ left: percent(shareAt(axis, 0)) }} />
    </Ground>
  );
}

function percent(share: number): string {
  return `${share * 100}%`;
}

const Figure = styled.div`
  padding: 4px 16px 12px;
`;

const Line = styled.li`
  display: grid;
  grid-template-columns: 200px minmax(0, 1fr) 84px;
  gap: 4px 12px;
  align-items: center;
  min-height: 40px;
  @media (max-width: 767px) {
    grid-template-columns: minmax(0, 1fr) auto;
    padding: 6px 0;
    > :nth-child(2) {
      grid-area: 2 / 1 / 3 / 3;
    }
    > :first-child:empty {
      display: none;
    }
  }
`;

const Total = styled.b`
  font-size: 16px;
  font-weight: 700;
  text-align: right;
  small {
    display: block;
    font-size: 12px;
    font-weight: 400;
    line-height: 1.2;
    color: var(--mw-ink-2);
  }
`;

const Ground = styled.span`
  position: relative;
  display: block;
  height: 26px;
  background: var(--mw-sunken);
`;

const Piece = styled(CostFill)`
  position: absolute;
  inset-block: 0;
  box-shadow: inset -1px 0 0 var(--mw-surface);
`;

const Back = styled(Piece)`
  box-shadow: none;
`;

const Zero = styled.i`
  position: absolute;
  inset-block: -4px;
  width: 2px;
  background: var(--mw-ink);
  forced-color-adjust: none;
  @media (forced-colors: active) {
    background: CanvasText;
  }
`;
