import { Injectable } from '@nestjs/common';
import { CandidateBenefits } from '../candidates/candidate-benefits.js';
import { toMoneyModel } from '../common/models/money.model.js';
import { namesById } from '../common/names-by-id.js';
import {
  capitalOf,
  RoundCostsService,
  type PricedCandidate,
  type RoundCosts,
} from '../costing/round-costs.service.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import {
  CandidateSortKey,
  CandidateView,
  SortDirection,
  type CandidatePageArgs,
} from './candidate-page.args.js';
import type { CandidatePage } from './candidate-page.model.js';
import { filterRows, inView, sortRows, type CandidateRow } from './candidate-rows.js';

const BY_CODE = { key: CandidateSortKey.CODE, direction: SortDirection.ASC };

/** The table of a round's candidates. A round holds some hundreds, and costs are computed, so it is sifted in memory. */
@Injectable()
export class CandidateTableService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly costs: RoundCostsService,
    private readonly benefits: CandidateBenefits,
    private readonly organisations: OrganisationsService,
  ) {}

  page({ roundId, filter, sort, page, pageSize }: CandidatePageArgs): Promise<CandidatePage> {
    return this.db.transaction(async () => {
      const costs = await this.costs.ofRound(roundId);
      const rows = await this.rows(roundId, costs);
      const found = sortRows(filterRows(rows, filter ?? {}), sort ?? BY_CODE);
      const start = (page - 1) * pageSize;
      return {
        items: found.slice(start, start + pageSize).map(({ candidate }) => candidate),
        total: found.length,
        page,
        pageSize,
        all: rows.length,
        somethingMissing: rows.filter((row) => inView(row, CandidateView.SOMETHING_MISSING)).length,
        mandatory: rows.filter((row) => inView(row, CandidateView.MANDATORY)).length,
        askedFor: toMoneyModel(capitalOf(costs.priced), costs.currency),
      };
    });
  }

  private async rows(roundId: string, { priced, unpriced }: RoundCosts): Promise<CandidateRow[]> {
    const benefits = await this.benefits.byCandidate(roundId);
    const unscored = await this.benefits.withScoresMissing(roundId);
    const departments = namesById(await this.organisations.departments());
    const sites = namesById(await this.organisations.sites());
    const all: (PricedCandidate | (typeof unpriced)[number])[] = [...priced, ...unpriced];
    return all.map((each) => {
      const { candidate } = each;
      const isPriced = 'capitalMinor' in each;
      return {
        candidate,
        departmentName: departments.get(candidate.departmentId) ?? '',
        siteName: sites.get(candidate.siteId) ?? '',
        capitalMinor: isPriced ? each.capitalMinor : null,
        lifeCycleCostMinor: isPriced ? each.lifeCycleCostMinor : null,
        benefit: benefits.get(candidate.id) ?? null,
        somethingMissing: !isPriced || unscored.has(candidate.id),
      };
    });
  }
}
