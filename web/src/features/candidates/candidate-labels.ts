import type { CandidateFieldsInput, CandidateKind } from '../../generated/graphql';

/** What each field of a candidate is called, in the form and in what is said about it. */
export const LABELS: Record<keyof CandidateFieldsInput, string> = {
  name: 'Name',
  need: 'Need',
  departmentId: 'Department',
  siteId: 'Site',
  kind: 'Kind',
  genericGroup: 'Generic group',
  quantity: 'Quantity',
  usefulLifeYears: 'Useful life',
  residualPercent: 'Residual value',
  worksNet: 'Building works, without VAT',
  consumablesYearly: 'Consumables a year',
  energyYearly: 'Energy a year',
  currentRunningYearly: 'Present running cost a year',
  installationDays: 'Installation days',
  floorAreaM2: 'Floor area',
  mandatory: 'Mandatory',
  mandatoryReason: 'Why it is mandatory',
};

export const KINDS: readonly { value: CandidateKind; label: string }[] = [
  { value: 'REPLACEMENT', label: 'Replacement' },
  { value: 'UPGRADE', label: 'Upgrade' },
  { value: 'EXPANSION', label: 'Expansion' },
  { value: 'NEW_SERVICE', label: 'New service' },
  { value: 'REGULATORY', label: 'Regulatory' },
];
