import styled from 'styled-components';
import { formatMoney, formatNumber } from '../../lib/money';
import { CERTIFICATE_WORDS } from './selection-words';
import type { SelectionMemo } from './selection-memo';

/** Why this portfolio, on what assumptions, and what it takes of the limits. */
export function MemoFacts({ selection }: { selection: SelectionMemo }) {
  const { memo, reason } = selection;
  return (
    <Facts>
      <h2>Why this one</h2>
      {reason && <p>{reason}</p>}
      <p>
        {`It gains ${formatNumber(memo.benefit, 1)} benefit points. ${CERTIFICATE_WORDS[memo.certificateStatus]}`}
      </p>
      <p>{`Its life-cycle cost is ${formatMoney(memo.lifeCycleCost)}.`}</p>
      <h2>Limits</h2>
      <dl>
        {memo.limitUses.map((use) => (
          <div key={use.name}>
            <dt>{use.name}</dt>
            <dd>{limitWords(use)}</dd>
          </div>
        ))}
      </dl>
      <h2>Assumptions</h2>
      <dl>
        {memo.assumptions.map(({ name, text }) => (
          <div key={name}>
            <dt>{name}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
    </Facts>
  );
}

function limitWords({ used, least, most }: SelectionMemo['memo']['limitUses'][number]): string {
  if (most != null) return `${plain(used)} of ${plain(most)}`;
  return `${plain(used)}, at least ${plain(least ?? '0')}`;
}

function plain(decimal: string): string {
  return formatNumber(decimal, /\.0*[1-9]/u.test(decimal) ? 2 : 0);
}

const Facts = styled.div`
  h2 {
    margin: 16px 0 4px;
    font-size: var(--mw-t-14);
  }
  h2:first-child {
    margin-top: 0;
  }
  p + p {
    margin-top: 6px;
  }
  dl > div {
    display: flex;
    justify-content: space-between;
    gap: 16px;
    padding: 3px 0;
    font-size: 13px;
  }
  dt {
    color: var(--mw-ink-2);
  }
  dd {
    max-width: 60%;
    text-align: right;
    overflow-wrap: anywhere;
  }
  @media print {
    dl > div {
      padding: 1px 0;
      font-size: 9pt;
    }
  }
`;
