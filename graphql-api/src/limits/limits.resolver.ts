import { Args, ID, Mutation, Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { DecimalScalar } from '../common/scalars/decimal.scalar.js';
import { Site } from '../organisations/entities/site.entity.js';
import { SitesByIdLoader } from '../organisations/places-by-id.loader.js';
import { AskedByLimitLoader } from './asked-by-limit.loader.js';
import { CreateLimitInput, UpdateLimitInput } from './dto/save-limit.input.js';
import { SaveLimitResult } from './dto/save-limit.result.js';
import { Limit } from './entities/limit.entity.js';
import { LimitsService } from './limits.service.js';

@Resolver(() => Limit)
export class LimitsResolver {
  constructor(
    private readonly limits: LimitsService,
    private readonly sitesById: SitesByIdLoader,
    private readonly askedByLimit: AskedByLimitLoader,
  ) {}

  @Mutation(() => SaveLimitResult)
  createLimit(@Args('input') input: CreateLimitInput) {
    return this.limits.create(input);
  }

  @Mutation(() => SaveLimitResult)
  updateLimit(@Args('input') input: UpdateLimitInput) {
    return this.limits.update(input);
  }

  @Mutation(() => Boolean)
  deleteLimit(@Args('id', { type: () => ID }) id: string) {
    return this.limits.delete(id);
  }

  @ResolveField(() => Site, {
    nullable: true,
    description: 'Only candidates of this site count; all if empty.',
  })
  site(@Parent() { siteId }: Limit) {
    return siteId && this.sitesById.load(siteId);
  }

  @ResolveField(() => DecimalScalar, {
    description: 'What all candidates with a quote in force would take together.',
  })
  asked(@Parent() limit: Limit) {
    return this.askedByLimit.load(limit);
  }
}
