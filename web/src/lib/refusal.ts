import { errorCode, errorMessage, fieldErrors } from './error-code';

/** Messages by field name, such as `{ worksNet: 'Building works must be zero or more.' }`. */
export type FieldProblems = Record<string, string>;

/** Why something was not saved: fields to mend, somebody else's save that came first, or a sentence. */
type Refusal =
  | { kind: 'fields'; problems: FieldProblems }
  | { kind: 'conflict'; message: string }
  | { kind: 'message'; message: string };

/**
 * Sorts a failed mutation for a form with these fields. `labels` holds what each field is called on the screen; the
 * API begins its messages with the field's name, which becomes the label.
 */
export function refusalOf(error: unknown, labels: Readonly<Record<string, string>>): Refusal {
  if (errorCode(error) === 'CONFLICT') return { kind: 'conflict', message: errorMessage(error) };
  const known = Object.entries(fieldErrors(error))
    .map(([path, message]) => [path.split('.').at(-1)!, message] as const)
    .filter(([field]) => field in labels)
    .map(([field, message]): [string, string] => [field, inWords(message, field, labels[field]!)]);
  if (known.length > 0) return { kind: 'fields', problems: Object.fromEntries(known) };
  return { kind: 'message', message: errorMessage(error) };
}

function inWords(message: string, field: string, label: string): string {
  return message.startsWith(`${field} `) ? label + message.slice(field.length) : message;
}
