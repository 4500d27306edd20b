import type { RoundStage } from '../../generated/graphql';
import { formatDate, timeLeft } from '../../lib/dates';
import { formatNumber } from '../../lib/money';

interface ScoresFacts {
  round: { stage: RoundStage; scoringClosesOn: string };
  /** Whether the viewer scores. */
  assesses: boolean;
  given: number;
  of: number;
  assessors: readonly { given: number; of: number }[];
}

/** The answer of the scoring page, in a sentence, and the line below it. */
export function scoresAnswer({ round, assesses, given, of, assessors }: ScoresFacts): {
  title: string;
  sub: string;
} {
  const closes = `Scoring closes on ${formatDate(round.scoringClosesOn)}, ${timeLeft(round.scoringClosesOn).toLowerCase()}.`;
  const all = assessors.reduce((sum, assessor) => sum + assessor.given, 0);
  const wanted = assessors.reduce((sum, assessor) => sum + assessor.of, 0);
  if (round.stage === 'GATHER') {
    return {
      title: 'Scoring has not opened yet',
      sub: 'The coordinator opens it when candidates and criteria are complete.',
    };
  }
  if (round.stage !== 'SCORE') {
    return {
      title: `Scored by ${assessors.length} ${assessors.length === 1 ? 'assessor' : 'assessors'}, ${formatNumber(all)} of ${formatNumber(wanted)} scores given`,
      sub: 'Scoring is closed. A missing score is left out of the mean of its criterion.',
    };
  }
  if (assesses) {
    return {
      title: `You have given ${given} of ${of} scores`,
      sub: `Score each criterion on its own; the weights come afterwards. Nobody sees your scores before closing. ${closes}`,
    };
  }
  return {
    title: `${formatNumber(all)} of ${formatNumber(wanted)} scores are given`,
    sub: `Who scored what stays closed until scoring does. ${closes}`,
  };
}
