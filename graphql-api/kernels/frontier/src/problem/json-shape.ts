import { ProblemError } from './problem-error.js';

/**
 * Checks of single JSON values. Each takes the path of the value, returns the value with its type, or throws a
 * ProblemError. A key set to `undefined` counts as missing, as it does in JSON.
 */

export type JsonObject = Readonly<Record<string, unknown>>;

interface Range {
  least?: number;
  most?: number;
}

export function objectWithKeys(
  value: unknown,
  path: string,
  required: readonly string[],
  optional: readonly string[],
): JsonObject {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) refuse(path, 'an object', value);
  const object = value as JsonObject;
  for (const key of Object.keys(object)) {
    if (required.includes(key) || optional.includes(key)) continue;
    throw new ProblemError(
      join(path, key),
      `one of the keys ${[...required, ...optional].join(', ')}`,
      'an unknown key',
    );
  }
  for (const key of required) {
    if (object[key] === undefined) throw new ProblemError(join(path, key), 'a value', 'nothing');
  }
  return object;
}

export function list<T>(
  value: unknown,
  path: string,
  read: (element: unknown, path: string) => T,
  { least = 0, most = Infinity }: Range = {},
): T[] {
  if (!Array.isArray(value)) refuse(path, 'a list', value);
  const elements: unknown[] = value;
  if (elements.length < least) {
    throw new ProblemError(path, `a list of at least ${least}`, `a list of ${elements.length}`);
  }
  if (elements.length > most) {
    throw new ProblemError(path, `a list of at most ${most}`, `a list of ${elements.length}`);
  }
  // not map: a hole in the list has to be met and refused like any other wrong value
  return Array.from(elements, (element, index) => read(element, `${path}[${index}]`));
}

export function text(value: unknown, path: string, { least = 0, most = Infinity }: Range = {}): string {
  const expected =
    least > 0 && most < Infinity
      ? `a text of ${least} to ${most} characters`
      : least > 0
        ? 'a text that is not empty'
        : most < Infinity
          ? `a text of at most ${most} characters`
          : 'a text';
  if (typeof value !== 'string' || value.length < least || value.length > most) refuse(path, expected, value);
  return value;
}

export function wholeNumber(value: unknown, path: string, { least, most }: Range = {}): number {
  const expected =
    least !== undefined && most !== undefined
      ? `a whole number from ${least} to ${most}`
      : least !== undefined
        ? `a whole number of at least ${least}`
        : 'a whole number';
  if (typeof value !== 'number' || !Number.isInteger(value)) refuse(path, expected, value);
  const number = value;
  if (!Number.isSafeInteger(number)) refuse(path, 'a whole number below 2^53', value);
  if (number < (least ?? -Infinity) || number > (most ?? Infinity)) refuse(path, expected, value);
  return number;
}

export function optional<T>(
  object: JsonObject,
  key: string,
  path: string,
  read: (value: unknown, path: string) => T,
): T | undefined {
  return object[key] === undefined ? undefined : read(object[key], join(path, key));
}

export function join(path: string, key: string): string {
  return path === '' ? key : `${path}.${key}`;
}

/** Ends the reading of a value: says what was expected and shows what is there. */
export function refuse(path: string, expected: string, value: unknown): never {
  throw new ProblemError(path, expected, describe(value));
}

function describe(value: unknown): string {
  if (value === undefined) return 'nothing';
  if (value === null) return 'null';
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'object') return 'an object';
  if (typeof value === 'string') return value.length > 40 ? `"${value.slice(0, 40)}…"` : `"${value}"`;
  return typeof value === 'number' || typeof value === 'boolean' ? String(value) : `a ${typeof value}`;
}
