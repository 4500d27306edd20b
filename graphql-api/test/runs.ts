import { setTimeout as sleep } from 'node:timers/promises';
import type { Member } from './app.js';

export interface FoundPoint {
  benefit: string;
  cost: { amount: string };
  capital: { amount: string };
  atMostMore: string | null;
  picks: number[];
}

export interface RunView {
  id: string;
  number: number;
  state: string;
  seed: number;
  fingerprint: string;
  failure: string | null;
  notes: string[];
  kneeIndex: number | null;
  progress: {
    evaluations: number;
    kept: number;
    lookedAt: number;
    bestBenefit: string;
    share: number;
  } | null;
  certificate: {
    status: string;
    provenStretches: number[][];
    bound: { costs: number[]; benefits: number[] };
    gapPercent: number | null;
    provenShare: number;
  };
  items: { code: string; mandatory: boolean; benefit: string; capital: { amount: string } }[];
  leftOut: { code: string; reason: string; mandatory: boolean }[];
  points: FoundPoint[];
}

const START = `mutation ($input: StartSearchInput!) {
  startSearch(input: $input) {
    __typename
    ... on Run { id number state }
    ... on LimitsCollide { message notes }
    ... on NothingToSearch { message }
    ... on SearchAlreadyRunning { message }
  }
}`;

const RUN = `query ($id: ID!) {
  run(id: $id) {
    id number state seed fingerprint failure notes kneeIndex
    progress { evaluations kept lookedAt bestBenefit share }
    certificate { status provenStretches bound { costs benefits } gapPercent provenShare }
    items { code mandatory benefit capital { amount } }
    leftOut { code reason mandatory }
    points { benefit cost { amount } capital { amount } atMostMore picks }
  }
}`;

export const ENDED = ['FINISHED', 'STOPPED', 'INFEASIBLE', 'FAILED'];

/** What startSearch answers: a run, or a refusal. */
export async function startSearch(member: Member, roundId: string, settings: Record<string, unknown> = {}) {
  const input = { roundId, costAxis: 'CAPITAL', ...settings };
  const { startSearch: answer } = await member.get(START, { input });
  return answer as {
    __typename: string;
    id: string;
    number: number;
    state: string;
    message: string;
    notes: string[];
  };
}

export async function readRun(member: Member, id: string): Promise<RunView> {
  return ((await member.get(RUN, { id })) as { run: RunView }).run;
}

/** Asks until the run is as wanted. The test's own time limit ends the wait for what never comes. */
export async function runOnce(
  member: Member,
  id: string,
  isWanted: (run: RunView) => boolean,
): Promise<RunView> {
  for (;;) {
    const run = await readRun(member, id);
    if (isWanted(run)) return run;
    if (ENDED.includes(run.state))
      throw new Error(`The run ended as ${run.state}: ${run.failure ?? run.notes.join(' ')}`);
    await sleep(200);
  }
}

export function ended(run: RunView): boolean {
  return ENDED.includes(run.state);
}

export function underWay(run: RunView): boolean {
  return run.state === 'SEARCHING' && (run.progress?.evaluations ?? 0) > 0;
}

/** Starts a search and waits for its end. A worker has to be there. */
export async function search(member: Member, roundId: string, settings: Record<string, unknown> = {}) {
  const { id } = await startSearch(member, roundId, settings);
  return runOnce(member, id, ended);
}

export function codesOf(run: RunView, point: FoundPoint): string[] {
  return point.picks.map((index) => run.items[index].code);
}
