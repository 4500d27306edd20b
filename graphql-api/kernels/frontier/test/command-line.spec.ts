import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { canonicalText } from '../src/problem/canonical-text.js';
import type { Item, Problem } from '../src/problem/problem.js';
import { parseFrontier, type ClaimedFrontier, type ClaimedPoint } from '../src/result/parse-frontier.js';
import { claimedOf, twoNeedsAndAHoistFrontier } from './claimed-frontier.js';
import { aProblem, TWO_NEEDS_AND_A_HOIST_FRONT, twoNeedsAndAHoist } from './examples.js';
import { aRandomProblem } from './seeded.js';

const script = join(__dirname, '../../../../scripts/frontier.mjs');
const folder = mkdtempSync(join(tmpdir(), 'frontier-'));
const problem = twoNeedsAndAHoist();
const problemFile = written('problem.json', problem);

afterAll(() => rmSync(folder, { recursive: true }));

describe('frontier solve', () => {
  it("writes the nine points of the format's example on standard output and nothing else", async () => {
    const { code, out, err } = await frontier('solve', problemFile, '--seed', '7', '--threads', '1');
    expect(code).toBe(0);
    const result = parseFrontier(JSON.parse(out));
    expect(result.points.map(({ cost, benefit }) => [cost, benefit])).toEqual(TWO_NEEDS_AND_A_HOIST_FRONT);
    expect(result).toMatchObject({
      problem: problem.name,
      fingerprint: fingerprintOf(problem),
      seed: 7,
      threads: 1,
    });
    expect(err).toMatch(/9 points, complete/);
    expect(await verify(result, '--prove')).toEqual(['proven']);
    const removed = { ...result, points: result.points.toSpliced(2, 1), counts: {} };
    expect(await verify(removed)).toContainEqual(
      expect.stringMatching(/^certificate\.provenStretches\[0\]: .* at a cost of 24 /),
    );
  });

  it('stops at the end of its time with what it has', async () => {
    const large = written('large.json', aRandomProblem(5, 250));
    const { code, out } = await frontier('solve', large, '--seconds', '0.001');
    expect(code).toBe(0);
    expect(parseFrontier(JSON.parse(out)).certificate.stopped).toBe(true);
  });

  it('writes what it has when it is interrupted', async () => {
    const large = written('interrupted.json', aRandomProblem(5, 250));
    const { code, out } = await frontier('solve', large, onError(/looked at/, 'SIGINT'));
    expect(code).toBe(0);
    const result = parseFrontier(JSON.parse(out));
    expect(result.certificate.stopped).toBe(true);
    expect(result.points.length).toBeGreaterThan(0);
  });

  it('says why nothing is feasible', async () => {
    const tight = aProblem(['bed'], { ceiling: 5, mustInclude: ['bed'] });
    const { code, out } = await frontier('solve', written('tight.json', tight));
    expect(code).toBe(0);
    const result = parseFrontier(JSON.parse(out));
    expect(result).toMatchObject({ points: [], certificate: { status: 'infeasible' } });
    const resultFile = written('tight-result.json', result);
    expect(await frontier('verify', written('tight.json', tight), resultFile, '--prove')).toMatchObject({
      code: 0,
    });
  });
});

describe('frontier solve with a second cost', () => {
  const three: Problem = {
    format: 'metewand-problem/1',
    ceiling: 30,
    items: [
      { id: 'bought', benefit: 8, cost: 10, secondCost: 1, oneOf: 'scanner' },
      { id: 'leased', benefit: 8, cost: 2, secondCost: 5, oneOf: 'scanner' },
      { id: 'lent', benefit: 8, cost: 2, secondCost: 6, oneOf: 'scanner' },
      { id: 'hoist', benefit: 4, cost: 7, secondCost: 2, most: 2 },
    ],
  };
  const file = written('second-cost.json', three);

  it('writes a surface that verify accepts and proves', async () => {
    const { code, out, err } = await frontier('solve', file, '--threads', '2');
    expect(code).toBe(0);
    expect(err).toMatch(/8 points, complete/);
    const result = parseFrontier(JSON.parse(out));
    expect(result).toMatchObject({ threads: 1, certificate: { provenSecondCosts: [[0, 10]] } });
    expect(result.points).toContainEqual({ benefit: 8, cost: 10, secondCost: 1, picks: { bought: 1 } });
    const resultFile = written('second-cost-result.json', result);
    const proven = await frontier('verify', file, resultFile, '--prove');
    expect({ code: proven.code, said: linesOf(proven.err) }).toEqual({ code: 0, said: ['proven'] });
  });

  it('stops at the end of its time with what it has', async () => {
    const items = aRandomProblem(5, 40).items.map((item, at) => ({ ...item, secondCost: (at * 7) % 23 }));
    const large = written('large-surface.json', { format: 'metewand-problem/1', items: withoutUses(items) });
    const { code, out } = await frontier('solve', large, '--seconds', '0.001');
    expect(code).toBe(0);
    const result = parseFrontier(JSON.parse(out));
    expect(result.certificate.stopped).toBe(true);
    expect(await frontier('verify', large, written('stopped.json', result))).toMatchObject({ code: 0 });
  });
});

describe('frontier verify', () => {
  const { points, certificate } = certified();

  it('accepts the whole frontier, and proves it', async () => {
    expect(await verify(certified())).toEqual([]);
    expect(await verify(certified(), '--prove')).toEqual(['proven']);
  });

  it('refuses picks that break a limit', async () => {
    const picks = { 'scanner-b': 1, hoist: 3, viewer: 1 };
    const broken = { ...certified(), points: points.with(7, { benefit: 123, cost: 85, picks }) };
    expect(await verify(broken, '--prove')).toContainEqual(
      'points[7].picks: The portfolio is not feasible: 2 of viewer, hoist, which exclude each other.',
    );
  });

  it('refuses a point removed from points and bound alike, by the portfolio that is missing', async () => {
    const thinned = claimedOf(
      problem,
      points.toSpliced(4, 1).map(({ picks }) => picks),
    );
    const claimed = { ...thinned, fingerprint: fingerprintOf(problem) };
    expect(await verify(claimed)).toEqual([]);
    expect(await verify(claimed, '--prove')).toEqual([
      'not proven: 1 findings',
      'certificate.bound[3]: up to a cost of 51 no benefit should be above 60, but one of benefit 63 at cost 49 is feasible: scanner-b, viewer.',
    ]);
  });

  it('refuses a cheapest and a dearest point removed', async () => {
    const portfolios = points.slice(0, -1).map(({ picks }) => picks);
    const withoutDearest = { ...claimedOf(problem, portfolios), fingerprint: fingerprintOf(problem) };
    expect(await verify(withoutDearest, '--prove')).toContainEqual(
      'certificate.bound[7]: up to a cost of 100 no benefit should be above 108, but one of benefit 120 at cost 91 is feasible: scanner-a, 3 × hoist.',
    );
    const withoutCheapest = points.slice(1).map(({ picks }) => picks);
    const claimed = { ...claimedOf(problem, withoutCheapest), fingerprint: fingerprintOf(problem) };
    const bounded = {
      ...claimed,
      certificate: {
        ...claimed.certificate,
        status: 'bounded' as const,
        provenStretches: [[12, 100]] as const,
      },
    };
    expect(await verify(bounded, '--prove')).toContainEqual(
      'certificate.bound[0]: up to a cost of 11 there should be no portfolio, but one of benefit 0 at cost 0 is feasible: the empty portfolio.',
    );
  });

  it('refuses a bound below a true point, whether the point is listed or not', async () => {
    const bound = certificate.bound.with(5, [52, 67]);
    const lowered = {
      ...certificate,
      status: 'bounded' as const,
      bound,
      provenStretches: [],
      hypervolumeBound: undefined,
    };
    expect(await verify({ ...certified(), certificate: lowered }, '--prove')).toEqual([
      'points[5].benefit: The benefit is 68, above the bound at its cost of 52, which is 67.',
    ]);
    const unlisted = {
      ...certified(),
      points: points.toSpliced(5, 1),
      counts: {},
      certificate: { ...lowered, hypervolume: undefined },
    };
    expect(await verify(unlisted)).toEqual([]);
    expect(await verify(unlisted, '--prove')).toContainEqual(
      'certificate.bound[5]: up to a cost of 63 no benefit should be above 67, but one of benefit 68 at cost 52 is feasible: scanner-b, hoist.',
    );
  });

  it('accepts a bound that lies above', async () => {
    const bound = [[0, 45.5] as const, [30, 70.25] as const, [60, 130] as const];
    const loose = {
      ...certificate,
      status: 'bounded' as const,
      bound,
      provenStretches: [],
      hypervolumeBound: undefined,
    };
    expect(await verify({ ...certified(), certificate: loose }, '--prove')).toEqual(['proven']);
  });

  it('refuses to prove what claims no proof, and that nothing is feasible where something is', async () => {
    const nothing = { bound: [], provenStretches: [], hypervolumeBound: undefined };
    const unproven = { ...certificate, ...nothing, status: 'unproven' as const };
    expect(await verify({ ...certified(), certificate: unproven }, '--prove')).toContainEqual(
      'certificate.status: It is unproven: nothing is claimed that could be proven.',
    );
    const infeasible = { ...certificate, ...nothing, hypervolume: 0, status: 'infeasible' as const };
    const claimed = {
      ...certified(),
      points: [],
      counts: {},
      notes: ['It cannot be.'],
      certificate: infeasible,
    };
    expect(await verify(claimed, '--prove')).toContainEqual(
      expect.stringMatching(
        /^certificate\.status: at any cost there should be no portfolio, but one of benefit/,
      ),
    );
  });

  it('proves a surface of three objectives, and refuses it with a point removed', async () => {
    const three: Problem = {
      format: 'metewand-problem/1',
      items: [
        { id: 'bed', benefit: 6, cost: 4, secondCost: 1 },
        { id: 'lift', benefit: 6, cost: 3, secondCost: 5 },
        { id: 'lamp', benefit: 1, cost: 1, secondCost: 1 },
      ],
      eitherOr: [['bed', 'lift', 'lamp']],
    };
    const file = written('three.json', three);
    const surface: ClaimedPoint[] = [
      { benefit: 0, cost: 0, secondCost: 0, picks: {} },
      { benefit: 1, cost: 1, secondCost: 1, picks: { lamp: 1 } },
      { benefit: 6, cost: 3, secondCost: 5, picks: { lift: 1 } },
      { benefit: 6, cost: 4, secondCost: 1, picks: { bed: 1 } },
    ];
    const claim = (claimed: ClaimedPoint[]): ClaimedFrontier => ({
      format: 'metewand-frontier/1',
      fingerprint: fingerprintOf(three),
      points: claimed,
      certificate: {
        status: 'complete',
        bound: [[0, 0] as const, [1, 1] as const, [3, 6] as const],
        surfaceBound: claimed.map(
          ({ benefit, cost, secondCost = 0 }) => [cost, benefit, secondCost] as const,
        ),
      },
    });
    const prove = async (claimed: ClaimedPoint[]): Promise<string[]> => {
      const { err } = await frontier('verify', file, written('surface.json', claim(claimed)), '--prove');
      return linesOf(err);
    };
    expect(await prove(surface)).toEqual(['proven']);
    expect(await prove(surface.toSpliced(3, 1))).toContainEqual(
      'points: up to a second cost of 4 no benefit should be above 1, but one of benefit 6 at cost 4 is feasible: bed.',
    );
  });
});

describe('a broken file', () => {
  const item = { id: 'bed', benefit: 1, cost: 1 };
  const start = '{\n  "format": "metewand-problem/1",\n  "items": [';

  it.each<[string, string, RegExp]>([
    [
      'an unknown key',
      `${start}],\n  "budget": 4\n}`,
      /:4:13: budget: expected one of the keys .*, found an unknown key\.$/,
    ],
    [
      'a wrong figure',
      `${start}\n    { "id": "bed", "benefit": 1,\n      "cost": -3 }]\n}`,
      /:5:15: items\[0\]\.cost: expected a whole number of at least 0, found -3\.$/,
    ],
    [
      'a missing key',
      `${start}\n    { "id": "bed", "benefit": 1 }]\n}`,
      /:4:5: items\[0\]\.cost: expected a value, found nothing\.$/,
    ],
    [
      'an unknown item',
      JSON.stringify(aProblem(['bed'], { mustInclude: ['lamp'] })),
      /:1:\d+: mustInclude\[0\]: expected the id of an item, found "lamp"\.$/,
    ],
    [
      'an item twice',
      JSON.stringify({ ...aProblem([]), items: [item, item] }),
      /: items\[1\]\.id: expected a name not used before/,
    ],
    [
      'another format',
      JSON.stringify({ ...problem, format: 'x' }),
      /:1:11: format: expected "metewand-problem\/1", found "x"\.$/,
    ],
    ['no object', '[]', /:1:1: expected an object, found a list\.$/],
    [
      'a missing comma',
      `${start}]\n  "ceiling": 4\n}`,
      /:4:3: .*expected a comma or the end of the list or object, found '"ceiling": 4'\.$/,
    ],
    ['a comma too many', `${start}],\n}`, /:4:1: .*expected a key in quotation marks, found '}'\.$/],
    ['a key without quotation marks', `${start}],\n  ceiling: 4\n}`, /:4:3: .*expected /],
    ['an open end', `${start}`, /:3:13: items.*: expected .*, found the end of the file\.$/],
    ['a comment', `// mine\n${start}]}`, /:1:1: expected no comment/],
    [
      'an odd value',
      `${start}],\n  "ceiling": none\n}`,
      /:4:14: ceiling: expected a value: .*, found 'none'\.$/,
    ],
    [
      'a key twice',
      `${start}],\n  "ceiling": 4,\n  "ceiling": 5\n}`,
      /:5:3: ceiling: expected a key once, found it again\.$/,
    ],
    ['nothing in it', '', /:1:1: expected a value, found the end of the file\.$/],
    ['more after the end', `${start}]}\nx`, /:4:1: .*expected the end of the file, found 'x'\.$/],
  ])('is refused with %s', async (_, text, message) => {
    const file = join(folder, 'broken.json');
    writeFileSync(file, text);
    const { code, out, err } = await frontier('solve', file);
    expect(err.trim()).toMatch(message);
    expect(err.startsWith(file)).toBe(true);
    expect({ code, out }).toEqual({ code: 2, out: '' });
  });

  it('is refused when it is no text in UTF-8, too deep or not there', async () => {
    const file = join(folder, 'bytes.json');
    writeFileSync(file, Buffer.from([0x7b, 0x0a, 0x22, 0xff, 0x22]));
    expect(await frontier('solve', file)).toMatchObject({
      code: 2,
      err: `${file}:2:2: expected text in UTF-8, found bytes that are none.\n`,
    });
    writeFileSync(file, '['.repeat(200_000));
    expect(await frontier('solve', file)).toMatchObject({
      code: 2,
      err: `${file}: it is nested too deep.\n`,
    });
    const missing = join(folder, 'missing.json');
    expect(await frontier('solve', missing)).toMatchObject({
      code: 2,
      err: `${missing}: it cannot be read (ENOENT).\n`,
    });
  });

  it('is refused as a result too', async () => {
    const file = written('odd-result.json', {
      ...certified(),
      points: [{ benefit: 0, cost: 0, picks: { hoist: 0.5 } }],
    });
    const { code, err } = await frontier('verify', problemFile, file);
    expect(code).toBe(2);
    expect(err).toMatch(
      /odd-result\.json:1:\d+: points\[0\]\.picks\.hoist: expected a whole number of at least 1, found 0\.5\./,
    );
  });
});

describe('a command line that cannot be followed', () => {
  it.each([
    [[], /What is to be done\?/],
    [['solv', 'x'], /There is no command solv/],
    [['solve'], /Expected the file of a problem, found 0 names/],
    [['solve', 'a', 'b'], /found 2 names/],
    [['verify', 'a'], /Expected the file of a problem and of a result, found 1 names/],
    [['solve', 'a', '--speed', '3'], /--speed/],
    [['solve', 'a', '--prove'], /--prove/],
    [['solve', 'a', '--seconds', 'soon'], /--seconds: expected a number above 0, found "soon"/],
    [['solve', 'a', '--seconds', '0'], /--seconds: expected a number above 0, found "0"/],
    [['solve', 'a', '--seed', '1.5'], /--seed: expected a whole number from 0/],
    [['solve', 'a', '--threads', '0'], /--threads: expected a whole number from 1 to 64, found "0"/],
  ])('is answered with the usage: %j', async (args, message) => {
    const { code, out, err } = await frontier(...args);
    expect(err).toMatch(message);
    expect(err).toMatch(/Usage:/);
    expect({ code, out }).toEqual({ code: 2, out: '' });
  });
});

function withoutUses(items: readonly Item[]): Item[] {
  return items.map((item) => ({ ...item, uses: [] }));
}

function certified(): ClaimedFrontier {
  return { ...twoNeedsAndAHoistFrontier(), fingerprint: fingerprintOf(problem) };
}

/** The lines on standard error; the exit code must fit them. */
async function verify(claimed: ClaimedFrontier, ...options: string[]): Promise<string[]> {
  const { code, out, err } = await frontier(
    'verify',
    problemFile,
    written('claimed.json', claimed),
    ...options,
  );
  const lines = linesOf(err);
  expect({ code, out }).toEqual({ code: lines.every((line) => line === 'proven') ? 0 : 1, out: '' });
  return lines;
}

/** Without the seconds in front of progress. */
function linesOf(err: string): string[] {
  const lines = err.split('\n').map((line) => line.replace(/^[\d.]+ s {2}/, ''));
  return lines.filter((line) => line !== '' && !line.endsWith('steps proven'));
}

interface Reaction {
  readonly to: RegExp;
  readonly signal: NodeJS.Signals;
}

function onError(to: RegExp, signal: NodeJS.Signals): Reaction {
  return { to, signal };
}

/** Runs the command line as a process of its own; a reaction sends it a signal once it has said something. */
function frontier(
  ...args: (string | Reaction)[]
): Promise<{ code: number | null; out: string; err: string }> {
  const words = args.filter((arg) => typeof arg === 'string');
  let reaction = args.find((arg) => typeof arg !== 'string');
  const child = spawn(process.execPath, [script, ...words], { stdio: ['ignore', 'pipe', 'pipe'] });
  let out = '';
  let err = '';
  child.stdout.setEncoding('utf8').on('data', (text: string) => (out += text));
  child.stderr.setEncoding('utf8').on('data', (text: string) => {
    err += text;
    if (!reaction?.to.test(err)) return;
    child.kill(reaction.signal);
    reaction = undefined;
  });
  return new Promise((resolve, reject) => {
    child.on('error', reject).on('close', (code) => resolve({ code, out, err }));
  });
}

function written(name: string, document: unknown): string {
  const file = join(folder, name);
  writeFileSync(file, JSON.stringify(document));
  return file;
}

function fingerprintOf(document: unknown): string {
  return `sha256:${createHash('sha256').update(canonicalText(document)).digest('hex')}`;
}
