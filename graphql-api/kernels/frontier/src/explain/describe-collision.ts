import type { Loosening } from './loosening.js';
import { isLeastRule, type Rule } from './rules.js';
import type { Collision } from './smallest-collisions.js';
import { writeForRule, type WriteFigure } from './write-figure.js';

/** A collision and what would have to give way, one sentence each. Rules that cannot help alone share a sentence. */
export function describeCollision(
  collision: Collision,
  loosenings: readonly Loosening[],
  write: WriteFigure = String,
): string[] {
  const rules = collision.rules.map((rule) => describeRule(rule, write));
  const helpful = loosenings.filter(({ outcome }) => outcome === 'enough');
  const sentences = [
    `These cannot all be kept: ${rules.join('; ')}${collision.smallest ? '' : ' (there may be a smaller set)'}.`,
    ...helpful.map((loosening) => describeLoosening(loosening, write)),
  ];
  if (helpful.length > 0) return sentences;
  const isProven = loosenings.every(({ outcome }) => outcome === 'not enough');
  return [
    ...sentences,
    isProven
      ? 'To give up one of them is not enough: others collide as well.'
      : 'Whether it is enough to give up one of them was not found.',
  ];
}

function describeLoosening({ rule, bound, by, exact }: Loosening, write: WriteFigure): string {
  if (bound === undefined || by === undefined) {
    return `It would be enough to give this up: ${describeRule(rule, write)}.`;
  }
  const difference = `${writeForRule(by, rule, write)} ${isLeastRule(rule) ? 'less' : 'more'}`;
  const perhaps = exact ? '' : '; perhaps less would do';
  return `It would be enough to have ${describeRule({ ...rule, bound }, write)}, ${difference}${perhaps}.`;
}

function describeRule(rule: Rule, write: WriteFigure): string {
  const { kind, name, bound = 0 } = rule;
  const text = writeForRule(bound, rule, write);
  switch (kind) {
    case 'ceiling':
      return `a ceiling of ${text}`;
    case 'limit most':
      return `${name} of at most ${text}`;
    case 'limit least':
      return `${name} of at least ${text}`;
    case 'count most':
      return `at most ${text} pieces of ${name}`;
    case 'count least':
      return `at least ${text} pieces of ${name}`;
    case 'least benefit':
      return `a benefit of at least ${text}`;
    case 'one of':
      return `only one of the group ${name}`;
    case 'either or':
      return `${name.replace(/, (?=[^,]*$)/, ' and ')} exclude each other`;
    case 'needs':
      return name;
    case 'must include':
      return `${name} must be taken`;
    case 'left out':
      return `${name} is left out`;
  }
}
