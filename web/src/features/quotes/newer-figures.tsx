import styled from 'styled-components';
import { Button } from '../../ui/button';
import { QUOTE_LABELS, fieldsOf } from './quote-figures';
import type { QuoteFieldName, QuoteFigures } from './quote-figures';

interface NewerFiguresProps {
  /** As it was when the form opened. */
  before: QuoteFigures;
  /** As somebody else has saved it since. */
  now: QuoteFigures;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** What somebody else changed while the form was open, and whose figures count. */
export function NewerFigures({ before, now, onKeepMine, onTakeTheirs }: NewerFiguresProps) {
  return (
    <Box>
      <p>Saved in the meantime. What you typed still stands below.</p>
      <dl>
        {changesBetween(before, now).map(({ name, was, is }) => (
          <div key={name}>
            <dt>{QUOTE_LABELS[name]}</dt>
            <dd>
              {was} → <b>{is}</b>
            </dd>
          </div>
        ))}
      </dl>
      <div className="row">
        <Button size="small" onClick={onKeepMine}>
          Go on with mine
        </Button>
        <Button size="small" onClick={onTakeTheirs}>
          Take theirs
        </Button>
      </div>
    </Box>
  );
}

function changesBetween(before: QuoteFigures, now: QuoteFigures) {
  const [was, is] = [fieldsOf(before), fieldsOf(now)];
  return (Object.keys(QUOTE_LABELS) as QuoteFieldName[])
    .filter((name) => was[name] !== is[name])
    .map((name) => ({ name, was: inWords(was[name]), is: inWords(is[name]) }));
}

function inWords(value: string | number | boolean | null | undefined): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return value === null || value === undefined || value === '' ? 'empty' : String(value);
}

const Box = styled.div`
  display: grid;
  gap: 8px;
  padding: 12px 16px;
  border-left: 4px solid var(--mw-sea);
  background: var(--mw-sea-soft);
  dl > div {
    display: flex;
    flex-wrap: wrap;
    gap: 0 8px;
  }
  dt {
    font-weight: 600;
  }
`;
