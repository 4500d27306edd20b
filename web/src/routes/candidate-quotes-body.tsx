import styled from 'styled-components';
import { CostSection } from '../features/costing/cost-section';
import { DocumentList } from '../features/documents/document-list';
import { UploadZone } from '../features/documents/upload-zone';
import { QuoteFormDialog } from '../features/quotes/quote-form-dialog';
import { WhyThisQuote } from '../features/quotes/why-this-quote';
import { useCan } from '../lib/use-can';
import { announce } from '../ui/announce';
import { Button } from '../ui/button';
import { Empty } from '../ui/empty';
import { Section } from '../ui/section';
import { Tag } from '../ui/tag';
import type { PageData } from './candidate-quotes';
import type { QuoteDialog } from './use-quote-dialog';

interface BodyProps {
  data: PageData;
  dialog: QuoteDialog;
  /** Whether quotes may be entered and changed now, by this member. */
  mayEnter: boolean;
  frozen: boolean;
  /** A document has been stored. */
  onStored: () => void;
}

/** Documents at the left, costs and choice at the right; one below the other where there is no room. */
export function CandidateQuotesBody({ data, dialog, mayEnter, frozen, onStored }: BodyProps) {
  const { candidate, round } = data;
  const can = useCan();
  function stored(fileName: string) {
    announce(`${fileName} stored`);
    onStored();
  }
  return (
    <Columns>
      <Side>
        {can('startUpload') && !frozen && <UploadZone candidateId={candidate.id} onStored={stored} />}
        <Documents data={data} mayEnter={mayEnter} dialog={dialog} />
      </Side>
      {candidate.quotes.length > 0 ? (
        <Costs>
          <CostSection
            quotes={candidate.quotes}
            candidate={candidate}
            terms={round}
            action={
              mayEnter
                ? ({ id, number }) => <ChangeLink number={number} onPress={() => dialog.open(id)} />
                : undefined
            }
          />
          <WhyThisQuote candidate={candidate} frozen={frozen} />
        </Costs>
      ) : (
        <NoQuotes onEnter={mayEnter ? () => dialog.open('new') : undefined} />
      )}
      {mayEnter && <FormDialog data={data} dialog={dialog} />}
    </Columns>
  );
}

function Documents({ data, mayEnter, dialog }: Pick<BodyProps, 'data' | 'mayEnter' | 'dialog'>) {
  const { quotes, documents } = data.candidate;
  return (
    <DocumentList
      documents={documents}
      aside={({ id, quoteId, fileName }) => {
        const quote = quotes.find((each) => each.id === quoteId);
        if (quote)
          return (
            <Tag tone="good" icon="ok">
              Figures in {quote.number}
            </Tag>
          );
        return mayEnter ? (
          <Button
            size="small"
            onClick={() => dialog.open('new', id)}
            aria-label={`Enter its figures, ${fileName}`}
          >
            Enter its figures
          </Button>
        ) : null;
      }}
    />
  );
}

function FormDialog({ data, dialog }: Pick<BodyProps, 'data' | 'dialog'>) {
  const { candidate, round } = data;
  const quote = candidate.quotes.find(({ id }) => id === dialog.quote);
  if (!quote && dialog.quote !== 'new') return null;
  return (
    <QuoteFormDialog
      key={`${dialog.quote} ${dialog.documentId}`}
      candidate={candidate}
      quote={quote}
      document={candidate.documents.find(({ id }) => id === dialog.documentId)}
      currencies={[candidate.worksNet.currency, ...round.exchangeRates.map((rate) => rate.currency)]}
      vatRate={Number(round.vatRate)}
      onClose={dialog.close}
    />
  );
}

function ChangeLink({ number, onPress }: { number: string; onPress: () => void }) {
  return (
    <Change>
      <Button size="small" variant="quiet" onClick={onPress} aria-label={`Change quote ${number}`}>
        Change
      </Button>
    </Change>
  );
}

function NoQuotes({ onEnter }: { onEnter?: () => void }) {
  return (
    <Section>
      <Empty
        title="Lay the first quote along the rod"
        actions={
          onEnter && (
            <Button variant="primary" icon="plus" onClick={onEnter}>
              Enter a quote
            </Button>
          )
        }
      >
        A quote is what a vendor asks for this candidate. Once its figures are in, its life-cycle cost stands
        here beside those of the others. What the vendor sent belongs among the documents.
      </Empty>
    </Section>
  );
}

const Columns = styled.div`
  display: grid;
  grid-template-columns: 328px minmax(0, 1fr);
  gap: 16px;
  align-items: start;
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
    > :nth-child(1) {
      order: 2;
    }
  }
`;

const Side = styled.div`
  display: grid;
  gap: 16px;
  min-width: 0;
`;

const Costs = styled.div`
  display: grid;
  gap: 14px;
  min-width: 0;
`;

const Change = styled.span`
  display: flex;
  justify-content: flex-end;
  margin-right: -12px;
`;
