import { useRef, useState } from 'react';
import type { KeyboardEvent } from 'react';
import styled from 'styled-components';
import { formatNumber, formatPercent } from '../../lib/money';
import { ownBenefit } from './own-benefit';
import { ScoreCell } from './score-cell';
import type { SheetCandidate, SheetCriterion } from './sheet-parts';
import { sheetAction } from './sheet-keys';
import type { Place } from './sheet-keys';
import type { OwnScores } from './use-own-scores';

interface ScoreGridProps {
  candidates: readonly SheetCandidate[];
  criteria: readonly SheetCriterion[];
  scores: OwnScores;
  place: Place;
  onMove: (place: Place) => void;
  onNote: () => void;
  onProblem: (message: string | undefined) => void;
}

/** Candidates × criteria as an ARIA grid with one tab stop. A score is saved when its cell is left. */
export function ScoreGrid({
  candidates,
  criteria,
  scores,
  place,
  onMove,
  onNote,
  onProblem,
}: ScoreGridProps) {
  const cells = useRef(new Map<string, HTMLTableCellElement>());
  const [draft, setDraft] = useState<string>();

  function commit() {
    if (draft === undefined) return;
    setDraft(undefined);
    if (draft === '') return;
    const points = Number(draft);
    if (points > 100) return onProblem(`Scores go from 0 to 100, so ${draft} was not kept.`);
    onProblem(undefined);
    save(points, false);
  }

  function save(points: number | null, cannotJudge: boolean) {
    const candidateId = candidates[place.row]!.id;
    const criterionId = criteria[place.column]!.id;
    const reason = scores.at(candidateId, criterionId)?.reason ?? '';
    void scores.save({ candidateId, criterionId, points, cannotJudge, reason });
  }

  function keyDown(event: KeyboardEvent) {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const action = sheetAction(event.key, place, candidates.length, criteria.length);
    if (!action) return;
    event.preventDefault();
    if (action.kind === 'type') setDraft(`${draft ?? ''}${action.digit}`.slice(0, 3));
    if (action.kind === 'erase') setDraft((draft ?? '').slice(0, -1));
    if (action.kind === 'restore') setDraft(undefined);
    if (action.kind === 'cannot-judge') {
      setDraft(undefined);
      save(null, true);
    }
    if (action.kind === 'note') {
      commit();
      onNote();
    }
    if (action.kind === 'move') cells.current.get(keyOf(action.to))?.focus();
  }

  return (
    <Scroll>
      <Grid role="grid" aria-label="Your scores">
        <thead>
          <tr>
            <th scope="col">Candidate</th>
            {criteria.map((criterion) => (
              <th key={criterion.id} scope="col">
                {criterion.name}
                <small>{`weight ${formatPercent(Number(criterion.weight))}`}</small>
              </th>
            ))}
            <th scope="col" className="num">
              Benefit<small>0–100</small>
            </th>
          </tr>
        </thead>
        <tbody>
          {candidates.map((candidate, row) => (
            <tr key={candidate.id} data-current={row === place.row || undefined}>
              <th scope="row">
                {candidate.name} <small>{candidate.code}</small>
              </th>
              {criteria.map((criterion, column) => {
                const here = row === place.row && column === place.column;
                return (
                  <ScoreCell
                    key={criterion.id}
                    ref={(cell) => {
                      if (cell) cells.current.set(keyOf({ row, column }), cell);
                      else cells.current.delete(keyOf({ row, column }));
                    }}
                    score={scores.at(candidate.id, criterion.id)}
                    draft={here ? draft : undefined}
                    current={here}
                    label={`${candidate.name}, ${criterion.name}`}
                    onKeyDown={keyDown}
                    onFocus={() => onMove({ row, column })}
                    onBlur={commit}
                  />
                );
              })}
              <td className="num strong">{benefitWords(ownBenefit(scores, candidate.id, criteria))}</td>
            </tr>
          ))}
        </tbody>
      </Grid>
    </Scroll>
  );
}

function benefitWords(benefit: number | undefined): string {
  return benefit === undefined ? '–' : formatNumber(benefit);
}

function keyOf({ row, column }: Place): string {
  return `${row} ${column}`;
}

const Scroll = styled.div`
  overflow: auto;
  max-height: calc(100vh - 260px);
`;

export const Grid = styled.table`
  width: 100%;
  border-collapse: separate;
  border-spacing: 0;
  th,
  td {
    padding: 0 12px 0 10px;
    height: 40px;
    text-align: left;
    border-bottom: 1px solid var(--mw-line);
  }
  thead th {
    position: sticky;
    top: 0;
    z-index: 1;
    height: 50px;
    background: var(--mw-surface);
    font-size: 12px;
    font-weight: 600;
    color: var(--mw-ink-2);
    line-height: 1.3;
    border-bottom: 1px solid var(--mw-line-strong);
  }
  thead small {
    display: block;
    font-size: 12px;
    font-weight: 400;
  }
  tbody th {
    font-weight: 600;
  }
  tbody th small {
    white-space: nowrap;
    font-weight: 400;
    color: var(--mw-ink-3);
  }
  td {
    min-width: 112px;
    border-left: 1px solid var(--mw-line);
  }
  td.num,
  th.num {
    min-width: 64px;
    text-align: right;
    border-left: 0;
  }
  tr > :first-child {
    padding-left: 16px;
  }
  tr[data-current] > * {
    background: var(--mw-rod-soft);
  }
`;
