import { currentCaller } from '../tenancy/request-context.js';

/** Where the browser puts a file before it is checked. */
export function slotKey(documentId: string): string {
  return `t/${currentCaller().organisationId}/slot/${documentId}`;
}

/** Where a checked file stays. No upload form was ever made for it, so nobody can replace it. */
export function documentKey(documentId: string): string {
  return `t/${currentCaller().organisationId}/documents/${documentId}`;
}
