import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { sendFile } from './send-file';
import type {
  FinishUploadMutation,
  FinishUploadMutationVariables,
  StartUploadMutation,
  StartUploadMutationVariables,
} from './use-store-document.generated';

const START_UPLOAD: TypedDocumentNode<StartUploadMutation, StartUploadMutationVariables> = gql`
  mutation StartUpload($input: StartUploadInput!) {
    startUpload(input: $input) {
      ... on UploadSlot {
        url
        fields {
          name
          value
        }
        document {
          id
        }
      }
      ... on UploadRefused {
        message
      }
    }
  }
`;

const FINISH_UPLOAD: TypedDocumentNode<FinishUploadMutation, FinishUploadMutationVariables> = gql`
  mutation FinishUpload($documentId: ID!) {
    finishUpload(documentId: $documentId) {
      ... on Document {
        id
        state
      }
      ... on UploadRefused {
        message
      }
    }
  }
`;

/** The API said no, in words for the person. */
export class Refused extends Error {}

interface Watch {
  onProgress: (sentBytes: number) => void;
  signal: AbortSignal;
}

/** Announces a file, sends it to the store, and has it checked. Throws Refused, SendFailed, AbortError or the API's error. */
export function useStoreDocument(candidateId: string) {
  const [startUpload] = useMutation(START_UPLOAD);
  const [finishUpload] = useMutation(FINISH_UPLOAD);
  return async (file: File, watch: Watch): Promise<void> => {
    const input = { candidateId, fileName: file.name, contentType: file.type, sizeBytes: file.size };
    const slot = (await startUpload({ variables: { input } })).data!.startUpload;
    if (slot.__typename === 'UploadRefused') throw new Refused(slot.message);
    await sendFile(slot, file, watch);
    const { data } = await finishUpload({ variables: { documentId: slot.document.id } });
    if (data!.finishUpload.__typename === 'UploadRefused') throw new Refused(data!.finishUpload.message);
  };
}
