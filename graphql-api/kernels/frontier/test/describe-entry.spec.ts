import { describeEntry, describeLoss } from '../src/explain/describe-entry.js';

const pump = { id: 'pump', benefit: 300, cost: 900, most: 2 };
const exactly = (figure: number | undefined) => ({ figure, exact: true, picks: undefined });
const atLeast = (figure: number | undefined) => ({ figure, exact: false, picks: undefined });
const lossOf = (loss: number | undefined, exact: boolean): string =>
  describeLoss({ item: 'bed', benefit: undefined, loss, picks: undefined, exact });

describe('what would bring an item in, and what is lost without one, in words', () => {
  it('gives the figures per piece beside those it has, in the units of the host', () => {
    expect(
      describeEntry(pump, exactly(850), exactly(310), (figure, of) => `${figure / 100} ${of as string}`),
    ).toEqual([
      'pump would come in at a cost of 8.5 cost a piece; it costs 9 cost.',
      'pump would come in with a benefit of 3.1 benefit a piece; it has 3 benefit.',
    ]);
  });

  it('says what is not proven', () => {
    expect(describeEntry({ ...pump, most: 1 }, atLeast(850), atLeast(310))).toEqual([
      'pump would come in at a cost of 850, perhaps at a higher one; it costs 900.',
      'pump would come in with a benefit of 310, perhaps with less; it has 300.',
    ]);
    expect(describeEntry(pump, exactly(undefined), atLeast(undefined))).toEqual([
      'pump would not come in at any price.',
      'No benefit was found at which pump would come in.',
    ]);
  });

  it('tells a loss from a gain and from nothing', () => {
    expect([lossOf(12, true), lossOf(12, false), lossOf(-3, true), lossOf(0, true)]).toEqual([
      'Without bed 12 of benefit is lost at this cost.',
      'Without bed at most 12 of benefit is lost at this cost.',
      'Without bed 3 more benefit could be had for this cost.',
      'Without bed another portfolio brings the same benefit at no more cost.',
    ]);
    expect([lossOf(undefined, true), lossOf(undefined, false)]).toEqual([
      'Without bed no portfolio keeps every rule at this cost.',
      'Without bed no portfolio was found that keeps every rule at this cost.',
    ]);
  });
});
