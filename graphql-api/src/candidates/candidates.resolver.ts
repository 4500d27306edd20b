import { Args, ID, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { MoneyModel, toMoneyModel } from '../common/models/money.model.js';
import { Department } from '../organisations/entities/department.entity.js';
import { Site } from '../organisations/entities/site.entity.js';
import { OwnCurrencyLoader } from '../organisations/own-currency.loader.js';
import { DepartmentsByIdLoader, SitesByIdLoader } from '../organisations/places-by-id.loader.js';
import { CandidatesService } from './candidates.service.js';
import { CreateCandidateInput, UpdateCandidateInput } from './dto/save-candidate.input.js';
import { SaveCandidateResult } from './dto/save-candidate.result.js';
import { Candidate } from './entities/candidate.entity.js';

@Resolver(() => Candidate)
export class CandidatesResolver {
  constructor(
    private readonly candidates: CandidatesService,
    private readonly departmentsById: DepartmentsByIdLoader,
    private readonly sitesById: SitesByIdLoader,
    private readonly ownCurrency: OwnCurrencyLoader,
  ) {}

  @Query(() => Candidate)
  candidate(@Args('id', { type: () => ID }) id: string) {
    return this.candidates.find(id);
  }

  @Mutation(() => SaveCandidateResult)
  createCandidate(@Args('input') input: CreateCandidateInput) {
    return this.candidates.create(input);
  }

  @Mutation(() => SaveCandidateResult)
  updateCandidate(@Args('input') input: UpdateCandidateInput) {
    return this.candidates.update(input);
  }

  @ResolveField(() => Department)
  department(@Parent() { departmentId }: Candidate) {
    return this.departmentsById.load(departmentId);
  }

  @ResolveField(() => Site)
  site(@Parent() { siteId }: Candidate) {
    return this.sitesById.load(siteId);
  }

  @ResolveField(() => MoneyModel, { description: 'The buyer’s own estimate of building works, without VAT.' })
  worksNet(@Parent() { worksNetMinor }: Candidate) {
    return this.inOwnCurrency(worksNetMinor);
  }

  @ResolveField(() => MoneyModel)
  consumablesYearly(@Parent() { consumablesYearlyMinor }: Candidate) {
    return this.inOwnCurrency(consumablesYearlyMinor);
  }

  @ResolveField(() => MoneyModel)
  energyYearly(@Parent() { energyYearlyMinor }: Candidate) {
    return this.inOwnCurrency(energyYearlyMinor);
  }

  @ResolveField(() => MoneyModel, { description: 'What the unit to be replaced costs to run each year.' })
  currentRunningYearly(@Parent() { currentRunningYearlyMinor }: Candidate) {
    return this.inOwnCurrency(currentRunningYearlyMinor);
  }

  private async inOwnCurrency(minor: number) {
    return toMoneyModel(minor, await this.ownCurrency.current());
  }
}
