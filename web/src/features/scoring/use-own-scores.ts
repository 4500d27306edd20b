import { useState } from 'react';
import { errorMessage } from '../../lib/error-code';
import type { SheetScore } from './sheet-parts';
import { useSaveScore } from './use-save-score';
import type { ScoreToSave } from './use-save-score';

/** What an assessor gave for one criterion of one candidate, whether the API has it yet or not. */
export interface OwnScore {
  points: number | null;
  cannotJudge: boolean;
  reason: string;
  state: 'saved' | 'saving' | 'failed';
}

export interface OwnScores {
  at: (candidateId: string, criterionId: string) => OwnScore | undefined;
  /** Sends one score; what was there before comes back only if the person asks for it. */
  save: (score: ScoreToSave) => Promise<void>;
  /** Sends again what did not arrive. */
  retry: () => void;
  savedAt: Date | undefined;
  failure: string | undefined;
}

/** The viewer's scores: those that the page brought, overlaid by what was given since. */
export function useOwnScores(roundId: string, loaded: readonly SheetScore[]): OwnScores {
  const send = useSaveScore(roundId);
  const [given, setGiven] = useState<ReadonlyMap<string, OwnScore & { input: ScoreToSave }>>(new Map());
  const [savedAt, setSavedAt] = useState<Date>();
  const [failure, setFailure] = useState<string>();

  function at(candidateId: string, criterionId: string): OwnScore | undefined {
    const key = keyOf(candidateId, criterionId);
    const found = loaded.find((score) => keyOf(score.candidateId, score.criterionId) === key);
    return given.get(key) ?? (found && { ...found, points: found.points ?? null, state: 'saved' });
  }

  async function save(input: ScoreToSave) {
    const key = keyOf(input.candidateId, input.criterionId);
    const { points, cannotJudge, reason } = input;
    const wasMissing = at(input.candidateId, input.criterionId) === undefined;
    const put = (state: OwnScore['state']) =>
      setGiven((before) =>
        new Map(before).set(key, { points: points ?? null, cannotJudge, reason, state, input }),
      );
    put('saving');
    try {
      await send(input, { wasMissing });
      put('saved');
      setSavedAt(new Date());
      setFailure(undefined);
    } catch (error) {
      put('failed');
      setFailure(errorMessage(error));
    }
  }

  return {
    at,
    save,
    retry: () =>
      [...given.values()].filter(({ state }) => state === 'failed').forEach(({ input }) => void save(input)),
    savedAt,
    failure,
  };
}

function keyOf(candidateId: string, criterionId: string): string {
  return `${candidateId} ${criterionId}`;
}
