import { ProblemError } from '../src/problem/problem-error.js';
import { parseFrontier } from '../src/result/parse-frontier.js';
import { toFrontierDocument } from '../src/result/frontier-document.js';
import { SOME_FINGERPRINT, twoNeedsAndAHoistFrontier } from './claimed-frontier.js';
import { twoNeedsAndAHoist } from './examples.js';
import { runToEnd } from './run-search.js';

const written = (document: object): unknown => JSON.parse(JSON.stringify(document));
const whole = twoNeedsAndAHoistFrontier();
const withPoint = (point: object): object => ({ ...whole, points: [point] });
const withCertificate = (part: object): object => ({
  ...whole,
  certificate: { ...whole.certificate, ...part },
});

describe('a frontier read from JSON', () => {
  it('comes back as it was written', () => {
    expect(parseFrontier(written(whole))).toEqual(whole);
  });

  it('is what the search writes', () => {
    const problem = twoNeedsAndAHoist();
    const facts = { fingerprint: SOME_FINGERPRINT, threads: 1, seconds: 0.5 };
    const document = toFrontierDocument(problem, runToEnd(problem), facts);
    expect(parseFrontier(written(document))).toEqual(document);
    expect(document.certificate.rules.ties).not.toBe('');
  });

  it('needs no more than format, fingerprint, points, status and bound', () => {
    const least = {
      format: 'metewand-frontier/1',
      fingerprint: SOME_FINGERPRINT,
      points: [],
      certificate: { status: 'unproven', bound: [] },
    };
    expect(parseFrontier(least)).toEqual(least);
  });

  it('may carry a second cost', () => {
    const points = [{ benefit: 4, cost: 2, secondCost: 1, picks: { bed: 1 } }];
    const part = { surfaceBound: [[2, 4, 1]], provenSecondCosts: [[0, 9]] };
    const document = { ...withCertificate(part), points };
    expect(parseFrontier(written(document))).toEqual(document);
  });

  it.each<[string, unknown, string, RegExp]>([
    ['no object', [], '', /an object, found a list/],
    ['another format', { ...whole, format: 'metewand-problem/1' }, 'format', /"metewand-frontier\/1"/],
    ['no fingerprint', { ...whole, fingerprint: undefined }, 'fingerprint', /a value, found nothing/],
    ['a short fingerprint', { ...whole, fingerprint: 'sha256:12' }, 'fingerprint', /64 hex digits/],
    [
      'an unknown key',
      { ...whole, author: 'x' },
      'author',
      /one of the keys .*points.*, found an unknown key/,
    ],
    ['half a seed', { ...whole, seed: 1.5 }, 'seed', /a whole number, found 1.5/],
    ['no thread', { ...whole, threads: 0 }, 'threads', /at least 1, found 0/],
    ['negative time', { ...whole, seconds: -1 }, 'seconds', /at least 0, found -1/],
    ['time as text', { ...whole, seconds: '1' }, 'seconds', /a number, found "1"/],
    ['points that are no list', { ...whole, points: {} }, 'points', /a list, found an object/],
    ['a point without picks', withPoint({ benefit: 1, cost: 1 }), 'points[0].picks', /a value/],
    ['picks that are a list', withPoint({ benefit: 1, cost: 1, picks: [] }), 'points[0].picks', /an object/],
    [
      'half a piece',
      withPoint({ benefit: 1, cost: 1, picks: { bed: 0.5 } }),
      'points[0].picks.bed',
      /at least 1, found 0.5/,
    ],
    ['no piece', withPoint({ benefit: 1, cost: 1, picks: { bed: 0 } }), 'points[0].picks.bed', /found 0/],
    ['half a benefit', withPoint({ benefit: 1.5, cost: 1, picks: {} }), 'points[0].benefit', /found 1.5/],
    ['a cost below zero', withPoint({ benefit: 1, cost: -1, picks: {} }), 'points[0].cost', /found -1/],
    [
      'a second cost as text',
      withPoint({ benefit: 1, cost: 1, secondCost: '1', picks: {} }),
      'points[0].secondCost',
      /found "1"/,
    ],
    [
      'an unknown status',
      withCertificate({ status: 'done' }),
      'certificate.status',
      /one of complete, bounded, unproven, infeasible, found "done"/,
    ],
    [
      'half of the rules',
      withCertificate({ rules: { dominance: 'more' } }),
      'certificate.rules.ties',
      /a value, found nothing/,
    ],
    [
      'rules of numbers',
      withCertificate({ rules: { dominance: 1, ties: 'none' } }),
      'certificate.rules.dominance',
      /a text, found 1/,
    ],
    ['no bound', withCertificate({ bound: undefined }), 'certificate.bound', /a value, found nothing/],
    [
      'a step of three',
      withCertificate({ bound: [[1, 2, 3]] }),
      'certificate.bound[0]',
      /a list of 2 numbers, found a list of 3/,
    ],
    [
      'a step of text',
      withCertificate({ bound: [['1', 2]] }),
      'certificate.bound[0][0]',
      /a number, found "1"/,
    ],
    [
      'half a stretch',
      withCertificate({ provenStretches: [[1]] }),
      'certificate.provenStretches[0]',
      /a list of 2 numbers, found a list of 1/,
    ],
    ['an area of text', withCertificate({ hypervolume: 'x' }), 'certificate.hypervolume', /a number/],
    [
      'a reference of one',
      withCertificate({ reference: { cost: 1 } }),
      'certificate.reference.benefit',
      /a value/,
    ],
    ['stopped in words', withCertificate({ stopped: 'yes' }), 'certificate.stopped', /true or false/],
    ['an unknown count', { ...whole, counts: { seen: 1 } }, 'counts.seen', /an unknown key/],
    ['notes of numbers', { ...whole, notes: [1] }, 'notes[0]', /a text, found 1/],
  ])('is refused with %s', (_, json, path, message) => {
    expect(() => parseFrontier(json)).toThrow(ProblemError);
    expect(() => parseFrontier(json)).toThrow(expect.objectContaining({ path }));
    expect(() => parseFrontier(json)).toThrow(message);
  });
});
