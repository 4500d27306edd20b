import { useState } from 'react';
import styled from 'styled-components';
import type { CandidateFieldsInput } from '../../generated/graphql';
import type { FieldProblems } from '../../lib/refusal';
import { CheckboxField, FieldGrid, SelectField, TextAreaField, TextField } from '../../ui/field';
import { MoneyInput } from '../../ui/money-input';
import { KINDS, LABELS } from './candidate-labels';

export interface FormChoices {
  currency: string;
  departments: readonly { id: string; name: string }[];
  sites: readonly { id: string; name: string }[];
}

interface CandidateFieldsProps {
  /** What the fields begin with. */
  initial: CandidateFieldsInput;
  choices: FormChoices;
  problems: FieldProblems;
}

/** Every field of a candidate. Amounts are for all units together, in the group's currency. */
export function CandidateFields(props: CandidateFieldsProps) {
  return (
    <>
      <WhatAndWhere {...props} />
      <Costs {...props} />
      <TakesUp {...props} />
      <Mandatory {...props} />
    </>
  );
}

function WhatAndWhere({ initial, choices, problems }: CandidateFieldsProps) {
  const { departments, sites } = choices;
  return (
    <Group>
      <legend>What is needed, and where</legend>
      <TextField
        label={LABELS.name}
        name="name"
        defaultValue={initial.name}
        error={problems.name}
        maxLength={200}
      />
      <TextAreaField
        label={LABELS.need}
        name="need"
        defaultValue={initial.need}
        error={problems.need}
        help="What it is for, and what happens if it is not bought."
        maxLength={4000}
      />
      <FieldGrid $columns={2}>
        <SelectField
          label={LABELS.departmentId}
          name="departmentId"
          defaultValue={initial.departmentId}
          error={problems.departmentId}
          placeholder="Choose"
          options={departments.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <SelectField
          label={LABELS.siteId}
          name="siteId"
          defaultValue={initial.siteId}
          error={problems.siteId}
          placeholder="Choose"
          options={sites.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <SelectField label={LABELS.kind} name="kind" defaultValue={initial.kind} options={KINDS} />
        <TextField
          label={LABELS.genericGroup}
          name="genericGroup"
          defaultValue={initial.genericGroup}
          error={problems.genericGroup}
          help="The kind of equipment, such as infusion pump."
          maxLength={200}
        />
        <Plain name="quantity" unit="units" {...{ initial, problems }} />
        <Plain name="usefulLifeYears" unit="years" {...{ initial, problems }} />
      </FieldGrid>
    </Group>
  );
}

function Costs({ initial, choices, problems }: CandidateFieldsProps) {
  const amount = (name: AmountField, help: string) => (
    <MoneyInput
      label={LABELS[name]}
      name={name}
      currency={choices.currency}
      defaultValue={initial[name]}
      help={help}
      error={problems[name]}
    />
  );
  return (
    <Group>
      <legend>Costs beside the quotes</legend>
      <FieldGrid $columns={2}>
        <div>{amount('worksNet', 'Room, power and the like; 0 where there are none.')}</div>
        <Plain
          name="residualPercent"
          unit="%"
          help="Of the unit price, at the end of its useful life."
          {...{ initial, problems }}
        />
        <div>{amount('consumablesYearly', 'With VAT.')}</div>
        <div>{amount('energyYearly', 'With VAT. Below zero where less is used than now.')}</div>
        <div>
          {amount('currentRunningYearly', 'With VAT, of what it replaces; 0 where it replaces nothing.')}
        </div>
      </FieldGrid>
    </Group>
  );
}

function TakesUp(props: CandidateFieldsProps) {
  return (
    <Group>
      <legend>What it takes up</legend>
      <FieldGrid $columns={2}>
        <Plain name="installationDays" unit="days" help="Of the group’s own technical team." {...props} />
        <Plain name="floorAreaM2" unit="m²" {...props} />
      </FieldGrid>
    </Group>
  );
}

function Mandatory({ initial, problems }: CandidateFieldsProps) {
  const [mandatory, setMandatory] = useState(initial.mandatory);
  return (
    <Group>
      <legend>Duty</legend>
      <CheckboxField
        label={LABELS.mandatory}
        name="mandatory"
        help="Bought in every portfolio, whatever its benefit."
        checked={mandatory}
        onChange={(event) => setMandatory(event.target.checked)}
      />
      <div hidden={!mandatory}>
        <TextAreaField
          label={LABELS.mandatoryReason}
          name="mandatoryReason"
          defaultValue={initial.mandatoryReason}
          error={problems.mandatoryReason}
          help="Which duty or proof asks for it, such as a stop order with its date."
          maxLength={1000}
        />
      </div>
    </Group>
  );
}

type AmountField = 'worksNet' | 'consumablesYearly' | 'energyYearly' | 'currentRunningYearly';

interface PlainProps {
  name: 'quantity' | 'usefulLifeYears' | 'residualPercent' | 'installationDays' | 'floorAreaM2';
  unit: string;
  help?: string;
  initial: CandidateFieldsInput;
  problems: FieldProblems;
}

/** A plain number. */
function Plain({ name, unit, help, initial, problems }: PlainProps) {
  return (
    <TextField
      label={LABELS[name]}
      name={name}
      unit={unit}
      inputMode="decimal"
      autoComplete="off"
      defaultValue={String(initial[name])}
      help={help}
      error={problems[name]}
    />
  );
}

const Group = styled.fieldset`
  display: grid;
  gap: 16px;
  padding-top: 12px;
  border-top: 2px solid var(--mw-ink);
  legend {
    float: left;
    margin-bottom: -4px;
    padding: 0;
    font-weight: 700;
  }
`;
