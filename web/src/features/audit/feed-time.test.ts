import { expect, test } from 'vitest';
import { feedTime } from './feed-time';

const now = new Date(2026, 2, 18, 16, 0);
const at = (month: number, day: number, hour = 14) => new Date(2026, month - 1, day, hour, 2).toISOString();

test('writes the hour today, the weekday within a week, else the day', () => {
  expect(feedTime(at(3, 18), now)).toBe('14:02');
  expect(feedTime(at(3, 16), now)).toBe('Mon\u00a016');
  expect(feedTime(at(2, 3), now)).toBe('3\u00a0Feb');
});
