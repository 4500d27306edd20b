import { useState } from 'react';
import styled from 'styled-components';
import { currencySign, formatAmount } from '../../lib/money';
import { Button } from '../../ui/button';
import type { Memo } from './selection-memo';

const SHOWN_AT_FIRST = 10;

/** The lines that would be bought, dearest first; the rest unfolds, and is printed always. */
export function MemoBuys({ memo }: { memo: Memo }) {
  const [all, setAll] = useState(false);
  const lines = [...memo.lines].sort((a, b) => Number(b.capital.amount) - Number(a.capital.amount));
  const hidden = lines.length - SHOWN_AT_FIRST;
  const sign = currencySign(memo.capital.currency);
  return (
    <Buys>
      <table>
        <caption className="visually-hidden">What it buys, with its capital in {sign}</caption>
        <tbody>
          {lines.map((line, index) => (
            <tr key={line.code} data-later={!all && index >= SHOWN_AT_FIRST ? true : undefined}>
              <th scope="row">
                {line.name}{' '}
                <small>{[line.siteName, line.mandatory && 'mandatory'].filter(Boolean).join(', ')}</small>
              </th>
              <td className="num">{formatAmount(line.capital)}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row">Capital, {sign}</th>
            <td className="num">{formatAmount(memo.capital)}</td>
          </tr>
        </tfoot>
      </table>
      {hidden > 0 && (
        <Button
          variant="quiet"
          size="small"
          aria-expanded={all}
          onClick={() => setAll(!all)}
          data-screen-only
        >
          {all ? 'Show fewer' : `Show ${hidden} more candidates`}
        </Button>
      )}
    </Buys>
  );
}

const Buys = styled.div`
  table {
    width: 100%;
    border-collapse: collapse;
  }
  tr[data-later] {
    display: none;
  }
  th,
  td {
    padding: 4px 0;
    border-bottom: 1px solid var(--mw-line);
    text-align: left;
    font-weight: 400;
    vertical-align: baseline;
  }
  .num {
    padding-left: 12px;
    text-align: right;
  }
  small {
    font-size: 13px;
    color: var(--mw-ink-2);
  }
  tfoot > tr > * {
    border: 0;
    font-weight: 700;
  }
  @media print {
    tr[data-later] {
      display: table-row;
    }
    th,
    td {
      padding: 1px 0;
      font-size: 9pt;
    }
    small {
      font-size: inherit;
    }
  }
`;
