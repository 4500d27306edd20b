import { openProof } from '../src/proof/opening.js';
import type { FoundPortfolio, ProofNode, ProofTask, ProofTaskResult } from '../src/proof/proof-task.js';
import { StepLine } from '../src/proof/step-line.js';
import { workTask } from '../src/proof/work-task.js';
import type { Model } from '../src/model/model.js';
import { everyChoice, frontOf, mostCost } from './every-choice.js';
import { tangledModels } from './tangled-models.js';

const models = tangledModels(24, (seed) => 5 + (seed % 4)).map(({ model }) => ({
  model,
  portfolios: everyChoice(model),
}));
const EFFORTS = [1, 600, 1_500, 4_000, 20_000, 1e9];

interface Worked {
  readonly model: Model;
  readonly portfolios: readonly FoundPortfolio[];
  readonly known: readonly (readonly [number, number])[];
  readonly result: ProofTaskResult;
}

/** Tasks over all windows of a model, every third point of its front known, with less and more effort. */
const workedTasks = models.flatMap(({ model, portfolios }): Worked[] => {
  const exact = frontOf(portfolios);
  const { windows } = openProof(model, { from: 0, to: mostCost(model) });
  return EFFORTS.map((effort, place) => {
    const known = exact.filter((_, point) => point % 3 === place % 3);
    const task = { id: '0.0', nodes: windows, known, dives: place % 2 === 0, effort };
    return { model, portfolios, known, result: workTask(model, task) };
  });
});

function covers(node: ProofNode, cost: number, benefit: number): boolean {
  const { height, slope } = node.tangent;
  return node.from <= cost && cost <= node.to && benefit <= height + slope * cost + 1e-6;
}

describe('the work on a task', () => {
  it('loses no point: each one is known, found or below the tangent of what is still open', () => {
    let open = 0;
    let found = 0;
    for (const { portfolios, known, result } of workedTasks) {
      const line = new StepLine([...known, ...pointsOf(result)]);
      for (const [cost, benefit] of frontOf(portfolios)) {
        if (line.at(cost) >= benefit) continue;
        expect(result.open.some((node) => covers(node, cost, benefit))).toBe(true);
        open++;
      }
      found += result.found.length;
    }
    expect(open).toBeGreaterThan(30);
    expect(found).toBeGreaterThan(100);
  });

  it('leaves every point open as a portfolio too: an open node still holds its options', () => {
    for (const { portfolios, known, result } of workedTasks) {
      const line = new StepLine([...known, ...pointsOf(result)]);
      for (const [cost, benefit] of frontOf(portfolios)) {
        if (line.at(cost) >= benefit) continue;
        const ways = portfolios.filter((other) => other.cost === cost && other.benefit === benefit);
        const isHeld = ways.some(({ chosen }) =>
          result.open.some(
            (node) => node.from <= cost && cost <= node.to && chosen.every((o) => node.options.includes(o)),
          ),
        );
        expect(isHeld).toBe(true);
      }
    }
  });

  it('finds feasible portfolios alone, with their true sums, all better than what was known', () => {
    for (const { portfolios, known, result } of workedTasks) {
      const line = new StepLine(known);
      const all = new Set(portfolios.map(wordsOf));
      for (const portfolio of result.found) {
        expect(all.has(wordsOf(portfolio))).toBe(true);
        expect(portfolio.benefit).toBeGreaterThan(line.at(portfolio.cost));
      }
    }
  });

  it('leaves nothing open where its effort suffices', () => {
    for (const { model, portfolios } of models) {
      const { windows } = openProof(model, { from: 0, to: mostCost(model) });
      const task: ProofTask = { id: '0.0', nodes: windows, known: [], dives: false, effort: Infinity };
      const result = workTask(model, task);
      expect(result.open).toEqual([]);
      expect(frontOf(result.found)).toEqual(frontOf(portfolios));
    }
  });

  it('comes out the same from a task that was sent, and done, again', () => {
    const { model } = models[3];
    const { windows } = openProof(model, { from: 0, to: mostCost(model) });
    const task: ProofTask = { id: '0.0', nodes: windows, known: [], dives: true, effort: 2_000 };
    expect(workTask(model, structuredClone(task))).toEqual(workTask(model, task));
  });
});

function pointsOf({ found }: ProofTaskResult): [number, number][] {
  return found.map(({ cost, benefit }) => [cost, benefit]);
}

function wordsOf({ cost, benefit, chosen }: ProofTaskResult['found'][number]): string {
  return `${cost} ${benefit} ${chosen.join()}`;
}
