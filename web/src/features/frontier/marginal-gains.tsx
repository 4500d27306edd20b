import type { ReactNode } from 'react';
import styled from 'styled-components';
import { shortMoney } from '../../lib/money';
import type { Front } from './front';
import type { Exchange } from './marginal-gain';
import { gainForMore, lossForLess } from './marginal-gain';
import { signedPoints } from './wording';

/** What the next graduation of cost would buy, and what one less would give up, in words. */
export function MarginalGains({ front, at }: { front: Front; at: number }) {
  const { portfolios, scale } = front;
  const step = shortMoney(scale.long);
  const more = gainForMore(portfolios, at, scale.long);
  const less = lossForLess(portfolios, at, scale.long);
  return (
    <Pair aria-label="One step further, one step back">
      <Step figure={more && signedPoints(more.gain)} title={`points for the next ${step}`}>
        {more ? (
          <>
            {names('Adds', more.enters, front)}
            {names('leaves out', more.leaves, front)}
            {portfolios[more.to]!.aboveCeiling && !portfolios[at]!.aboveCeiling && '; passes the ceiling'}
          </>
        ) : (
          `No kept portfolio buys more for up to ${step} more.`
        )}
      </Step>
      <Step figure={less && signedPoints(less.gain)} title={`points for ${step} less`}>
        {less ? lessText(less, front) : `No kept portfolio costs ${step} less.`}
      </Step>
    </Pair>
  );
}

function lessText({ enters, leaves }: Exchange, front: Front): ReactNode {
  return (
    <>
      {names('Loses', leaves, front)}
      {names('takes in', enters, front)}
    </>
  );
}

const MOST_NAMES = 3;

/** "Adds CT tube · Steam steriliser", as names hold commas themselves; the second of two begins after a semicolon. */
function names(verb: string, items: readonly number[], { items: all }: Front): string {
  if (items.length === 0) return '';
  const isFirst = /^[A-Z]/u.test(verb);
  const named = items.slice(0, MOST_NAMES).map((item) => all[item]!.name);
  const rest = items.length > MOST_NAMES ? ` and ${items.length - MOST_NAMES} more` : '';
  return `${isFirst ? '' : '; '}${verb} ${named.join(' · ')}${rest}`;
}

function Step({ figure, title, children }: { figure?: string; title: string; children: ReactNode }) {
  return (
    <div>
      <Figure>{figure ?? '—'}</Figure>
      <div>
        <p className="strong">{title}</p>
        <p className="muted small">{children}</p>
      </div>
    </div>
  );
}

const Pair = styled.section`
  display: grid;
  grid-template-columns: 1fr 1fr;
  margin-top: 10px;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
  > div {
    display: grid;
    grid-template-columns: auto minmax(0, 1fr);
    align-items: center;
    gap: 14px;
    padding: 10px 14px;
    line-height: 1.35;
  }
  > div + div {
    border-left: 1px solid var(--mw-line);
  }
  @media (max-width: 767px) {
    grid-template-columns: 1fr;
    > div + div {
      border-left: 0;
      border-top: 1px solid var(--mw-line);
    }
  }
`;

const Figure = styled.b`
  min-width: 64px;
  font-size: var(--mw-t-26);
  font-weight: 700;
  line-height: 1;
  letter-spacing: -0.01em;
`;
