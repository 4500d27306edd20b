import { gql } from '@apollo/client';
import { useNavigate } from 'react-router-dom';
import styled from 'styled-components';
import { formatInstant } from '../../lib/dates';
import { Select } from '../../ui/field';
import { costName } from './front';
import type { RunListedFragment } from './run-choice.generated';

export const RUN_LISTED = gql`
  fragment RunListed on Run {
    id
    number
    costAxis
    createdAt
  }
`;

export type RunListed = RunListedFragment;

/** The run on show; a choice where there are several, because a run that has ended is never overwritten. */
export function RunChoice({ run, runs }: { run: { number: number }; runs: readonly RunListed[] }) {
  const navigate = useNavigate();
  if (runs.length < 2) return <b>Run {run.number}</b>;
  return (
    <Small>
      <Select
        aria-label="Run"
        value={String(run.number)}
        options={runs.map(({ number, costAxis, createdAt }) => ({
          value: String(number),
          label: `Run ${number} · ${formatInstant(createdAt)} · ${costName(costAxis)}`,
        }))}
        onChange={(event) => void navigate(`?run=${event.target.value}`)}
      />
    </Small>
  );
}

const Small = styled.span`
  display: inline-block;
  max-width: 236px;
  vertical-align: middle;
  select {
    height: 28px;
    font-weight: 600;
  }
  svg {
    top: 6px;
  }
  @media (pointer: coarse) {
    select {
      height: 44px;
    }
    svg {
      top: 14px;
    }
  }
`;
