import { useEffect, useId, useState } from 'react';
import { formatMoney } from '../../lib/money';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { CheckedForm } from '../../ui/checked-form';
import { Dialog } from '../../ui/dialog';
import { LeaveGuard } from '../../ui/leave-guard';
import { NewerFigures } from './newer-figures';
import type { QuoteFigures } from './quote-figures';
import { QuoteFormFields } from './quote-form-fields';
import { useQuoteForm } from './use-quote-form';
import type { SavedQuote } from './use-save-quote';

interface QuoteFormDialogProps {
  candidate: { id: string; name: string; quantity: number };
  /** The quote to change; undefined for a new one. */
  quote?: QuoteFigures;
  /** The document that holds the figures. */
  document?: { id: string; fileName: string };
  currencies: readonly [own: string, ...others: string[]];
  /** As a share: 0.2 for 20 %. */
  vatRate: number;
  onClose: () => void;
}

/** Enters or changes the figures of a quote, then says at once what it costs over its life. */
export function QuoteFormDialog({ candidate, quote, document, onClose, ...terms }: QuoteFormDialogProps) {
  const formId = useId();
  const [dirty, setDirty] = useState(false);
  const [saved, setSaved] = useState<SavedQuote>();
  const [resets, setResets] = useState(0);
  const form = useQuoteForm({ candidateId: candidate.id, quote, documentId: document?.id }, setSaved);
  const unsaved = dirty && !saved;

  // In an effect, so that the guard below has let go before the dialog leaves the address.
  useEffect(() => {
    if (!saved) return;
    announce(costInWords(saved));
    onClose();
  }, [saved]); // eslint-disable-line react-hooks/exhaustive-deps -- once per saved quote

  function takeTheirs() {
    form.settleConflict();
    setDirty(false);
    setResets(resets + 1);
  }

  return (
    <>
      <Dialog
        title={quote ? `Change quote ${quote.number}` : 'Enter a quote'}
        sub={document ? `${candidate.name} · from ${document.fileName}` : candidate.name}
        width="xlarge"
        onClose={onClose}
        footer={
          <>
            <Button variant="primary" type="submit" form={formId} loading={form.loading}>
              Save the quote
            </Button>
            <Button onClick={onClose}>Cancel</Button>
          </>
        }
      >
        <div onChange={() => setDirty(true)}>
          <CheckedForm id={formId} onSubmit={(element) => void form.save(element)} {...form.refused}>
            {form.conflict && form.base && quote && (
              <NewerFigures
                before={form.base}
                now={quote}
                onKeepMine={form.settleConflict}
                onTakeTheirs={takeTheirs}
              />
            )}
            <QuoteFormFields
              key={resets}
              quote={resets > 0 ? quote : form.base}
              quantity={candidate.quantity}
              problems={form.refused.problems}
              {...terms}
            />
          </CheckedForm>
        </div>
      </Dialog>
      <LeaveGuard when={unsaved} blocks={always} title="The figures are not saved yet" leave="Discard them">
        Closing the form loses what you typed.
      </LeaveGuard>
    </>
  );
}

const always = () => true;

function costInWords({ vendor, number, faults, cost }: SavedQuote): string {
  const without = faults.includes('SERVICE_PRICE_MISSING') ? ', without service' : '';
  return `${vendor.name} ${number} saved. Life-cycle cost ${formatMoney(cost.lifeCycleCost)}${without}`;
}
