import { createHash } from 'node:crypto';
import { canonicalText } from '@metewand/frontier';

/** SHA-256 of a document written with sorted keys and no white space: "sha256:…". */
export function fingerprintOf(document: unknown): string {
  return `sha256:${createHash('sha256').update(canonicalText(document)).digest('hex')}`;
}
