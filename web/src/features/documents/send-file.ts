/** Where to post a file, and what to post before it. */
interface Slot {
  url: string;
  fields: readonly { name: string; value: string }[];
}

interface Watch {
  onProgress: (sentBytes: number) => void;
  signal: AbortSignal;
}

/** The file did not reach the store. */
export class SendFailed extends Error {}

/**
 * Posts the fields of the slot, then the file, straight to the store. Rejects with SendFailed, or with an AbortError
 * once `signal` aborts. XMLHttpRequest, because fetch cannot say how many bytes have left.
 */
export function sendFile({ url, fields }: Slot, file: File, { onProgress, signal }: Watch): Promise<void> {
  const form = new FormData();
  for (const { name, value } of fields) form.append(name, value);
  form.append('file', file);
  return new Promise((resolve, reject) => {
    signal.throwIfAborted();
    const request = new XMLHttpRequest();
    request.upload.addEventListener('progress', ({ loaded, total }) =>
      onProgress(fileShare(loaded, total, file)),
    );
    request.addEventListener('load', () =>
      request.status < 300 ? resolve() : reject(new SendFailed(`The store answered ${request.status}.`)),
    );
    request.addEventListener('error', () => reject(new SendFailed('The store did not answer.')));
    request.addEventListener('abort', () => reject(new DOMException('Stopped.', 'AbortError')));
    signal.addEventListener('abort', () => request.abort());
    request.open('POST', url);
    request.send(form);
  });
}

/** The browser counts the form around the file too. */
function fileShare(loaded: number, total: number, file: File): number {
  return total > 0 ? Math.round((loaded / total) * file.size) : 0;
}
