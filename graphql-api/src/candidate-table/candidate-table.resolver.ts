import { Args, Query, Resolver } from '@nestjs/graphql';
import { CandidatePageArgs } from './candidate-page.args.js';
import { CandidatePage } from './candidate-page.model.js';
import { CandidateTableService } from './candidate-table.service.js';

@Resolver(() => CandidatePage)
export class CandidateTableResolver {
  constructor(private readonly table: CandidateTableService) {}

  @Query(() => CandidatePage)
  candidates(@Args() args: CandidatePageArgs) {
    return this.table.page(args);
  }
}
