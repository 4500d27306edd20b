import { Random } from '../src/local-search/random.js';
import type { Model } from '../src/model/model.js';
import { FrontierProof } from '../src/proof/frontier-proof.js';
import { openProof } from '../src/proof/opening.js';
import type { ProofTask, ProofTaskResult } from '../src/proof/proof-task.js';
import { StepLine } from '../src/proof/step-line.js';
import { workTask } from '../src/proof/work-task.js';
import { everyChoice, frontOf, mostCost } from './every-choice.js';
import { tangledModels } from './tangled-models.js';

const models = tangledModels(8, () => 9);

/** How a host goes about it: what it does with the tasks of a round. */
type Host = (model: Model, proof: FrontierProof, accept: (result: ProofTaskResult) => void) => void;

const oneByOne: Host = (model, proof, accept) => {
  for (let task = proof.take(); task; task = proof.take()) accept(workTask(model, task));
};

/** Takes all, loses some, gets results in any order, some of them twice. */
function withLosses(random: Random): Host {
  return (model, proof, accept) => {
    for (let round = 0; !proof.isRoundOver; round++) {
      const tasks = allTasks(proof).sort(() => random.fraction() - 0.5);
      for (const task of tasks) {
        if (round < 2 && random.fraction() < 0.3) {
          expect(proof.putBack(task.id)).toBe(task);
          continue;
        }
        const result = workTask(model, structuredClone(task));
        accept(result);
        if (random.fraction() < 0.3) accept(result);
      }
    }
  };
}

function allTasks(proof: FrontierProof): ProofTask[] {
  const tasks: ProofTask[] = [];
  for (let task = proof.take(); task; task = proof.take()) tasks.push(task);
  return tasks;
}

/** The rounds of a proof to its end: what each found, and the effort. */
function roundsOf(
  model: Model,
  host: Host,
): { found: string[][]; front: [number, number][]; effort: number } {
  const proof = new FrontierProof(openProof(model, { from: 0, to: mostCost(model) }).windows);
  const line = new StepLine([]);
  const found: string[][] = [];
  while (!proof.isComplete) {
    proof.startRound(line.points());
    const ofRound: ProofTaskResult[] = [];
    host(model, proof, (result) => {
      if (proof.accept(result)) ofRound.push(result);
    });
    for (const { cost, benefit } of ofRound.flatMap((result) => result.found)) line.raise(cost, benefit);
    found.push(ofRound.map(({ id, found: portfolios }) => `${id}: ${JSON.stringify(portfolios)}`).sort());
  }
  return { found, front: line.points(), effort: proof.effort };
}

describe('the rounds of a proof', () => {
  it('bring the whole front, and the same whatever becomes of the tasks', () => {
    for (const { seed, model } of models) {
      const plain = roundsOf(model, oneByOne);
      expect(plain.front).toEqual(frontOf(everyChoice(model)));
      expect(roundsOf(model, withLosses(new Random(seed)))).toEqual(plain);
    }
  });

  it('keep what is handed out among what is open', () => {
    const { model } = models[0];
    const { windows } = openProof(model, { from: 0, to: mostCost(model) });
    const proof = new FrontierProof(windows);
    expect(proof.openNodes()).toHaveLength(windows.length);
    expect(proof.isComplete).toBe(false);
    proof.startRound([]);
    expect(proof.openNodes()).toHaveLength(windows.length);
    const tasks = allTasks(proof);
    expect(proof.openNodes()).toHaveLength(windows.length);
    expect([proof.isIdle, proof.isRoundOver]).toEqual([false, false]);
    for (const { id } of tasks) proof.accept({ id, found: [], open: [], effort: 1 });
    expect([proof.isComplete, proof.openNodes()]).toEqual([true, []]);
    expect(proof.effort).toBe(tasks.length);
  });

  it('take no result of a task that is not out', () => {
    const { model } = models[0];
    const proof = new FrontierProof(openProof(model, { from: 0, to: mostCost(model) }).windows);
    proof.startRound([]);
    const { id } = proof.take()!;
    proof.putBack(id);
    expect(proof.accept({ id, found: [], open: [], effort: 1 })).toBe(false);
    expect(proof.putBack(id)).toBeUndefined();
    expect(proof.accept({ id: 'no such task', found: [], open: [], effort: 1 })).toBe(false);
  });
});
