import { expect, test } from 'vitest';
import { standing } from './limit-words';

const limit = { measure: 'FLOOR_AREA' as const, least: null, most: null, asked: '10' };

test('says by how much more is asked than allowed, exact to the hundredth', () => {
  expect(standing({ ...limit, most: '9.70' }, 'EUR')).toEqual({
    words: '0.3 more asked than allowed',
    binds: true,
  });
});

test('says how much is left below the most', () => {
  expect(standing({ ...limit, most: '12' }, 'EUR')).toEqual({ words: '2 left', binds: false });
});

test('says how far all candidates together fall short of the least', () => {
  const few = { ...limit, measure: 'CANDIDATES' as const, asked: '1', least: '3' };
  expect(standing(few, 'EUR')).toEqual({ words: '2 short of the least', binds: true });
});
