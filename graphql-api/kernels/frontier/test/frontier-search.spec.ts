import type { FrontierSearch } from '../src/frontier-search.js';
import { Random } from '../src/local-search/random.js';
import type { Model } from '../src/model/model.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import type { ProofTask } from '../src/proof/proof-task.js';
import { StepLine } from '../src/proof/step-line.js';
import { workTask } from '../src/proof/work-task.js';
import { beginSearch, type SearchResult, type SearchSettings } from '../src/search.js';
import { anInstance } from '../bench/instances.mjs';
import { runToEnd } from './run-search.js';

const problem = parseProblem(anInstance({ alternatives: 26, seed: 4 }));
const settings = { seed: 3, evaluations: 40_000 };

function begun(more: SearchSettings = {}): { search: FrontierSearch; model: Model } {
  const begun = beginSearch(problem, { ...settings, ...more });
  if ('result' in begun) throw new Error('It ended before it began.');
  return begun;
}

/** Several workers hold tasks at a time; which one ends next, and whether one is lost, is drawn. */
function runShared(workers: number, seed: number): SearchResult {
  const random = new Random(seed);
  const { search, model } = begun();
  const held: ProofTask[] = [];
  while (!search.isOver) {
    if (search.advance()) continue;
    while (held.length < workers) {
      const task = search.take();
      if (!task) break;
      held.push(task);
    }
    const [task] = held.splice(random.below(held.length), 1);
    if (random.fraction() < 0.1) search.putBack(task.id);
    else search.accept(workTask(model, structuredClone(task)));
    if (random.fraction() < 0.1) search.progress();
  }
  return search.result(false);
}

describe('a search whose tasks are worked on elsewhere', () => {
  const alone = runToEnd(problem, settings);

  it('comes to the result of one thread with any number of workers', () => {
    expect(alone.status).toBe('complete');
    expect(alone.points.length).toBeGreaterThan(20);
    for (const [workers, seed] of [
      [2, 1],
      [5, 2],
    ]) {
      expect(runShared(workers, seed)).toEqual(alone);
    }
  });

  it('has a bound above every point of the front, and is level with it where it says so, whenever stopped', () => {
    const { search, model } = begun({ evaluations: 2_000 });
    const exact = new StepLine(alone.points.map(({ cost, benefit }) => [cost, benefit] as const));
    const seen = new Set<string>();
    for (let step = 0; !search.isOver; step++) {
      if (!search.advance()) search.accept(workTask(model, search.take()!));
      if (step % 5 > 0 && !search.isOver) continue;
      const { status, points, bound, provenStretches, stopped } = search.result(true);
      seen.add(status);
      expect(stopped).toBe(!search.isOver);
      if (status === 'unproven') {
        expect([bound, provenStretches]).toEqual([[], []]);
        continue;
      }
      const line = new StepLine(bound);
      expect(line.points()).toEqual(bound);
      for (const [cost, benefit] of exact.points()) expect(line.at(cost)).toBeGreaterThanOrEqual(benefit);
      const own = new StepLine(points.map(({ cost, benefit }) => [cost, benefit] as const));
      for (const [from, to] of provenStretches) {
        const edges = [from, to, ...exact.points().map(([cost]) => cost)];
        for (const cost of edges.filter((edge) => from <= edge && edge <= to)) {
          expect(own.at(cost)).toBe(exact.at(cost));
        }
      }
    }
    expect([...seen]).toEqual(['unproven', 'bounded', 'complete']);
  });

  it('has the bound of the relaxation alone without effort, and nothing proven if it ends before that', () => {
    const relaxed = runToEnd(problem, { ...settings, effort: 0 });
    expect(relaxed.status).toBe('bounded');
    const line = new StepLine(relaxed.bound);
    for (const { cost, benefit } of alone.points) expect(line.at(cost)).toBeGreaterThanOrEqual(benefit);
    const short = runToEnd(problem, { ...settings, evaluations: 2_000, effort: 0 });
    expect(short).toMatchObject({ status: 'unproven', bound: [], provenStretches: [] });
    expect(short.points.length).toBeGreaterThan(20);
  });

  it('ends soon after the effort it was given, long before all is proven', () => {
    const result = runToEnd(problem, { ...settings, effort: 1 });
    expect(result.status).toBe('bounded');
    expect(result.evaluations).toBeLessThan(alone.evaluations);
  });

  it('looks at no more portfolios in the local search than it may, by much', () => {
    const { search } = begun({ evaluations: 5_000, effort: 0 });
    while (!search.isOver) search.advance();
    const { evaluations } = search.result(false);
    expect(evaluations).toBeGreaterThanOrEqual(5_000);
    expect(evaluations).toBeLessThan(15_000);
  });
});
