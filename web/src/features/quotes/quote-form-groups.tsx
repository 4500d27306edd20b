import { useState } from 'react';
import type { ReactNode } from 'react';
import styled from 'styled-components';
import { formatPercent } from '../../lib/money';
import type { FieldProblems } from '../../lib/refusal';
import { CheckboxField, FieldGrid, TextField } from '../../ui/field';
import { MoneyInput } from '../../ui/money-input';
import { DateField } from './date-field';
import { QUOTE_LABELS } from './quote-figures';
import type { QuoteFieldName } from './quote-figures';
import type { StartFigures } from './start-figures';
import { SuggestedField } from './suggested-field';
import { useVendorNames } from './vendor-names';

interface GroupProps {
  start: StartFigures;
  problems: FieldProblems;
}

/** Label, name, beginning and problem of a field. */
function wiring({ start, problems }: GroupProps, name: Exclude<QuoteFieldName, 'pricesIncludeVat'>) {
  return {
    label: QUOTE_LABELS[name],
    name,
    defaultValue: String(start[name] ?? ''),
    error: problems[name],
  };
}

export function WhoAndWhen(props: GroupProps) {
  const vendors = useVendorNames();
  return (
    <Group title="Who and when">
      <SuggestedField
        {...wiring(props, 'vendorName')}
        suggestions={vendors}
        help="A new name adds a vendor."
      />
      <TextField {...wiring(props, 'number')} autoComplete="off" help="The vendor’s own number." />
      <DateField {...wiring(props, 'quoteDate')} />
      <DateField {...wiring(props, 'validUntil')} help="Last day on which the quote holds." />
    </Group>
  );
}

interface PricesProps extends GroupProps {
  /** Those the round can convert, the organisation's own first. */
  currencies: readonly string[];
  vatRate: number;
  currency: string;
  onCurrency: (currency: string) => void;
}

export function Prices({ currencies, vatRate, currency, onCurrency, ...props }: PricesProps) {
  const money = (name: Exclude<QuoteFieldName, 'pricesIncludeVat'>) => ({ ...wiring(props, name), currency });
  return (
    <Group title="Prices">
      <SuggestedField
        {...wiring(props, 'currency')}
        suggestions={currencies}
        help={`As on the quote. The round converts ${currencies.join(', ')}.`}
        maxLength={3}
        onChange={({ target }) => onCurrency(target.value.toUpperCase())}
      />
      <VatChoice included={props.start.pricesIncludeVat} vatRate={vatRate} />
      <MoneyInput {...money('unitPrice')} />
      <TextField {...wiring(props, 'quantity')} inputMode="numeric" autoComplete="off" />
      <MoneyInput {...money('delivery')} help="0 when it is in the price." />
      <MoneyInput {...money('installation')} help="0 when it is in the price." />
      <MoneyInput {...money('training')} help="0 when it is in the price." />
      <MoneyInput {...money('discount')} help="Taken off the pieces, as an amount." />
    </Group>
  );
}

function VatChoice({ included, vatRate }: { included: boolean; vatRate: number }) {
  const [checked, setChecked] = useState(included);
  return (
    <Beside>
      <CheckboxField
        label={QUOTE_LABELS.pricesIncludeVat}
        name="pricesIncludeVat"
        checked={checked}
        onChange={({ target }) => setChecked(target.checked)}
        help={checked ? 'Taken as they stand.' : `${formatPercent(vatRate, 1)} is put on top.`}
      />
    </Beside>
  );
}

export function ServiceAndDelivery({ currency, ...props }: GroupProps & { currency: string }) {
  return (
    <Group title="Service and delivery">
      <TextField {...wiring(props, 'warrantyYears')} inputMode="numeric" autoComplete="off" unit="years" />
      <TextField {...wiring(props, 'serviceTier')} help="Such as full cover, answered in one working day." />
      <MoneyInput
        {...wiring(props, 'serviceYearly')}
        currency={currency}
        help="For all pieces, with VAT. Empty when the quote names none."
      />
      <TextField {...wiring(props, 'leadWeeks')} inputMode="numeric" autoComplete="off" unit="weeks" />
      <TextField
        {...wiring(props, 'incoterm')}
        autoComplete="off"
        help="Incoterms rule, such as DAP."
        maxLength={20}
      />
      <TextField {...wiring(props, 'namedPlace')} help="Up to where the vendor delivers." />
      <TextField {...wiring(props, 'paymentTerms')} help="Such as 30 days after acceptance." />
    </Group>
  );
}

function Group({ title, children }: { title: string; children: ReactNode }) {
  return (
    <Fieldset>
      <legend>{title}</legend>
      <FieldGrid $columns={2}>{children}</FieldGrid>
    </Fieldset>
  );
}

const Fieldset = styled.fieldset`
  padding-top: 12px;
  border-top: 1px solid var(--mw-line-strong);
  legend {
    padding: 0 12px 0 0;
    font-weight: 700;
  }
`;

const Beside = styled.div`
  padding-top: 28px;
`;
