import styled from 'styled-components';
import { difference } from '../../lib/minor-units';
import { currencySign, formatAmountWhole } from '../../lib/money';
import type { Front } from './front';
import type { Portfolio } from './portfolio';
import { PortfolioLetter } from './portfolio-letter';
import { points, possibleMore } from './wording';

interface PortfolioFiguresProps {
  front: Front;
  selected: Portfolio;
  compared: Portfolio | undefined;
}

/** The figures of A, and beside them those of B. */
export function PortfolioFigures({ front, selected, compared }: PortfolioFiguresProps) {
  const shown = compared ? [selected, compared] : [selected];
  return (
    <Figures>
      <caption className="visually-hidden">Figures of the selected and the compared portfolio</caption>
      <thead>
        <tr>
          <td />
          <th scope="col">
            <PortfolioLetter letter="A" /> selected
          </th>
          {compared && (
            <th scope="col">
              <PortfolioLetter letter="B" /> compared
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {rowsOf(front).map(({ name, figure }) => (
          <tr key={name}>
            <th scope="row">{name}</th>
            {shown.map((portfolio, letter) => (
              <td key={letter} className="num">
                {figure(portfolio)}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </Figures>
  );
}

interface FigureRow {
  name: string;
  figure: (portfolio: Portfolio) => string;
}

function rowsOf({ costAxis, ceiling, candidates, status }: Front): FigureRow[] {
  const sign = currencySign(ceiling.currency);
  return [
    ...(costAxis === 'LIFE_CYCLE'
      ? [
          {
            name: `Life-cycle cost, ${sign}`,
            figure: ({ exact }: Portfolio) => formatAmountWhole(exact.cost),
          },
        ]
      : []),
    { name: `Capital, ${sign}`, figure: ({ exact }) => formatAmountWhole(exact.capital) },
    { name: 'Benefit points', figure: ({ benefit }) => points(benefit) },
    { name: 'More possible at this cost', figure: (portfolio) => possibleMore({ status }, portfolio) },
    { name: `Candidates of ${candidates}`, figure: ({ picks }) => String(picks.length) },
    {
      name: `Left under the ceiling, ${sign}`,
      figure: ({ exact }) => formatAmountWhole(difference(ceiling, exact.capital)),
    },
  ];
}

const Figures = styled.table`
  width: 100%;
  margin-top: 8px;
  border-collapse: collapse;
  font-size: 13px;
  th,
  td {
    padding: 2px 0 2px 12px;
  }
  th:first-child,
  td:first-child {
    padding-left: 0;
  }
  tbody th {
    text-align: left;
    font-weight: 400;
    color: var(--mw-ink-2);
  }
  thead th {
    text-align: right;
    font-weight: 600;
    white-space: nowrap;
  }
  tbody td:nth-child(2) {
    font-weight: 600;
  }
`;
