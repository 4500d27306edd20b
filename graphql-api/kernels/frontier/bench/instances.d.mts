import type { Problem } from '../src/problem/problem.js';

export interface InstanceOptions {
  readonly alternatives: number;
  readonly seed: number;
  readonly capacities?: number;
  readonly addedBenefit?: number;
  readonly money?: 'small' | 'minor' | 'tens';
}

export function anInstance(options: InstanceOptions): Problem;
export function nameOf(options: InstanceOptions): string;

export interface Draw {
  between(low: number, high: number): number;
  whole(low: number, high: number): number;
  chance(share: number): boolean;
  below(bound: number): number;
}

export function drawFrom(seed: number): Draw;
