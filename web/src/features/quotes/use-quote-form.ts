import { useState } from 'react';
import { refusalOf } from '../../lib/refusal';
import type { FieldProblems } from '../../lib/refusal';
import { useReload } from '../../lib/use-reload';
import { QUOTE_LABELS } from './quote-figures';
import type { QuoteFigures } from './quote-figures';
import { readQuoteForm } from './read-quote-form';
import { useSaveQuote } from './use-save-quote';
import type { SavedQuote } from './use-save-quote';

interface Target {
  candidateId: string;
  /** The stored quote as it is now; undefined for a new one. */
  quote?: QuoteFigures;
  /** A document that the saved quote is to have. */
  documentId?: string;
}

interface Refused {
  problems: FieldProblems;
  message?: string;
}

const NONE: Refused = { problems: {} };

/** Checks and saves the form. What was typed stays in it whatever the answer. */
export function useQuoteForm(
  { candidateId, quote, documentId }: Target,
  onSaved: (saved: SavedQuote) => void,
) {
  const reload = useReload();
  const { create, update, loading } = useSaveQuote();
  const [base, setBase] = useState(quote);
  const [refused, setRefused] = useState<Refused>(NONE);
  const [conflict, setConflict] = useState(false);

  async function save(form: HTMLFormElement) {
    const read = readQuoteForm(new FormData(form));
    if ('problems' in read) return setRefused(read);
    const fields = { ...read.fields, documentId };
    setRefused(NONE);
    try {
      const result = await (base ? update(base, fields) : create(candidateId, fields));
      if ('saved' in result) onSaved(result.saved);
      else setRefused(result);
    } catch (error) {
      await refuse(error);
    }
  }

  async function refuse(error: unknown) {
    const refusal = refusalOf(error, QUOTE_LABELS);
    if (refusal.kind === 'fields') return setRefused({ problems: refusal.problems });
    if (refusal.kind === 'message') return setRefused({ problems: {}, message: refusal.message });
    setRefused({
      problems: {},
      message: 'Somebody else has changed this quote. Nothing of yours is saved yet.',
    });
    await reload();
    setConflict(true);
  }

  /** Goes on from the figures somebody else has saved; the next save puts these in their place. */
  function settleConflict() {
    setBase(quote);
    setConflict(false);
    setRefused(NONE);
  }

  return { save, loading, refused, base, conflict, settleConflict };
}
