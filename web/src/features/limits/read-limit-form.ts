import type { LimitFieldsInput, LimitMeasure } from '../../generated/graphql';
import { readAmount } from '../../lib/read-amount';
import type { FieldProblems } from '../../lib/refusal';
import { typedText } from '../../lib/typed-text';

/** Reads what was typed into the limit form; a bound left empty does not bind. */
export function readLimitForm(data: FormData): { fields: LimitFieldsInput; problems: FieldProblems } {
  const problems: FieldProblems = {};
  const text = (name: keyof LimitFieldsInput) => typedText(data, name);
  const bound = (name: 'least' | 'most') => {
    if (!text(name)) return null;
    const read = readAmount(text(name));
    if ('amount' in read) return read.amount;
    problems[name] = 'Write the bound as a number, such as 50, or leave it empty.';
    return null;
  };
  if (!text('name')) problems.name = 'Give the limit a name, such as “Installation days”.';
  const fields = {
    name: text('name'),
    measure: text('measure') as LimitMeasure,
    siteId: text('siteId') || null,
    least: bound('least'),
    most: bound('most'),
  };
  return { fields, problems };
}
