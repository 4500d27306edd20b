import type { Portfolio } from './portfolio';

interface Names {
  currency: string;
  /** Codes of the run's items, in their order. */
  codes: readonly string[];
}

/** The kept portfolios as CSV: exact figures with a decimal point, one row each, in order of cost. */
export function frontierCsv(portfolios: readonly Portfolio[], { currency, codes }: Names): string {
  const header = [
    'portfolio',
    `cost ${currency}`,
    `capital ${currency}`,
    'benefit points',
    'points gained',
    'candidates',
    'above the ceiling',
    'candidate codes',
  ];
  const rows = portfolios.map(({ index, exact, picks, aboveCeiling }) => [
    String(index + 1),
    exact.cost.amount,
    exact.capital.amount,
    exact.benefit,
    gainedText(portfolios, index),
    String(picks.length),
    aboveCeiling ? 'yes' : 'no',
    picks.map((pick) => codes[pick]).join(' '),
  ]);
  return [header, ...rows].map((row) => `${row.map(csvCell).join(',')}\r\n`).join('');
}

function gainedText(portfolios: readonly Portfolio[], index: number): string {
  const before = portfolios[index - 1];
  return before ? (portfolios[index]!.benefit - before.benefit).toFixed(4) : '';
}

/** A spreadsheet runs a cell that begins with one of these; a quote mark in front makes it text again. Figures stay. */
export function csvCell(text: string): string {
  const isFigure = /^-?\d+(\.\d+)?$/u.test(text);
  const safe = !isFigure && /^[=+\-@\t\r]/u.test(text) ? `'${text}` : text;
  return /[",\r\n]/u.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
