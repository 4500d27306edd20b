export const LARGEST_FILE_BYTES = 20 * 1024 * 1024;
const ACCEPTED = 'Accepted are PDF, XLSX, CSV, PNG and JPG files of up to 20 MB.';
const LONGEST_NAME = 200;

/** A kind of file that may be uploaded. */
export interface FileKind {
  /** Under which it is stored and handed out. */
  contentType: string;
  /** What browsers call it besides; an empty type is one they do not know. */
  alsoCalled: readonly string[];
}

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
const JPG: FileKind = { contentType: 'image/jpeg', alsoCalled: ['image/jpg'] };

export const CSV: FileKind = {
  contentType: 'text/csv',
  alsoCalled: ['application/csv', 'application/vnd.ms-excel', 'text/plain', ''],
};

const KINDS: Readonly<Record<string, FileKind>> = {
  pdf: { contentType: 'application/pdf', alsoCalled: [] },
  xlsx: { contentType: XLSX, alsoCalled: [] },
  csv: CSV,
  png: { contentType: 'image/png', alsoCalled: [] },
  jpg: JPG,
  jpeg: JPG,
};

export interface AnnouncedFile {
  fileName: string;
  contentType: string;
  sizeBytes: number;
}

export type Acceptance = { fileName: string; contentType: string } | { refusal: string };

/** Whether a file may be sent at all, by what the browser says of it. The content is checked once it is there. */
export function acceptFile({ fileName, contentType, sizeBytes }: AnnouncedFile): Acceptance {
  const name = cleanFileName(fileName);
  const kind = kindOf(name);
  if (!kind || ![kind.contentType, ...kind.alsoCalled].includes(contentType.toLowerCase())) {
    return { refusal: `“${name}” is of a type that is not accepted. ${ACCEPTED}` };
  }
  if (sizeBytes <= 0) return { refusal: `“${name}” is empty. ${ACCEPTED}` };
  if (sizeBytes > LARGEST_FILE_BYTES) {
    return { refusal: `“${name}” has ${megabytes(sizeBytes)} MB, which is too large. ${ACCEPTED}` };
  }
  return { fileName: name, contentType: kind.contentType };
}

export function wrongContent(fileName: string): string {
  return `The content of “${fileName}” is not what its name says. Nothing was kept. ${ACCEPTED}`;
}

export function wrongSize(fileName: string): string {
  return `“${fileName}” did not arrive whole: its size is not the one announced. Nothing was kept. Send it again. ${ACCEPTED}`;
}

export function nothingArrived(fileName: string): string {
  return `“${fileName}” did not arrive. Send it again. ${ACCEPTED}`;
}

/** The last part of a path, without signs that steer a terminal, a header or the direction of writing. */
export function cleanFileName(fileName: string): string {
  const last = fileName.normalize('NFC').split(/[/\\]/).at(-1) ?? '';
  const plain = last
    .replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]/gu, '')
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/^\.+/, '');
  const dot = plain.lastIndexOf('.');
  if (dot < 0) return plain.slice(0, LONGEST_NAME);
  const ending = plain.slice(dot).slice(0, 10);
  return plain.slice(0, Math.min(dot, LONGEST_NAME - ending.length)) + ending;
}

function kindOf(fileName: string): FileKind | undefined {
  const ending = /[^.]\.([A-Za-z]+)$/.exec(fileName)?.[1].toLowerCase() ?? '';
  return Object.hasOwn(KINDS, ending) ? KINDS[ending] : undefined;
}

function megabytes(bytes: number): string {
  return (Math.ceil((bytes / 1024 / 1024) * 10) / 10).toFixed(1);
}
