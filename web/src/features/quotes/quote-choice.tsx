import { useId } from 'react';
import { Radio } from '@primer/react';
import styled from 'styled-components';
import type { KeptQuote } from './kept-quote';
import { QuoteState } from './quote-state';

interface QuoteChoiceProps {
  quotes: KeptQuote['quotes'];
  chosenId: string;
  onChoose: (id: string) => void;
}

/** Every quote as a choice; one that cannot be bought by says why, and the API has the last word on it. */
export function QuoteChoice({ quotes, chosenId, onChoose }: QuoteChoiceProps) {
  const groupId = useId();
  return (
    <Group>
      <legend>Quote to keep</legend>
      {quotes.map(({ id, vendor, number, faults, inForce }) => (
        <label key={id}>
          <Radio name={groupId} value={id} checked={id === chosenId} onChange={() => onChoose(id)} />
          <span>
            <b>{vendor.name}</b> <span className="muted">{number}</span>
          </span>
          <QuoteState faults={faults} inForce={inForce} />
        </label>
      ))}
    </Group>
  );
}

const Group = styled.fieldset`
  margin-bottom: 12px;
  legend {
    padding: 0;
    font-weight: 600;
  }
  label {
    display: flex;
    flex-wrap: wrap;
    align-items: center;
    gap: 4px 8px;
    min-height: 32px;
  }
`;
