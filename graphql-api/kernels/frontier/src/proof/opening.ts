import type { Model } from '../model/model.js';
import { narrow, wholeModel } from '../relaxation/narrow-part.js';
import type { OpenPart } from '../relaxation/open-part.js';
import { Relaxation } from '../relaxation/relaxation.js';
import { lossesAt, type Losses } from './losses.js';
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
  const cutting = new Cutting(whole);
  cutting.cut(whole, cutting.heightAt(whole.from), cutting.heightAt(whole.to), 0);
  return cutting;
}

class Cutting implements Opening {
  readonly windows: ProofNode[] = [];
  readonly starts: ProofStart[] = [];
  private readonly relaxation: Relaxation;
  private readonly widest: number;
  private readonly allowedStray: number;

  constructor(private readonly whole: OpenPart) {
    this.relaxation = new Relaxation(whole);
    this.widest = (whole.to - whole.from) / LEAST_WINDOWS;
    this.allowedStray =
      ALLOWED_STRAY * averageBenefit(whole) * Math.max(1, whole.option.length / MANY_OPTIONS);
  }

  /** The most benefit in shares at a cost; undefined if nothing costs so little. */
  heightAt(cost: number): number | undefined {
    const losses = this.lossesAt(cost);
    return losses && heightOf(losses.tangent, cost);
  }

  /** @param low and @param high the most benefit in shares at the ends of the stretch */
  cut(stretch: Stretch, low: number | undefined, high: number | undefined, depth: number): void {
    const { from, to } = stretch;
    const middle = Math.floor((from + to) / 2);
    const losses = this.lossesAt(middle);
    if (!losses) {
      // nothing possible costs so little, in shares or whole
      if (middle < to && high !== undefined) this.cut({ from: middle + 1, to }, undefined, high, depth);
      return;
    }
    const { tangent } = losses;
    const stray = Math.max(
      low === undefined ? 0 : heightOf(tangent, from) - low,
      high === undefined ? 0 : heightOf(tangent, to) - high,
    );
    if (to > from && depth < MOST_HALVINGS && (to - from > this.widest || stray > this.allowedStray)) {
      const height = heightOf(tangent, middle);
      this.cut({ from, to: middle }, low, height, depth + 1);
      this.cut({ from: middle + 1, to }, height, high, depth + 1);
      return;
    }
    this.takeWindow(stretch, losses);
  }

  private takeWindow(stretch: Stretch, { tangent, best }: Losses): void {
    const { whole } = this;
    const { leastPieces, mostPieces } = whole;
    const everything = new Uint8Array(whole.option.length).fill(1);
    const part = narrow(whole, everything, { ...stretch, leastPieces, mostPieces });
    if (!part) return;
    this.windows.push(nodeOf(part, tangent, this.relaxation.known()));
    this.starts.push({ chosen: chosenOf(whole, best), price: tangent.slope });
  }

  private lossesAt(cost: number): Losses | undefined {
    return this.relaxation.minimise(cost) ? lossesAt(this.whole, this.relaxation.prices) : undefined;
  }
}

function heightOf({ height, slope }: Tangent, cost: number): number {
  return height + slope * cost;
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
/** Beyond so many, relaxations take longer and gaps are narrow in any case. */
const MANY_OPTIONS = 1_000;
