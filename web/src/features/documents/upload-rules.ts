/** Said before anything is chosen, and as the end of each refusal; the API says the same. */
export const ACCEPTED_FILES = 'Accepted are PDF, XLSX, CSV, PNG and JPG files of up to 20\u00a0MB.';
export const ACCEPT_ATTRIBUTE = '.pdf,.xlsx,.csv,.png,.jpg,.jpeg';

const LARGEST_BYTES = 20 * 1024 * 1024;
const ENDING = /[^.]\.(pdf|xlsx|csv|png|jpe?g)$/iu;

/** Why a file need not even be sent; undefined when it may. The API looks again, at the content too. */
export function whyNotAccepted({ name, size }: Pick<File, 'name' | 'size'>): string | undefined {
  if (!ENDING.test(name)) return `“${name}” is of a type that is not accepted. ${ACCEPTED_FILES}`;
  if (size === 0) return `“${name}” is empty. ${ACCEPTED_FILES}`;
  if (size > LARGEST_BYTES) return `“${name}” has ${megabytes(size)}, which is too large. ${ACCEPTED_FILES}`;
  return undefined;
}

/** "8.0 MB", rounded up, so that a file above the limit never looks as if it met it. */
export function megabytes(bytes: number): string {
  return `${(Math.ceil((bytes / 1024 / 1024) * 10) / 10).toFixed(1)}\u00a0MB`;
}
