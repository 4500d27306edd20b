import { expect, test } from 'vitest';
import type { SheetScore } from './sheet-parts';
import { spreadOf } from './spread';

const score = (points: number | null): SheetScore => ({
  __typename: 'Score',
  id: `s-${points}`,
  candidateId: 'c',
  criterionId: 'k',
  membershipId: 'm',
  points,
  cannotJudge: points === null,
  reason: '',
  version: 1,
});

test('takes the mean and range of those who gave points', () => {
  expect(spreadOf([score(20), score(null), score(40)])).toEqual({
    mean: 30,
    lowest: 20,
    highest: 40,
    wide: false,
  });
});

test('calls 30 points apart wide, and 29 not', () => {
  expect(spreadOf([score(10), score(40)])?.wide).toBe(true);
  expect(spreadOf([score(10), score(39)])?.wide).toBe(false);
});

test('says nothing when nobody could judge', () => {
  expect(spreadOf([score(null)])).toBeUndefined();
});
