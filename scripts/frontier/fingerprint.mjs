import { canonicalText } from '@metewand/frontier';
import { createHash } from 'node:crypto';

/** What tells one problem from another in its frontier's file. */
export function fingerprintOf(problem) {
  return `sha256:${createHash('sha256').update(canonicalText(problem)).digest('hex')}`;
}
