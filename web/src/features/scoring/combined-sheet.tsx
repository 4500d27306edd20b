import { useMemo } from 'react';
import styled from 'styled-components';
import { formatNumber, formatPercent } from '../../lib/money';
import { Section } from '../../ui/section';
import type { SheetCandidate, SheetCriterion, SheetScore } from './sheet-parts';
import { SpreadCell } from './spread-cell';
import { Grid } from './score-grid';

interface CombinedSheetProps {
  candidates: readonly SheetCandidate[];
  criteria: readonly SheetCriterion[];
  scores: readonly SheetScore[];
  /** The viewer, whose own score is marked. */
  membershipId: string;
}

/** After closing: the mean of all assessors with their range, and the benefit it adds up to. */
export function CombinedSheet({ candidates, criteria, scores, membershipId }: CombinedSheetProps) {
  const byCell = useMemo(() => groupByCell(scores), [scores]);
  return (
    <Section>
      <Scroll role="region" aria-label="Scores of all assessors" tabIndex={0}>
        <Grid>
          <caption className="visually-hidden">Mean scores of all assessors</caption>
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
            {candidates.map((candidate) => (
              <tr key={candidate.id}>
                <th scope="row">
                  {candidate.name} <small>{candidate.code}</small>
                </th>
                {criteria.map((criterion) => (
                  <SpreadCell
                    key={criterion.id}
                    scores={byCell.get(`${candidate.id} ${criterion.id}`) ?? []}
                    membershipId={membershipId}
                  />
                ))}
                <td className="num strong">
                  {candidate.benefit ? formatNumber(candidate.benefit.points, 1) : '—'}
                </td>
              </tr>
            ))}
          </tbody>
        </Grid>
      </Scroll>
      <Legend>
        <span>bar: range of all assessors</span>
        <span>black mark: your own score</span>
        <span>hatched: 30 points or more apart</span>
      </Legend>
    </Section>
  );
}

function groupByCell(scores: readonly SheetScore[]): ReadonlyMap<string, SheetScore[]> {
  const cells = new Map<string, SheetScore[]>();
  for (const score of scores) {
    const key = `${score.candidateId} ${score.criterionId}`;
    cells.set(key, [...(cells.get(key) ?? []), score]);
  }
  return cells;
}

const Scroll = styled.div`
  overflow-x: auto;
`;

const Legend = styled.p`
  display: flex;
  flex-wrap: wrap;
  gap: 4px 18px;
  padding: 12px 16px;
  font-size: 13px;
  color: var(--mw-ink-2);
`;
