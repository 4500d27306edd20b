import type { Model } from '../model/model.js';
import { partOf } from '../relaxation/narrow-part.js';
import { OpenNode } from './open-node.js';
import { FrontierGoal, type Goal } from './goal.js';
import { precisionOf } from './precision.js';
import { nodeOf, type ProofNode, type ProofTask, type ProofTaskResult } from './proof-task.js';
import { StepLine } from './step-line.js';
import { WidestFirst } from './widest-first.js';

/**
 * Works on a task until nothing is open or its effort is spent, widest gap first. A pure function of its arguments:
 * the same task gives the same result wherever and whenever it is done.
 */
export function workTask(model: Model, task: ProofTask): ProofTaskResult {
  const line = new StepLine(task.known);
  const goal = new FrontierGoal(line, precisionOf(model));
  // a gap only shrinks as points are found: the one a node is filed under is an upper bound
  const open = new WidestFirst<OpenNode>();
  let effort = 0;
  for (const node of task.nodes) {
    const part = partOf(model, node.options, rangeOf(node));
    if (!part) continue;
    const openNode = new OpenNode(part, node.tangent, node.known);
    if (task.dives) effort += openNode.dive(goal);
    file(open, openNode, goal);
  }
  while (open.size > 0 && effort < task.effort) {
    const outcome = open.take()!.work(goal);
    effort += outcome.effort;
    for (const child of outcome.children) file(open, child, goal);
  }
  return {
    id: task.id,
    found: goal.found.filter(({ cost, benefit }) => line.has(cost, benefit)),
    open: open
      .values()
      .filter((node) => node.gap(goal) >= 0)
      .map(({ part, tangent, known }) => nodeOf(part, tangent, known)),
    effort,
  };
}

function file(open: WidestFirst<OpenNode>, node: OpenNode, goal: Goal): void {
  const gap = node.gap(goal);
  if (gap >= 0) open.add(gap, node);
}

function rangeOf({ from, to, leastPieces, mostPieces = Infinity }: ProofNode): {
  from: number;
  to: number;
  leastPieces: number;
  mostPieces: number;
} {
  return { from, to, leastPieces, mostPieces };
}
