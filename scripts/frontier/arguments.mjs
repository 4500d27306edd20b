import { parseArgs } from 'node:util';

export const usage = `Usage:
  npm run -s frontier -- solve problem.json [--seconds s] [--seed n] [--threads n]
  npm run -s frontier -- verify problem.json result.json [--prove] [--seconds s]

solve   writes the frontier on standard output, progress on standard error
        --seconds  ends the search after so long, with what it has (no limit if left out)
        --seed     the same seed gives the same frontier (1)
        --threads  threads to search with (1; a second cost is searched on one)
verify  ends with 0 if the frontier holds, else with 1 and the reasons on standard error
        --prove    proves with another solver that nothing is missing
        --seconds  the most that one step of the proof may take (60)`;

/** A command line that cannot be followed; the message says why. */
export class UsageError extends Error {}

/** What the command line asks for; a UsageError is returned, not thrown, for it is an answer too. */
export function readArguments(args) {
  try {
    const [command, ...rest] = args;
    if (command === 'solve') return { command, ...solveRequest(rest) };
    if (command === 'verify') return { command, ...verifyRequest(rest) };
    return new UsageError(command === undefined ? 'What is to be done?' : `There is no command ${command}.`);
  } catch (error) {
    if (error instanceof UsageError) return error;
    if (String(error.code).startsWith('ERR_PARSE_ARGS')) return new UsageError(error.message);
    throw error;
  }
}

function solveRequest(args) {
  const { values, positionals } = parse(args, ['seconds', 'seed', 'threads']);
  const [problemPath] = files(positionals, ['a problem']);
  return {
    problemPath,
    seconds: number(values, 'seconds', { above: 0 }) ?? Infinity,
    seed: number(values, 'seed', { whole: true, least: 0, most: 2 ** 32 - 1 }) ?? 1,
    threads: number(values, 'threads', { whole: true, least: 1, most: 64 }) ?? 1,
  };
}

function verifyRequest(args) {
  const { values, positionals } = parse(args, ['seconds'], { prove: { type: 'boolean' } });
  const [problemPath, resultPath] = files(positionals, ['a problem', 'a result']);
  return {
    problemPath,
    resultPath,
    prove: values.prove ?? false,
    seconds: number(values, 'seconds', { above: 0 }) ?? 60,
  };
}

function parse(args, figures, flags = {}) {
  const options = Object.fromEntries(figures.map((name) => [name, { type: 'string' }]));
  return parseArgs({ args, options: { ...options, ...flags }, allowPositionals: true, strict: true });
}

function files(positionals, wanted) {
  if (positionals.length === wanted.length) return positionals;
  throw new UsageError(`Expected the file of ${wanted.join(' and of ')}, found ${positionals.length} names.`);
}

function number(values, name, { whole = false, least = -Infinity, most = Infinity, above = -Infinity }) {
  const text = values[name];
  if (text === undefined) return undefined;
  const value = text.trim() === '' ? NaN : Number(text);
  const fits = Number.isFinite(value) && value >= least && value <= most && value > above;
  if (fits && (!whole || Number.isInteger(value))) return value;
  const expected = whole ? `a whole number from ${least} to ${most}` : `a number above ${above}`;
  throw new UsageError(`--${name}: expected ${expected}, found "${text}".`);
}
