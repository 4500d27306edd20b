import type { CandidateFieldsInput, CandidateKind } from '../../generated/graphql';
import { readAmount } from '../../lib/read-amount';
import type { FieldProblems } from '../../lib/refusal';
import { typedText } from '../../lib/typed-text';

interface ReadCandidate {
  fields: CandidateFieldsInput;
  /** Only what could not be read at all; whether figures are allowed is for the API to say. */
  problems: FieldProblems;
}

/** Reads what was typed into the candidate form. */
export function readCandidateForm(data: FormData): ReadCandidate {
  const problems: FieldProblems = {};
  const text = (name: keyof CandidateFieldsInput) => typedText(data, name);
  const filled = (name: keyof CandidateFieldsInput, problem: string) => {
    if (!text(name)) problems[name] = problem;
    return text(name);
  };
  const decimal = (name: keyof CandidateFieldsInput, problem: string) => {
    const read = readAmount(text(name));
    if (!('amount' in read)) problems[name] = problem;
    return 'amount' in read ? read.amount : '';
  };
  const whole = (name: keyof CandidateFieldsInput, problem: string) => {
    if (!/^-?\d{1,9}$/u.test(text(name))) problems[name] = problem;
    return Number(text(name));
  };
  const money = (name: keyof CandidateFieldsInput) => filled(name, 'Write an amount; 0 where there is none.');
  const fields: CandidateFieldsInput = {
    name: filled('name', 'Write what is needed, such as “Video endoscope set”.'),
    departmentId: filled('departmentId', 'Choose the department that asks for it.'),
    siteId: filled('siteId', 'Choose the site it is for.'),
    kind: text('kind') as CandidateKind,
    genericGroup: text('genericGroup'),
    need: text('need'),
    quantity: whole('quantity', 'Write how many as a whole number, such as 1.'),
    usefulLifeYears: whole('usefulLifeYears', 'Write the years as a whole number, such as 8.'),
    residualPercent: decimal('residualPercent', 'Write a percent from 0 to 100, such as 5.'),
    worksNet: money('worksNet'),
    consumablesYearly: money('consumablesYearly'),
    energyYearly: money('energyYearly'),
    currentRunningYearly: money('currentRunningYearly'),
    installationDays: decimal(
      'installationDays',
      'Write the days as a number, such as 2.5; 0 where there are none.',
    ),
    floorAreaM2: decimal(
      'floorAreaM2',
      'Write the square metres as a number, such as 6; 0 where there are none.',
    ),
    mandatory: data.get('mandatory') !== null,
    mandatoryReason: text('mandatoryReason'),
  };
  return { fields, problems };
}
