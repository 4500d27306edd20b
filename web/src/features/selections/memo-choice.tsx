import { Select } from '../../ui/field';
import type { SelectionMemo } from './selection-memo';
import { DECISION_WORDS, memoCode } from './selection-words';

interface MemoChoiceProps {
  selections: readonly SelectionMemo[];
  decisionDate: string;
  chosen: number;
  onChoose: (number: number) => void;
}

/** Which memo of the round to read, when there are several. */
export function MemoChoice({ selections, decisionDate, chosen, onChoose }: MemoChoiceProps) {
  if (selections.length < 2) return null;
  const options = selections.map(({ number, state }) => ({
    value: String(number),
    label: `Memo ${memoCode(decisionDate, number)}, ${DECISION_WORDS[state].toLowerCase()}`,
  }));
  return (
    <Select
      aria-label="Memo"
      value={String(chosen)}
      options={options}
      onChange={(event) => onChoose(Number(event.target.value))}
    />
  );
}
