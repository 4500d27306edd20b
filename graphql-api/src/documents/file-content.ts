import { createHash } from 'node:crypto';
import { fileTypeFromBuffer } from 'file-type/core';
import { CSV } from './file-rules.js';

/** Whether the bytes are what the content type says: magic bytes, or for CSV text in UTF-8 that is nothing else. */
export async function isContentOf(bytes: Uint8Array, contentType: string): Promise<boolean> {
  const found = await fileTypeFromBuffer(bytes).catch(() => ({ mime: 'damaged' }));
  if (contentType === CSV.contentType) return found === undefined && isText(bytes);
  return found?.mime === contentType;
}

export function sha256Of(bytes: Uint8Array): string {
  return createHash('sha256').update(bytes).digest('hex');
}

function isText(bytes: Uint8Array): boolean {
  if (bytes.includes(0)) return false;
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    return true;
  } catch {
    return false;
  }
}
