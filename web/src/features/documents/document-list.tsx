import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { ReactNode } from 'react';
import styled from 'styled-components';
import { Section } from '../../ui/section';
import type { ListedDocumentFragment } from './document-list.generated';
import { DocumentRow } from './document-row';

export const LISTED_DOCUMENT: TypedDocumentNode<ListedDocumentFragment> = gql`
  fragment ListedDocument on Document {
    id
    fileName
    sizeBytes
    quoteId
    createdAt
    uploadedBy {
      id
      name
    }
  }
`;

interface DocumentListProps {
  documents: readonly ListedDocumentFragment[];
  /** What stands at the end of a row, such as the quote it belongs to. */
  aside?: (document: ListedDocumentFragment) => ReactNode;
}

/** The documents of a candidate, each to be opened. */
export function DocumentList({ documents, aside }: DocumentListProps) {
  return (
    <Section title="Documents" aside={documents.length > 0 && String(documents.length)}>
      {documents.length === 0 ? (
        <None>None yet. A quote that comes as a letter or a sheet belongs here, beside its figures.</None>
      ) : (
        <ul>
          {documents.map((document) => (
            <DocumentRow key={document.id} document={document} aside={aside?.(document)} />
          ))}
        </ul>
      )}
    </Section>
  );
}

const None = styled.p`
  padding: 0 16px 16px;
  font-size: 13px;
  color: var(--mw-ink-2);
`;
