import { currentCaller } from '../tenancy/request-context.js';

/** Where the browser puts a file before it is checked. */
export function slotKey(documentId: string): string {
  return `t/${currentCaller().organisationId}/slot/${documentId}`;
}

/** Where one attempt to check the file looks at it: the slot could still be written to meanwhile. */
export function checkKey(documentId: string, attempt: string): string {
  return `t/${currentCaller().organisationId}/check/${documentId}/${attempt}`;
}

/** Where a checked file stays. The key names the content, so that nothing else can ever take its place. */
export function documentKey(documentId: string, sha256: string): string {
  return `t/${currentCaller().organisationId}/documents/${documentId}/${sha256}`;
}
