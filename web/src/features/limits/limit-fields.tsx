import { useState } from 'react';
import type { LimitFieldsInput, LimitMeasure } from '../../generated/graphql';
import { currencySign, formatAmount } from '../../lib/money';
import { formatQuantity } from '../../lib/quantity';
import type { FieldProblems } from '../../lib/refusal';
import { FieldGrid, SelectField, TextField } from '../../ui/field';
import type { LimitRowFragment } from './limit-row.generated';
import { MEASURES } from './limit-words';

export const LIMIT_LABELS: Record<keyof LimitFieldsInput, string> = {
  name: 'Name',
  measure: 'Measure',
  siteId: 'Site',
  least: 'Least',
  most: 'Most',
};

export interface LimitChoices {
  currency: string;
  sites: readonly { id: string; name: string }[];
}

interface LimitFieldsProps {
  limit?: LimitRowFragment;
  choices: LimitChoices;
  problems: FieldProblems;
}

/** Name, measure, site and the two bounds of a limit. */
export function LimitFields({ limit, choices, problems }: LimitFieldsProps) {
  const [measure, setMeasure] = useState<LimitMeasure>(limit?.measure ?? 'INSTALLATION_DAYS');
  const unit = measure === 'ADDED_RUNNING_COST' ? currencySign(choices.currency) : MEASURES[measure].unit;
  const bound = (name: 'least' | 'most', help: string) => (
    <TextField
      label={LIMIT_LABELS[name]}
      name={name}
      unit={unit}
      inputMode="decimal"
      autoComplete="off"
      defaultValue={limit ? written(limit, name, choices.currency) : ''}
      help={help}
      error={problems[name]}
    />
  );
  return (
    <>
      <TextField
        label={LIMIT_LABELS.name}
        name="name"
        defaultValue={limit?.name}
        error={problems.name}
        maxLength={120}
      />
      <FieldGrid $columns={2}>
        <SelectField
          label={LIMIT_LABELS.measure}
          name="measure"
          value={measure}
          onChange={(event) => setMeasure(event.target.value as LimitMeasure)}
          options={Object.entries(MEASURES).map(([value, { name }]) => ({ value, label: name }))}
        />
        <SelectField
          label={LIMIT_LABELS.siteId}
          name="siteId"
          defaultValue={limit?.site?.id ?? ''}
          error={problems.siteId}
          placeholder="All sites"
          options={choices.sites.map(({ id, name }) => ({ value: id, label: name }))}
        />
        {bound('least', 'Empty where there is none.')}
        {bound('most', 'Empty where there is none.')}
      </FieldGrid>
    </>
  );
}

function written(limit: LimitRowFragment, name: 'least' | 'most', currency: string): string {
  const value = limit[name];
  if (value === null) return '';
  return limit.measure === 'ADDED_RUNNING_COST'
    ? formatAmount({ amount: value, currency })
    : formatQuantity(value);
}
