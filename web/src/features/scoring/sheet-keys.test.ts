import { expect, test } from 'vitest';
import { sheetAction } from './sheet-keys';

const act = (key: string, place = { row: 1, column: 1 }) => sheetAction(key, place, 3, 4);

test('moves by arrows, goes on by Enter and stays on the sheet at its edges', () => {
  expect(act('ArrowDown')).toEqual({ kind: 'move', to: { row: 2, column: 1 } });
  expect(act('Enter')).toEqual({ kind: 'move', to: { row: 2, column: 1 } });
  expect(act('ArrowDown', { row: 2, column: 1 })).toEqual({ kind: 'move', to: { row: 2, column: 1 } });
  expect(act('ArrowLeft', { row: 0, column: 0 })).toEqual({ kind: 'move', to: { row: 0, column: 0 } });
  expect(act('End')).toEqual({ kind: 'move', to: { row: 1, column: 3 } });
});

test('types digits and leaves every other key to the browser', () => {
  expect(act('7')).toEqual({ kind: 'type', digit: '7' });
  expect(act('x')).toEqual({ kind: 'cannot-judge' });
  expect(act('n')).toEqual({ kind: 'note' });
  expect(act('Tab')).toBeUndefined();
  expect(act('a')).toBeUndefined();
});
