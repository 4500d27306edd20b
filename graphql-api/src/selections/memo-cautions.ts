import { dayInWords, figureInWords } from '../common/words.js';
import { chosenOf, type MemoSource } from './memo-source.js';
import type { LimitUse } from './memo-limit-uses.js';
import type { MemoCaution } from './models/memo.model.js';
import { SITE_NEEDS_CAUTION, siteNeedSentences } from './site-needs.js';

const SOON_DAYS = 30;
const NEARLY_USED = 0.95;

/** What whoever signs has to know beside the figures. */
export function memoCautions(source: MemoSource, uses: readonly LimitUse[]): MemoCaution[] {
  return [
    ...mandatoryLeftOut(source),
    ...quotesEndingSoon(source),
    ...limitsNearlyUsed(uses),
    ...scoresMissing(source),
    ...notProven(source),
    ...siteNeeds(source),
    {
      title: 'Recalls and registration',
      text: 'Before an order and before use, look the devices up in the regulator’s public recall and safety-notice lists and check their registration for your country; record who looked, when and where. This memo gives no clearance opinion.',
    },
    {
      title: 'What a benefit score is not',
      text: 'A benefit score and a frontier inform a decision; they do not assess clinical safety.',
    },
  ];
}

function mandatoryLeftOut({ input }: MemoSource): MemoCaution[] {
  return input.leftOut
    .filter(({ mandatory }) => mandatory)
    .map(({ code, name, reason }) => ({
      title: `${code} ${name} is mandatory and left out`,
      text: `${reason}. It has to be bought all the same: settle it beside this memo.`,
    }));
}

function quotesEndingSoon(source: MemoSource): MemoCaution[] {
  const soon = new Date(`${source.round.decisionDate}T00:00:00Z`);
  soon.setUTCDate(soon.getUTCDate() + SOON_DAYS);
  const lastDay = soon.toISOString().slice(0, 10);
  const ending = chosenOf(source).filter(({ quote }) => quote.validUntil <= lastDay);
  if (ending.length === 0) return [];
  const days = ending.map(({ candidate, quote }) => `${candidate.code} (${dayInWords(quote.validUntil)})`);
  const quotes = ending.length === 1 ? '1 quote ends' : `${ending.length} quotes end`;
  return [
    {
      title: `${quotes} within ${SOON_DAYS} days of the decision date`,
      text: `${days.join(', ')}. Order before then, or ask for an extension.`,
    },
  ];
}

function limitsNearlyUsed(uses: readonly LimitUse[]): MemoCaution[] {
  return uses
    .filter(({ share }) => share !== undefined && share >= NEARLY_USED)
    .map(({ name, share, used, most }) => ({
      title: `${name}: ${Math.floor((share ?? 0) * 100)} % used`,
      text: `${figureInWords(used)} of ${figureInWords(most ?? '0')}. There is hardly room for anything unforeseen.`,
    }));
}

function scoresMissing(source: MemoSource): MemoCaution[] {
  const incomplete = chosenOf(source).filter(({ candidate }) => missingOf(source, candidate.id) > 0);
  if (incomplete.length === 0) return [];
  const counts = incomplete.map(({ candidate }) => `${candidate.code} (${missingOf(source, candidate.id)})`);
  return [
    {
      title: 'Scores are missing',
      text: `${counts.join(', ')}. Their benefit is the mean of the scores that were given.`,
    },
  ];
}

function missingOf({ benefits }: MemoSource, candidateId: string): number {
  return benefits.get(candidateId)?.missingScores ?? 0;
}

function notProven({ run, result }: MemoSource): MemoCaution[] {
  if (result.status === 'COMPLETE') return [];
  const lookedAt = result.counts.lookedAt.toLocaleString('en-GB').replaceAll(',', '\u00a0');
  const ended = result.stopped ? 'It was stopped before its end. ' : '';
  return [
    {
      title: 'The search is not proven complete',
      text: `${ended}Run ${run.number} looked at ${lookedAt} portfolios and found none that has more benefit at no more cost. It is not proven that there is none.`,
    },
  ];
}

function siteNeeds(source: MemoSource): MemoCaution[] {
  const sentences = siteNeedSentences(chosenOf(source).map(({ candidate }) => candidate));
  if (sentences.length === 0) return [];
  return [
    {
      title: 'Site needs to confirm before an order',
      text: [SITE_NEEDS_CAUTION, ...sentences, 'Local codes and licensed practice prevail.'].join(' '),
    },
  ];
}
