import { Args, ID, Mutation, Query, Resolver } from '@nestjs/graphql';
import { SaveScoreInput } from './dto/save-score.input.js';
import { Score } from './entities/score.entity.js';
import { ScoreSheet } from './models/score-sheet.model.js';
import { ScoresService } from './scores.service.js';

@Resolver(() => Score)
export class ScoresResolver {
  constructor(private readonly scores: ScoresService) {}

  @Query(() => ScoreSheet)
  scoreSheet(@Args('roundId', { type: () => ID }) roundId: string) {
    return this.scores.sheet(roundId);
  }

  @Mutation(() => Score)
  saveScore(@Args('input') input: SaveScoreInput) {
    return this.scores.save(input);
  }
}
