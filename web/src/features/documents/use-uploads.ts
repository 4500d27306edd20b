import { useEffect, useReducer, useRef } from 'react';
import { errorMessage } from '../../lib/error-code';
import { SendFailed } from './send-file';
import { whyNotAccepted } from './upload-rules';
import { Refused, useStoreDocument } from './use-store-document';

export interface Upload {
  id: number;
  file: File;
  sentBytes: number;
  /** Sent and now being checked by the API. */
  checking: boolean;
  /** Set once it has failed. */
  problem?: string;
  /** Whether sending it again can help. */
  canRetry: boolean;
}

type Change = { id: number } & (Partial<Upload> | { gone: true });

/** Files on their way to the store; a stored one leaves the list through `onStored`. */
export function useUploads(candidateId: string, onStored: (fileName: string) => void) {
  const [uploads, change] = useReducer(applied, []);
  const store = useStoreDocument(candidateId);
  const running = useRef(new Map<number, AbortController>());
  const lastId = useRef(0);

  useEffect(() => {
    const controllers = running.current;
    return () => controllers.forEach((controller) => controller.abort());
  }, []);

  async function send(id: number, file: File) {
    const stop = new AbortController();
    running.current.set(id, stop);
    change({ id, file, sentBytes: 0, checking: false, problem: undefined, canRetry: false });
    try {
      const onProgress = (sentBytes: number) => change({ id, sentBytes, checking: sentBytes >= file.size });
      await store(file, { onProgress, signal: stop.signal });
      change({ id, gone: true });
      onStored(file.name);
    } catch (error) {
      if (stop.signal.aborted) change({ id, gone: true });
      else change({ id, checking: false, ...problemOf(error) });
    } finally {
      running.current.delete(id);
    }
  }

  return {
    uploads,
    /** Sends what may be sent; the rest stands in the list with the reason. */
    add: (files: Iterable<File>) => {
      for (const file of files) {
        const id = ++lastId.current;
        const problem = whyNotAccepted(file);
        if (problem) change({ id, file, sentBytes: 0, checking: false, problem, canRetry: false });
        else void send(id, file);
      }
    },
    retry: ({ id, file }: Upload) => void send(id, file),
    /** Stops one that is under way, or takes a failed one off the list. */
    remove: ({ id }: Upload) => {
      running.current.get(id)?.abort();
      change({ id, gone: true });
    },
  };
}

function applied(uploads: Upload[], change: Change): Upload[] {
  if ('gone' in change) return uploads.filter(({ id }) => id !== change.id);
  const before = uploads.find(({ id }) => id === change.id);
  if (before) return uploads.map((upload) => (upload === before ? { ...upload, ...change } : upload));
  return 'file' in change && change.file ? [...uploads, change as Upload] : uploads;
}

function problemOf(error: unknown): Pick<Upload, 'problem' | 'canRetry'> {
  if (error instanceof Refused) return { problem: error.message, canRetry: false };
  if (error instanceof SendFailed)
    return {
      problem: 'It did not arrive. Nothing was kept. Check the connection, then send it again.',
      canRetry: true,
    };
  return { problem: errorMessage(error), canRetry: true };
}
