import { beforeEach, expect, test } from 'vitest';
import { setConventions } from './conventions';
import {
  daysUntil,
  formatDate,
  formatDayMonth,
  formatInstant,
  formatInstantInFull,
  timeLeft,
  today,
} from './dates';

const spaced = (text: string) => text.replaceAll('\u00a0', ' ');

beforeEach(() => setConventions({ locale: 'de-DE', timeZone: 'Europe/Berlin' }));

test('writes calendar dates as they are, whatever the zone', () => {
  expect(spaced(formatDate('2026-04-30'))).toBe('30 Apr 2026');
  expect(spaced(formatDayMonth('2026-01-01'))).toBe('1 Jan');
});

test('counts days by the calendar of the clinic group', () => {
  const lateEveningUtc = new Date('2026-03-16T23:30:00Z');
  expect(today(lateEveningUtc)).toBe('2026-03-17');
  expect(daysUntil('2026-04-30', lateEveningUtc)).toBe(44);
});

test.each([
  ['2026-04-30', '44 days left'],
  ['2026-03-18', '1 day left'],
  ['2026-03-17', 'Due today'],
  ['2026-03-14', '3 days late'],
])('says how long until %s', (date, text) => {
  expect(spaced(timeLeft(date, new Date('2026-03-17T12:00:00Z')))).toBe(text);
});

test('counts whole days across the change to summer time', () => {
  expect(daysUntil('2026-03-30', new Date('2026-03-28T12:00:00Z'))).toBe(2);
});

test('writes instants by how long ago they were', () => {
  const now = new Date(2026, 2, 17, 15, 0);
  expect(formatInstant(new Date(2026, 2, 17, 14, 10).toISOString(), now)).toBe('Today, 14:10');
  expect(spaced(formatInstant(new Date(2026, 2, 16, 9, 5).toISOString(), now))).toBe('Mon 16, 09:05');
  expect(spaced(formatInstant(new Date(2026, 1, 3, 9, 5).toISOString(), now))).toBe('3 Feb 2026, 09:05');
  expect(spaced(formatInstantInFull(new Date(2026, 2, 17, 14, 10).toISOString()))).toBe('17 Mar 2026, 14:10');
});
