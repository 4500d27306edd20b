import type { Picks } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';
import { portfolioOf } from './portfolio-of.js';
import { brokenRules, rulesOf, withRules, type Rule } from './rules.js';
import { smallestHittingSet } from './smallest-hitting-set.js';
import type { Solve } from './solve.js';

/** Rules that cannot all be kept, whereas all but any one of them can. */
export interface Collision {
  readonly rules: readonly Rule[];
  /** Whether it is proven that no collision with fewer rules was passed over. */
  readonly smallest: boolean;
}

export interface CollisionSettings {
  /** How many collisions are wanted; 3 if left out. */
  readonly most?: number;
  /** How often the feasibility of some of the rules may be asked before a smallest set is given up; 400 if left out. */
  readonly questions?: number;
}

/**
 * The smallest sets of rules that collide, smallest first; empty unless it is proven that no portfolio keeps every rule.
 *
 * A set that collides has a rule of each correction, that is of each set of rules without which the rest can be kept. So
 * the smallest set that has a rule of each correction known so far is tried: if it collides, it is a smallest collision;
 * if not, the portfolio that keeps it, kept up to as many rules as possible, shows one more correction (Ignatiev,
 * Previti, Liffiton, Marques-Silva 2015, "Smallest MUS extraction with minimal hitting set dualization"; from memory).
 * When the questions run out before the first is found, rules are dropped one by one as long as the rest collides (the
 * deletion filter; Chinneck and Dravnieks 1991, "Locating minimal infeasible constraint sets in linear programs"; from
 * memory): irreducible, but perhaps not the smallest.
 */
export function smallestCollisions(
  problem: Problem,
  solve: Solve,
  settings: CollisionSettings = {},
): Collision[] {
  const collider = new Collider(problem, solve, settings.questions ?? 400);
  return collider.collide() ? collider.collisions(settings.most ?? 3) : [];
}

class Collider {
  private readonly rules: readonly Rule[];
  private readonly corrections: Rule[][] = [];
  private asked = 0;
  /** Whether every question so far had an answer. */
  private certain = true;

  constructor(
    private readonly problem: Problem,
    private readonly solve: Solve,
    private readonly questions: number,
  ) {
    this.rules = rulesOf(problem);
  }

  /** Whether it is proven that all rules together cannot be kept. */
  collide(): boolean {
    return this.ask(new Set(this.rules)) === 'infeasible';
  }

  collisions(most: number): Collision[] {
    const found: Set<Rule>[] = [];
    // without any rule the portfolio that takes nothing will do
    this.learn(new Set(), {});
    let size = 0;
    while (found.length < most && this.asked < this.questions) {
      const candidate = smallestHittingSet(this.corrections, found, size);
      if (candidate === undefined) break;
      size = candidate.size;
      const answer = this.ask(candidate);
      if (answer === 'infeasible') found.push(candidate);
      else this.learn(candidate, answer);
    }
    if (found.length === 0) return [{ rules: this.irreducible(), smallest: false }];
    return found.map((rules) => ({ rules: this.inOrder(rules), smallest: this.certain }));
  }

  /** A portfolio that keeps the rules, or that there is none, or undefined where the search cannot tell. */
  private ask(kept: ReadonlySet<Rule>): Picks | 'infeasible' | undefined {
    this.asked++;
    const answer = portfolioOf(withRules(this.problem, kept), this.solve);
    this.certain &&= answer !== undefined;
    return answer;
  }

  /** Keeps as many rules as possible together with those that can be kept, and notes the others as a correction. */
  private learn(kept: Set<Rule>, picks: Picks | undefined): void {
    const open = new Set(this.rules.filter((rule) => !kept.has(rule)));
    const keep = (known: Picks): void => {
      const broken = new Set(brokenRules(this.problem, this.rules, known));
      for (const rule of open) if (!broken.has(rule) && open.delete(rule)) kept.add(rule);
    };
    if (picks) keep(picks);
    const correction: Rule[] = [];
    for (const rule of open) {
      const answer = picks && this.ask(new Set([...kept, rule]));
      open.delete(rule);
      if (answer === undefined || answer === 'infeasible') {
        correction.push(rule);
        continue;
      }
      kept.add(rule);
      keep(answer);
    }
    this.corrections.push(correction);
  }

  private irreducible(): Rule[] {
    const kept = new Set(this.rules);
    for (const rule of this.rules) {
      kept.delete(rule);
      if (this.ask(kept) !== 'infeasible') kept.add(rule);
    }
    return this.inOrder(kept);
  }

  private inOrder(rules: ReadonlySet<Rule>): Rule[] {
    return this.rules.filter((rule) => rules.has(rule));
  }
}
