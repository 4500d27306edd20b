import type { Model } from '../model/model.js';
import { narrow, wholeModel } from '../relaxation/narrow-part.js';
import type { OpenPart } from '../relaxation/open-part.js';
import { Relaxation } from '../relaxation/relaxation.js';
import { lossesAt } from './losses.js';
import { nodeOf, type ProofNode } from './proof-task.js';
import type { Stretch, Tangent } from './step-line.js';

/** What the relaxation says of the whole problem: where a search may start, and what no portfolio can pass. */
export interface Opening {
  /** The axis of cost in windows, each with a tangent; where there are none, no portfolio is possible. */
  readonly windows: readonly ProofNode[];
  readonly starts: readonly ProofStart[];
}

/** The best options at the tangent of a window, by class of the model, with its price of cost: a start for a search. */
export interface ProofStart {
  readonly chosen: Int32Array;
  readonly price: number;
}

/**
 * Cuts the axis of cost into windows so narrow that over each the relaxation strays from its tangent in the middle by
 * a small part of what an average option brings.
 */
export function openProof(model: Model, { from, to }: Stretch): Opening {
  const whole = wholeModel(model, from, to);
  if (!whole) return { windows: [], starts: [] };
  const relaxation = new Relaxation(whole);
  const windows: ProofNode[] = [];
  const starts: ProofStart[] = [];
  const widest = (whole.to - whole.from) / LEAST_WINDOWS;
  const cut = (stretch: Stretch, depth: number): void => {
    const middle = Math.floor((stretch.from + stretch.to) / 2);
    if (!relaxation.minimise(middle)) {
      if (middle === stretch.to || !relaxation.minimise(stretch.to)) return;
      cut({ from: middle + 1, to: stretch.to }, depth);
      return;
    }
    const { tangent, best } = lossesAt(whole, relaxation.prices);
    const width = stretch.to - stretch.from;
    if (
      width > 0 &&
      depth < MOST_HALVINGS &&
      (width > widest || strays(whole, relaxation, tangent, stretch))
    ) {
      cut({ from: stretch.from, to: middle }, depth + 1);
      cut({ from: middle + 1, to: stretch.to }, depth + 1);
      return;
    }
    const { leastPieces, mostPieces } = whole;
    const part = narrow(whole, new Uint8Array(whole.option.length).fill(1), {
      ...stretch,
      leastPieces,
      mostPieces,
    });
    if (!part) return;
    windows.push(nodeOf(part, tangent));
    starts.push({ chosen: chosenOf(whole, best), price: tangent.slope });
  };
  cut(whole, 0);
  return { windows, starts };
}

function strays(whole: OpenPart, relaxation: Relaxation, tangent: Tangent, { from, to }: Stretch): boolean {
  const allowed = ALLOWED_STRAY * averageBenefit(whole);
  return [from, to].some((cost) => {
    if (!relaxation.minimise(cost)) return false;
    const there = lossesAt(whole, relaxation.prices).tangent;
    return tangent.height - there.height + (tangent.slope - there.slope) * cost > allowed;
  });
}

function averageBenefit({ benefit }: OpenPart): number {
  return benefit.reduce((sum, each) => sum + each, 0) / Math.max(1, benefit.length);
}

function chosenOf(part: OpenPart, best: Int32Array): Int32Array {
  const chosen = part.settled.slice();
  for (const option of best) chosen[part.model.optionClass[part.option[option]]] = part.option[option];
  return chosen;
}

const LEAST_WINDOWS = 24;
const MOST_HALVINGS = 9;
const ALLOWED_STRAY = 0.02;
