import { Args, ID, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { MoneyModel, toMoneyModel } from '../common/models/money.model.js';
import { OwnCurrencyLoader } from '../organisations/own-currency.loader.js';
import { SetCeilingInput } from './dto/set-ceiling.input.js';
import { AdvanceRoundInput, AdvanceRoundResult, StepBackRoundInput } from './dto/step-round.input.js';
import { ExchangeRate } from './entities/exchange-rate.entity.js';
import { Round } from './entities/round.entity.js';
import { RoundsService } from './rounds.service.js';
import { spendableMinor } from './spendable.js';

@Resolver(() => Round)
export class RoundsResolver {
  constructor(
    private readonly rounds: RoundsService,
    private readonly ownCurrency: OwnCurrencyLoader,
  ) {}

  @Query(() => Round)
  round(@Args('id', { type: () => ID }) id: string) {
    return this.rounds.find(id);
  }

  @Mutation(() => Round)
  setCeiling(@Args('input') input: SetCeilingInput) {
    return this.rounds.setCeiling(input);
  }

  @Mutation(() => AdvanceRoundResult)
  advanceRound(@Args('input') input: AdvanceRoundInput) {
    return this.rounds.advance(input);
  }

  @Mutation(() => Round)
  stepBackRound(@Args('input') input: StepBackRoundInput) {
    return this.rounds.stepBack(input);
  }

  @ResolveField(() => MoneyModel)
  async ceiling(@Parent() round: Round) {
    return toMoneyModel(round.ceilingMinor, await this.ownCurrency.current());
  }

  @ResolveField(() => MoneyModel, { description: 'The ceiling without the share held back.' })
  async spendable(@Parent() round: Round) {
    const minor = spendableMinor(round.ceilingMinor, round.heldBackPercent);
    return toMoneyModel(minor, await this.ownCurrency.current());
  }

  @ResolveField(() => [ExchangeRate])
  exchangeRates(@Parent() round: Round) {
    return this.rounds.exchangeRates(round.id);
  }
}
