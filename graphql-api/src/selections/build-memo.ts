import { totalsOf } from '@metewand/frontier';
import { toMoneyModel } from '../common/models/money.model.js';
import { capitalOf } from '../costing/round-costs.service.js';
import { certificateStatus } from '../frontier/run-views.js';
import { spendableMinor } from '../rounds/spendable.js';
import { formatPoints } from '../scoring/points.js';
import { memoAssumptions } from './memo-assumptions.js';
import { memoCautions } from './memo-cautions.js';
import { reasonOut } from './memo-left-out.js';
import { limitUses } from './memo-limit-uses.js';
import { chosenOf, picksOf, type MemoSource } from './memo-source.js';
import type { Memo, MemoLeftOut, MemoLine } from './models/memo.model.js';

/** Writes the approval paper of a portfolio; every figure is added up anew from the round. */
export function buildMemo(source: MemoSource): Memo {
  const { round, run, result, problem, input } = source;
  const { currency } = input;
  const chosen = chosenOf(source);
  const capitalMinor = capitalOf(chosen);
  const lifeCycleCostMinor = chosen.reduce((sum, each) => sum + each.lifeCycleCostMinor, 0);
  const spendable = spendableMinor(round.ceilingMinor, round.heldBackPercent);
  const uses = limitUses(source.limits, chosen, currency);
  return {
    roundName: round.name,
    runNumber: run.number,
    costAxis: run.costAxis,
    certificateStatus: certificateStatus(result),
    capital: toMoneyModel(capitalMinor, currency),
    lifeCycleCost: toMoneyModel(lifeCycleCostMinor, currency),
    benefit: formatPoints(totalsOf(problem, picksOf(source)).benefit),
    ceiling: toMoneyModel(round.ceilingMinor, currency),
    spendable: toMoneyModel(spendable, currency),
    leftUnderCeiling: toMoneyModel(spendable - capitalMinor, currency),
    lines: lines(source),
    leftOut: leftOut(source),
    cautions: memoCautions(source, uses),
    assumptions: memoAssumptions(source),
    limitUses: uses.map(({ name, used, least, most }) => ({ name, used, least, most })),
  };
}

function lines(source: MemoSource): MemoLine[] {
  const { costs, input, picks } = source;
  const quotes = new Map(costs.priced.map(({ quote }) => [quote.id, quote]));
  return picks.map((index) => {
    const item = input.items[index];
    return {
      code: item.code,
      name: item.name,
      siteName: item.siteName,
      departmentName: item.departmentName,
      vendorName: item.vendorName,
      quoteNumber: quotes.get(item.quoteId)?.number ?? '',
      capital: toMoneyModel(item.capitalMinor, input.currency),
      lifeCycleCost: toMoneyModel(item.lifeCycleCostMinor, input.currency),
      benefit: formatPoints(item.benefit),
      mandatory: item.mandatory,
    };
  });
}

/** Every candidate of the round that is not in, by code. */
function leftOut(source: MemoSource): MemoLeftOut[] {
  const { input, problem, picks } = source;
  const taken = picksOf(source);
  const passedOver = input.items
    .filter((_, index) => !picks.includes(index))
    .map(({ code, name, capitalMinor, benefit }) => ({
      code,
      name,
      capital: toMoneyModel(capitalMinor, input.currency),
      benefit: formatPoints(benefit),
      reason: reasonOut(code, problem, taken, input.currency),
    }));
  const impossible = input.leftOut.map(({ candidateId, code, name, reason }) => ({
    code,
    name,
    capital: null,
    benefit: benefitOf(source, candidateId),
    reason,
  }));
  return [...passedOver, ...impossible].sort((one, other) => (one.code < other.code ? -1 : 1));
}

function benefitOf({ benefits }: MemoSource, candidateId: string): string | null {
  const benefit = benefits.get(candidateId);
  return benefit ? formatPoints(benefit.tenThousandths) : null;
}
