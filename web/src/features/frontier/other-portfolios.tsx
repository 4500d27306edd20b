import { useId, useState } from 'react';
import styled from 'styled-components';
import { errorMessage } from '../../lib/error-code';
import { Button } from '../../ui/button';
import { alternativesText, nextBestText } from './alternatives-words';
import type { Front } from './front';
import { exchange } from './marginal-gain';
import type { Portfolio } from './portfolio';
import { toPortfolios } from './portfolio';
import type { Alternatives } from './use-alternatives';
import { useAlternatives } from './use-alternatives';

interface OtherPortfoliosProps {
  runId: string;
  front: Front;
  selected: Portfolio;
}

/** What else could be bought at the cost of A, unfolded when asked for. */
export function OtherPortfolios({ runId, front, selected }: OtherPortfoliosProps) {
  const [open, setOpen] = useState(false);
  const id = useId();
  const { alternatives, error } = useAlternatives(runId, selected.index, open);
  return (
    <Others>
      <Button
        variant="quiet"
        size="small"
        icon={open ? 'up' : 'down'}
        aria-expanded={open}
        aria-controls={open ? id : undefined}
        onClick={() => setOpen(!open)}
        data-screen-only
      >
        Other portfolios here
      </Button>
      {open && (
        <Answer id={id} aria-live="polite">
          {error && <p>{errorMessage(error)}</p>}
          {!error && !alternatives && <p className="muted">Counting them …</p>}
          {alternatives && <Found {...{ front, selected, alternatives }} />}
        </Answer>
      )}
    </Others>
  );
}

interface FoundProps {
  front: Front;
  selected: Portfolio;
  alternatives: Alternatives;
}

function Found({ front, selected, alternatives }: FoundProps) {
  const { nextBest } = alternatives;
  const other = nextBest ? toPortfolios([nextBest], front.ceiling)[0]! : undefined;
  const change = other && exchange([selected, other], 0, 1);
  const names = (items: readonly number[]) => items.map((item) => front.items[item]!.name).join(', ');
  return (
    <>
      <p>{alternativesText(alternatives)}</p>
      <p>{nextBestText(other && selected.benefit - other.benefit, alternatives.isExact)}</p>
      {change && change.enters.length > 0 && <p className="muted">It takes in {names(change.enters)}.</p>}
      {change && change.leaves.length > 0 && <p className="muted">It loses {names(change.leaves)}.</p>}
    </>
  );
}

// The words of the quiet button stand in line with the figures above.
const Others = styled.div`
  > button {
    margin-left: -10px;
  }
`;

const Answer = styled.div`
  padding: 4px 0 2px;
  font-size: 13px;
  p + p {
    margin-top: 2px;
  }
`;
