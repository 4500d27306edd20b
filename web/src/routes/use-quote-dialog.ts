import { useSearchParams } from 'react-router-dom';

export interface QuoteDialog {
  /** "new", the id of the quote to change, or null while no dialog is open. */
  quote: string | null;
  /** The document whose figures are entered. */
  documentId: string | null;
  open: (quote: string, documentId?: string) => void;
  close: () => void;
}

/** Which quote is being entered or changed, kept in the address: `?quote=new&document=…`. */
export function useQuoteDialog(): QuoteDialog {
  const [params, setParams] = useSearchParams();
  function show(quote?: string, documentId?: string) {
    setParams((before) => {
      const next = new URLSearchParams(before);
      next.delete('quote');
      next.delete('document');
      if (quote) next.set('quote', quote);
      if (documentId) next.set('document', documentId);
      return next;
    });
  }
  return {
    quote: params.get('quote'),
    documentId: params.get('document'),
    open: show,
    close: () => show(),
  };
}
