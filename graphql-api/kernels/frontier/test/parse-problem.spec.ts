import { canonicalText } from '../src/problem/canonical-text.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { ProblemError } from '../src/problem/problem-error.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';

const withItem = (item: object): object => ({ format: 'metewand-problem/1', items: [item] });
const bed = { id: 'bed', benefit: 1, cost: 1 };
const limits = [{ name: 'days', most: 3 }];

describe('a problem read from JSON', () => {
  it('comes back as it was written', () => {
    expect(parseProblem(JSON.parse(JSON.stringify(twoNeedsAndAHoist())))).toEqual(twoNeedsAndAHoist());
    expect(parseProblem(aProblem(['bed'], { ceiling: undefined }))).toEqual(aProblem(['bed']));
  });

  it.each<[unknown, string, RegExp]>([
    [null, '', /an object, found null/],
    [[], '', /an object, found a list/],
    [{ items: [] }, 'format', /a value, found nothing/],
    [
      { format: 'metewand-problem/2', items: [] },
      'format',
      /"metewand-problem\/1", found "metewand-problem\/2"/,
    ],
    [{ format: 'metewand-problem/1' }, 'items', /a value, found nothing/],
    [{ ...aProblem([]), budget: 4 }, 'budget', /one of the keys .*ceiling.*, found an unknown key/],
    [{ ...aProblem([]), name: 'x'.repeat(201) }, 'name', /at most 200 characters/],
    [{ ...aProblem([]), ceiling: -1 }, 'ceiling', /a whole number of at least 0, found -1/],
    [{ ...aProblem([]), ceiling: 1.5 }, 'ceiling', /a whole number of at least 0, found 1.5/],
    [{ ...aProblem([]), ceiling: '5' }, 'ceiling', /a whole number of at least 0, found "5"/],
    [{ ...aProblem([]), ceiling: null }, 'ceiling', /found null/],
    [{ ...aProblem([]), ceiling: 2 ** 53 }, 'ceiling', /below 2\^53/],
    [{ ...aProblem([]), leastBenefit: -2 }, 'leastBenefit', /at least 0, found -2/],
    [{ ...aProblem([]), items: {} }, 'items', /a list, found an object/],
    [withItem({ benefit: 1, cost: 1 }), 'items[0].id', /a value/],
    [withItem({ ...bed, id: '' }), 'items[0].id', /1 to 100 characters/],
    [withItem({ ...bed, id: 7 }), 'items[0].id', /found 7/],
    [withItem({ ...bed, benefit: -1 }), 'items[0].benefit', /at least 0, found -1/],
    [withItem({ ...bed, benefit: 0.5 }), 'items[0].benefit', /found 0.5/],
    [withItem({ ...bed, cost: -1 }), 'items[0].cost', /at least 0, found -1/],
    [withItem({ ...bed, cost: NaN }), 'items[0].cost', /found NaN/],
    [withItem({ ...bed, price: 3 }), 'items[0].price', /an unknown key/],
    [withItem({ ...bed, most: 0 }), 'items[0].most', /from 1 to 1000, found 0/],
    [withItem({ ...bed, most: 1001 }), 'items[0].most', /from 1 to 1000, found 1001/],
    [withItem({ ...bed, oneOf: '' }), 'items[0].oneOf', /not empty/],
    [withItem({ ...bed, secondCost: -3 }), 'items[0].secondCost', /found -3/],
    [withItem({ ...bed, uses: [1] }), 'items[0].uses', /0 figures, one per limit, found 1/],
    [{ ...withItem({ ...bed, uses: [1, 2] }), limits }, 'items[0].uses', /1 figures, one per limit, found 2/],
    [{ ...withItem({ ...bed, uses: [0.5] }), limits }, 'items[0].uses[0]', /found 0.5/],
    [withItem({ ...bed, needs: ['lamp'] }), 'items[0].needs[0]', /a list, found "lamp"/],
    [withItem({ ...bed, needs: [[]] }), 'items[0].needs[0]', /at least 1, found a list of 0/],
    [withItem({ ...bed, needs: [['lamp']] }), 'items[0].needs[0][0]', /the id of an item, found "lamp"/],
    [{ ...aProblem(['bed', 'bed']) }, 'items[1].id', /not used before in its list, found "bed" again/],
    [aProblem(['bed'], { mustInclude: ['lamp'] }), 'mustInclude[0]', /the id of an item/],
    [aProblem(['bed'], { mustInclude: ['bed', 'bed'] }), 'mustInclude[1]', /"bed" again/],
    [aProblem(['bed'], { leaveOut: ['lamp'] }), 'leaveOut[0]', /the id of an item/],
    [
      aProblem(['bed'], { mustInclude: ['bed'], leaveOut: ['bed'] }),
      'leaveOut[0]',
      /mustInclude does not name/,
    ],
    [aProblem(['bed'], { eitherOr: [['bed']] }), 'eitherOr[0]', /at least 2, found a list of 1/],
    [aProblem(['bed'], { eitherOr: [['bed', 'lamp']] }), 'eitherOr[0][1]', /the id of an item/],
    [aProblem(['bed'], { counts: [{ items: ['lamp'] }] }), 'counts[0].items[0]', /the id of an item/],
    [
      aProblem(['bed'], { counts: [{ items: ['bed'], least: 3, most: 2 }] }),
      'counts[0].least',
      /at most 2, its most/,
    ],
    [
      aProblem([], {
        counts: [
          { name: 'a', items: [] },
          { name: 'a', items: [] },
        ],
      }),
      'counts[1].name',
      /again/,
    ],
    [aProblem([], { limits: [...limits, ...limits] }), 'limits[1].name', /"days" again/],
    [
      aProblem([], { limits: [{ name: 'days', most: 2, least: 3 }] }),
      'limits[0].least',
      /at most 2, its most, found 3/,
    ],
    [{ ...aProblem([]), limits: [{ name: 'days' }] }, 'limits[0].most', /a value, found nothing/],
    [{ ...aProblem([]), limits: Array(33).fill(limits[0]) }, 'limits', /at most 32, found a list of 33/],
    [withItem({ ...bed, cost: 2 ** 52, most: 3 }), 'items[0].cost', /a sum over all pieces below 2\^53/],
    [{ ...withItem({ ...bed, uses: [-(2 ** 52)], most: 3 }), limits }, 'items[0].uses[0]', /below 2\^53/],
  ])('is refused: %j', (json, path, message) => {
    const refusal = refusalOf(json);
    expect(refusal.path).toBe(path);
    expect(refusal.message).toMatch(message);
  });

  function refusalOf(json: unknown): ProblemError {
    try {
      parseProblem(json);
    } catch (error) {
      if (error instanceof ProblemError) return error;
      throw error;
    }
    throw new Error('It was accepted.');
  }
});

describe('the canonical text', () => {
  it('sorts keys at every depth, keeps lists in order and has no white space', () => {
    expect(canonicalText({ b: [{ d: 1, c: 'x y' }, 2], a: null, '10': true, '9': 0.5 })).toBe(
      '{"10":true,"9":0.5,"a":null,"b":[{"c":"x y","d":1},2]}',
    );
  });

  it('is the same for a problem and for the document it was read from', () => {
    const document = { items: [], name: 'a "round"', format: 'metewand-problem/1' };
    expect(canonicalText(parseProblem(document))).toBe(
      '{"format":"metewand-problem/1","items":[],"name":"a \\"round\\""}',
    );
    expect(canonicalText(document)).toBe(canonicalText(parseProblem(document)));
  });
});
