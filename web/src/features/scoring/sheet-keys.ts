/** A place on the sheet: row of the candidate, column of the criterion. */
export interface Place {
  row: number;
  column: number;
}

type SheetAction =
  | { kind: 'move'; to: Place }
  | { kind: 'type'; digit: string }
  | { kind: 'erase' }
  | { kind: 'note' }
  | { kind: 'cannot-judge' }
  | { kind: 'restore' };

/** What a key does on the sheet: arrows and Home/End move, digits type, Enter goes on, N notes, X cannot judge. */
export function sheetAction(
  key: string,
  { row, column }: Place,
  rows: number,
  columns: number,
): SheetAction | undefined {
  const to = (nextRow: number, nextColumn: number): SheetAction => ({
    kind: 'move',
    to: { row: within(nextRow, rows), column: within(nextColumn, columns) },
  });
  if (/^\d$/u.test(key)) return { kind: 'type', digit: key };
  switch (key) {
    case 'ArrowUp':
      return to(row - 1, column);
    case 'ArrowDown':
    case 'Enter':
      return to(row + 1, column);
    case 'ArrowLeft':
      return to(row, column - 1);
    case 'ArrowRight':
      return to(row, column + 1);
    case 'Home':
      return to(row, 0);
    case 'End':
      return to(row, columns - 1);
    case 'PageUp':
      return to(row - 10, column);
    case 'PageDown':
      return to(row + 10, column);
    case 'Backspace':
    case 'Delete':
      return { kind: 'erase' };
    case 'Escape':
      return { kind: 'restore' };
    case 'n':
    case 'N':
      return { kind: 'note' };
    case 'x':
    case 'X':
      return { kind: 'cannot-judge' };
    default:
      return undefined;
  }
}

function within(index: number, count: number): number {
  return Math.min(count - 1, Math.max(0, index));
}
