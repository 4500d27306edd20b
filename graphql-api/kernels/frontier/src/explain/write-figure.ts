import type { Violation } from '../problem/feasible.js';

/** Writes a figure for a person: whole numbers are in the units of whoever wrote the problem. Pieces are not asked. */
export type WriteFigure = (figure: number, of: 'cost' | 'benefit' | { readonly limit: string }) => string;

/** Writes a figure that stands against the bound of a rule. */
export function writeForRule(
  figure: number,
  rule: Pick<Violation, 'kind' | 'name'>,
  write: WriteFigure,
): string {
  switch (rule.kind) {
    case 'ceiling':
      return write(figure, 'cost');
    case 'least benefit':
      return write(figure, 'benefit');
    case 'limit most':
    case 'limit least':
      return write(figure, { limit: rule.name });
    default:
      return String(figure);
  }
}

/** A sum that passes its bound, as the end of a sentence: `cost comes to 120 at least, 20 over the ceiling of 100`. */
export function writeOverrun(
  overrun: { kind: Violation['kind']; name: string; reaches: number; bound: number },
  write: WriteFigure,
): string {
  const { kind, name, reaches, bound } = overrun;
  const text = (figure: number): string => writeForRule(figure, overrun, write);
  const [reached, by, allowed] = [text(reaches), text(Math.abs(reaches - bound)), text(bound)];
  switch (kind) {
    case 'ceiling':
      return `cost comes to ${reached} at least, ${by} over the ceiling of ${allowed}`;
    case 'count most':
      return `${name} comes to ${reached} pieces at least, ${by} more than the ${allowed} allowed`;
    case 'count least':
      return `${name} comes to ${reached} pieces at most, ${by} fewer than the ${allowed} asked for`;
    case 'limit least':
    case 'least benefit':
      return `${name} comes to ${reached} at most, ${by} under its least of ${allowed}`;
    default:
      return `${name} comes to ${reached} at least, ${by} over its limit of ${allowed}`;
  }
}
