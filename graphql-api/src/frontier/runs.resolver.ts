import { Args, ID, Int, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { MoneyModel, toMoneyModel } from '../common/models/money.model.js';
import { Membership } from '../memberships/entities/membership.entity.js';
import { MembershipsByIdLoader } from '../memberships/memberships-by-id.loader.js';
import { Round } from '../rounds/entities/round.entity.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { StartSearchInput } from './dto/start-search.input.js';
import { StartSearchResult } from './dto/start-search.result.js';
import { Run } from './entities/run.entity.js';
import {
  ChartPoints,
  PointAlternatives,
  RunCertificate,
  RunItem,
  RunLeftOut,
  RunPoint,
  RunProgress,
} from './models/run-parts.model.js';
import { RunAlternativesService } from './run-alternatives.service.js';
import { RunDetailsLoader } from './run-details.loader.js';
import { certificateView, chartView, itemViews, pointViews, progressView } from './run-views.js';
import { RunsService } from './runs.service.js';

@Resolver(() => Run)
export class RunsResolver {
  constructor(
    private readonly runs: RunsService,
    private readonly rounds: RoundsService,
    private readonly alternativesOf: RunAlternativesService,
    private readonly detailsById: RunDetailsLoader,
    private readonly membershipsById: MembershipsByIdLoader,
  ) {}

  @Query(() => Run)
  run(@Args('id', { type: () => ID }) id: string) {
    return this.runs.find(id);
  }

  @Mutation(() => StartSearchResult)
  startSearch(@Args('input') input: StartSearchInput) {
    return this.runs.start(input);
  }

  @Mutation(() => Run)
  stopSearch(@Args('runId', { type: () => ID }) runId: string) {
    return this.runs.stop(runId);
  }

  @ResolveField(() => Round)
  round(@Parent() { roundId }: Run) {
    return this.rounds.find(roundId);
  }

  @ResolveField(() => Membership, { name: 'startedBy' })
  starter(@Parent() { startedBy }: Run) {
    return this.membershipsById.load(startedBy);
  }

  @ResolveField(() => MoneyModel, {
    description: 'What could be spent on capital, the share held back taken off.',
  })
  async ceiling(@Parent() { id }: Run) {
    const { items } = await this.detailsById.load(id);
    return toMoneyModel(items.spendableMinor, items.currency);
  }

  @ResolveField(() => RunProgress, { nullable: true, description: 'Empty while it waits.' })
  async progress(@Parent() { id }: Run) {
    const { progress, result } = await this.detailsById.load(id);
    const at = result ?? progress;
    return at && progressView(at);
  }

  @ResolveField(() => RunCertificate)
  async certificate(@Parent() { id }: Run) {
    const { items, progress, result } = await this.detailsById.load(id);
    return certificateView(result ?? progress, items);
  }

  @ResolveField(() => [String])
  async notes(@Parent() { id }: Run) {
    return (await this.detailsById.load(id)).result?.notes ?? [];
  }

  @ResolveField(() => [RunItem])
  async items(@Parent() { id }: Run) {
    return itemViews((await this.detailsById.load(id)).items);
  }

  @ResolveField(() => [RunLeftOut])
  async leftOut(@Parent() { id }: Run) {
    return (await this.detailsById.load(id)).items.leftOut;
  }

  @ResolveField(() => [RunPoint], { description: 'In order of cost: the best so far, then the result.' })
  async points(@Parent() { id, costAxis }: Run) {
    const { items, progress, result } = await this.detailsById.load(id);
    return pointViews(result ?? progress, items, costAxis);
  }

  @ResolveField(() => PointAlternatives)
  alternatives(@Parent() run: Run, @Args('pointIndex', { type: () => Int }) pointIndex: number) {
    return this.alternativesOf.ofPoint(run, pointIndex);
  }

  @ResolveField(() => Int, {
    nullable: true,
    description: 'Index of the point where more money begins to buy less.',
  })
  async kneeIndex(@Parent() { id }: Run) {
    return (await this.detailsById.load(id)).result?.kneeIndex ?? null;
  }

  @ResolveField(() => ChartPoints, { description: 'An even sample of the portfolios looked at.' })
  async lookedAt(@Parent() { id }: Run) {
    const { items, result } = await this.detailsById.load(id);
    return chartView(result?.lookedAt ?? [], items.currency);
  }

  @ResolveField(() => ChartPoints, {
    description: 'An even sample of those kept for a while and then beaten.',
  })
  async onceKept(@Parent() { id }: Run) {
    const { items, result } = await this.detailsById.load(id);
    return chartView(result?.onceKept ?? [], items.currency);
  }
}
