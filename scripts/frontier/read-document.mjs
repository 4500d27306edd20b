import { ProblemError } from '@metewand/frontier';
import { findNodeAtLocation, getLocation, parseTree, ParseErrorCode, visit } from 'jsonc-parser';
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { TextDecoder } from 'node:util';

/** A file that cannot be read: the message says where, which field, what was expected and what is there. */
export class FileFault extends Error {
  isFault = true;
  exitCode = 2;
}

/** Reads a JSON file with one of the kernel's parsers, which throws ProblemError. Throws FileFault. */
export function readDocument(file, parse) {
  const text = readText(file);
  const json = parseJson(file, text);
  try {
    return parse(json);
  } catch (error) {
    throw faultOf(error, file, text);
  }
}

/** Does something with what was read from a file: what the kernel refuses only then is a FileFault just the same. */
export async function usingDocument(file, work) {
  try {
    return await work();
  } catch (error) {
    throw error instanceof ProblemError ? faultOf(error, file, readText(file)) : error;
  }
}

function faultOf(error, file, text) {
  if (!(error instanceof ProblemError)) return error;
  return fault(file, text, offsetOfField(text, error.path), error.path, error.expected, error.found);
}

function readText(file) {
  let bytes;
  try {
    // npm runs its scripts at the root; the name was typed elsewhere
    bytes = readFileSync(resolve(process.env.INIT_CWD ?? '', file));
  } catch (error) {
    throw new FileFault(`${file}: it cannot be read (${error.code ?? error.message}).`);
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    const text = new TextDecoder().decode(bytes);
    throw fault(file, text, text.indexOf('\uFFFD'), '', 'text in UTF-8', 'bytes that are none');
  }
}

/** Strict JSON, and no key twice in one object: JSON.parse would drop the first without a word. */
function parseJson(file, text) {
  let json;
  try {
    json = JSON.parse(text);
  } catch (error) {
    throw syntaxFault(file, text, error);
  }
  const keys = [];
  visit(text, {
    onObjectBegin: () => void keys.push(new Set()),
    onObjectEnd: () => void keys.pop(),
    onObjectProperty: (key, offset) => {
      if (keys.at(-1).has(key))
        throw fault(file, text, offset, fieldAt(text, offset), 'a key once', 'it again');
      keys.at(-1).add(key);
    },
  });
  return json;
}

function syntaxFault(file, text, error) {
  let first;
  const note = (code, offset) => (first ??= { code, offset });
  const options = { disallowComments: true, allowTrailingComma: false, allowEmptyContent: false };
  try {
    visit(text, { onError: note }, options);
  } catch (failure) {
    if (!(failure instanceof RangeError)) throw failure;
    return new FileFault(`${file}: it is nested too deep.`);
  }
  const offset = first?.offset ?? Number(/position (\d+)/.exec(error.message)?.[1] ?? 0);
  const isOver = isJson(text.slice(0, offset));
  const expected = isOver ? 'the end of the file' : (EXPECTED[first?.code] ?? 'JSON');
  return fault(file, text, offset, fieldAt(text, offset), expected, whatStands(text, offset));
}

function isJson(text) {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}

const EXPECTED = {
  [ParseErrorCode.InvalidSymbol]: 'a value: text in quotation marks, a number, true, false, null, [ or {',
  [ParseErrorCode.InvalidNumberFormat]: 'a number as JSON writes it',
  [ParseErrorCode.PropertyNameExpected]: 'a key in quotation marks',
  [ParseErrorCode.ValueExpected]: 'a value',
  [ParseErrorCode.ColonExpected]: 'a colon',
  [ParseErrorCode.CommaExpected]: 'a comma or the end of the list or object',
  [ParseErrorCode.CloseBraceExpected]: 'a comma or }',
  [ParseErrorCode.CloseBracketExpected]: 'a comma or ]',
  [ParseErrorCode.EndOfFileExpected]: 'the end of the file',
  [ParseErrorCode.InvalidCommentToken]: 'no comment',
  [ParseErrorCode.UnexpectedEndOfComment]: 'no comment',
  [ParseErrorCode.UnexpectedEndOfString]: 'a quotation mark at the end of the text',
  [ParseErrorCode.UnexpectedEndOfNumber]: 'a digit',
  [ParseErrorCode.InvalidUnicode]: 'four hex digits after \\u',
  [ParseErrorCode.InvalidEscapeCharacter]: 'one of " \\ / b f n r t u after a backslash',
  [ParseErrorCode.InvalidCharacter]: 'no control character in a text',
};

function whatStands(text, offset) {
  const rest = text
    .slice(offset, offset + 20)
    .split('\n', 1)[0]
    .trimEnd();
  return offset >= text.length ? 'the end of the file' : rest === '' ? 'the end of the line' : `'${rest}'`;
}

function fault(file, text, offset, field, expected, found) {
  const before = text.slice(0, offset);
  const line = before.split('\n').length;
  const column = offset - before.lastIndexOf('\n');
  const where = field === '' ? '' : `${field}: `;
  return new FileFault(`${file}:${line}:${column}: ${where}expected ${expected}, found ${found}.`);
}

/** The field an offset lies in, written as in a ProblemError. */
function fieldAt(text, offset) {
  return getLocation(text, offset)
    .path.map((part) => (typeof part === 'number' ? `[${part}]` : `.${part}`))
    .join('')
    .replace(/^\./, '');
}

/** Where a field stands; where it is missing, the nearest one around it. Ids hold dots, so paths are matched, not split. */
function offsetOfField(text, path) {
  let node = parseTree(text);
  let rest = path;
  while (rest !== '') {
    const next = childAt(node, rest);
    if (next === undefined) break;
    [node, rest] = next;
  }
  return node?.offset ?? 0;
}

function childAt(node, path) {
  const index = /^\[(\d+)\]/.exec(path);
  if (index) {
    const child = findNodeAtLocation(node, [Number(index[1])]);
    return child && [child, path.slice(index[0].length)];
  }
  const name = path.replace(/^\./, '');
  const keys = (node.type === 'object' ? node.children : []).map((property) => property.children[0].value);
  const key = keys
    .filter((each) => name.startsWith(each) && /^($|[.[])/.test(name.slice(each.length)))
    .sort((one, other) => other.length - one.length)[0];
  const child = key === undefined ? undefined : findNodeAtLocation(node, [key]);
  return child && [child, name.slice(key.length)];
}
