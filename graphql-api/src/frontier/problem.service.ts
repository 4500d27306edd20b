import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import { parseProblem, ProblemError, type Problem, type WriteFigure } from '@metewand/frontier';
import { LinksService } from '../candidates/links.service.js';
import type { Candidate } from '../candidates/entities/candidate.entity.js';
import { namesById } from '../common/names-by-id.js';
import { RoundCostsService, type PricedCandidate, type RoundCosts } from '../costing/round-costs.service.js';
import { measured } from '../limits/limit-measures.js';
import { LimitsService } from '../limits/limits.service.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { Vendor } from '../quotes/entities/vendor.entity.js';
import type { Round } from '../rounds/entities/round.entity.js';
import { spendableMinor } from '../rounds/spendable.js';
import { BenefitsService, type Benefit } from '../scoring/benefits.service.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { buildProblem, type BuiltProblem, type ProblemSource } from './build-problem.js';
import type { CostAxis } from './cost-axis.enum.js';
import { figuresInWords } from './figures-in-words.js';
import { fingerprintOf } from './fingerprint.js';
import type { LeftOut } from './left-out.js';
import type { RunInput, RunItemRow, RunLeftOutRow } from './run-result.js';

/** The figures of a round do not fit the search's format; the message says which and why. */
export class UnsearchableError extends Error {}

export interface FrozenProblem {
  problem: Problem;
  input: RunInput;
  fingerprint: string;
  /** Writes the problem's figures for people. */
  write: WriteFigure;
  /** What the figures came from, for the papers. */
  costs: RoundCosts;
}

interface Names {
  sites: ReadonlyMap<string, string>;
  departments: ReadonlyMap<string, string>;
  vendors: ReadonlyMap<string, string>;
}

/** Rows of a round to a search problem. */
@Injectable()
export class ProblemService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly costs: RoundCostsService,
    private readonly benefits: BenefitsService,
    private readonly limits: LimitsService,
    private readonly links: LinksService,
    private readonly organisations: OrganisationsService,
  ) {}

  /** The round as it is now. The caller holds its lock and has made sure that scoring is closed. */
  build(round: Round, costAxis: CostAxis): Promise<FrozenProblem> {
    return this.db.transaction(async (em) => {
      const costs = await this.costs.ofRound(round.id);
      const benefits = await this.benefits.ofRound(round.id);
      const limits = await this.limits.ofRound(round.id);
      const built = checked({
        name: round.name,
        currency: costs.currency,
        costAxis,
        spendableMinor: spendableMinor(round.ceilingMinor, round.heldBackPercent),
        candidates: costs.priced.map((priced) => problemCandidate(priced, benefits)),
        withoutQuote: new Map(costs.unpriced.map(({ candidate }) => [candidate.id, candidate.code])),
        links: (await this.links.ofRound(round.id)).map(({ link, memberIds }) => ({ ...link, memberIds })),
        limits,
      });
      const input = inputOf(built, costs, round, await this.names(em, costs));
      return {
        problem: built.problem,
        input,
        fingerprint: fingerprintOf(built.problem),
        write: figuresInWords(limits, costs.currency),
        costs,
      };
    });
  }

  private async names(em: EntityManager, { priced }: RoundCosts): Promise<Names> {
    const vendorIds = priced.map(({ quote }) => quote.vendorId);
    return {
      sites: namesById(await this.organisations.sites()),
      departments: namesById(await this.organisations.departments()),
      vendors: namesById(await em.findBy(Vendor, { id: In(vendorIds) })),
    };
  }
}

/** Built, and read again by the kernel's own reader, which refuses what it cannot add up exactly. */
function checked(source: ProblemSource): BuiltProblem {
  try {
    const built = buildProblem(source);
    return { ...built, problem: parseProblem(built.problem) };
  } catch (error) {
    if (error instanceof RangeError) {
      throw new UnsearchableError(`${error.message} Search on the capital axis, or correct its figures.`);
    }
    if (error instanceof ProblemError) {
      throw new UnsearchableError(`The figures of this round cannot be searched: ${error.message}`);
    }
    throw error;
  }
}

function problemCandidate(priced: PricedCandidate, benefits: ReadonlyMap<string, Benefit>) {
  const { candidate, capitalMinor, lifeCycleCostMinor } = priced;
  const { id, code, mandatory } = candidate;
  const benefitTenThousandths = benefits.get(id)?.tenThousandths ?? 0;
  return {
    ...measured(priced),
    id,
    code,
    mandatory,
    benefitTenThousandths,
    capitalMinor,
    lifeCycleCostMinor,
  };
}

function inputOf({ items, leftOut }: BuiltProblem, costs: RoundCosts, round: Round, names: Names): RunInput {
  const priced = new Map(costs.priced.map((each) => [each.candidate.id, each]));
  const candidates = new Map(
    [...costs.priced, ...costs.unpriced].map(({ candidate }) => [candidate.id, candidate]),
  );
  return {
    currency: costs.currency,
    spendableMinor: spendableMinor(round.ceilingMinor, round.heldBackPercent),
    items: items.flatMap(({ id, benefitTenThousandths }) => {
      const each = priced.get(id);
      return each ? [itemRow(each, benefitTenThousandths, names)] : [];
    }),
    leftOut: leftOut.flatMap((each) => {
      const candidate = candidates.get(each.candidateId);
      return candidate ? [leftOutRow(each, candidate)] : [];
    }),
  };
}

function itemRow(
  { candidate, quote, ...figures }: PricedCandidate,
  benefit: number,
  names: Names,
): RunItemRow {
  return {
    candidateId: candidate.id,
    quoteId: quote.id,
    code: candidate.code,
    name: candidate.name,
    siteName: names.sites.get(candidate.siteId) ?? '',
    departmentName: names.departments.get(candidate.departmentId) ?? '',
    vendorName: names.vendors.get(quote.vendorId) ?? '',
    benefit,
    capitalMinor: figures.capitalMinor,
    lifeCycleCostMinor: figures.lifeCycleCostMinor,
    mandatory: candidate.mandatory,
  };
}

function leftOutRow({ candidateId, reason }: LeftOut, { code, name, mandatory }: Candidate): RunLeftOutRow {
  return { candidateId, code, name, reason, mandatory };
}
