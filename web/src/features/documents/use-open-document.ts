import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { OpenDocumentMutation, OpenDocumentMutationVariables } from './use-open-document.generated';

const OPEN_DOCUMENT: TypedDocumentNode<OpenDocumentMutation, OpenDocumentMutationVariables> = gql`
  mutation OpenDocument($id: ID!) {
    openDocument(id: $id) {
      url
    }
  }
`;

/** Fetches a link that is good for a minute and follows it; the store hands the document out as a file to save. */
export function useOpenDocument(follow = (url: string) => window.location.assign(url)) {
  const [openDocument] = useMutation(OPEN_DOCUMENT);
  return async (id: string): Promise<void> => {
    const { data } = await openDocument({ variables: { id } });
    follow(data!.openDocument.url);
  };
}
