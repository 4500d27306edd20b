import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { MoneyModel, toMoneyModel } from '../common/models/money.model.js';
import { Quote } from './entities/quote.entity.js';

/** What the vendor wrote, in the vendor's currency. */
@Resolver(() => Quote)
export class QuoteAmountsResolver {
  @ResolveField(() => MoneyModel)
  unitPrice(@Parent() { unitPriceMinor, currency }: Quote) {
    return toMoneyModel(unitPriceMinor, currency);
  }

  @ResolveField(() => MoneyModel)
  delivery(@Parent() { deliveryMinor, currency }: Quote) {
    return toMoneyModel(deliveryMinor, currency);
  }

  @ResolveField(() => MoneyModel)
  installation(@Parent() { installationMinor, currency }: Quote) {
    return toMoneyModel(installationMinor, currency);
  }

  @ResolveField(() => MoneyModel)
  training(@Parent() { trainingMinor, currency }: Quote) {
    return toMoneyModel(trainingMinor, currency);
  }

  @ResolveField(() => MoneyModel)
  discount(@Parent() { discountMinor, currency }: Quote) {
    return toMoneyModel(discountMinor, currency);
  }

  @ResolveField(() => MoneyModel, {
    nullable: true,
    description: 'With VAT, for all pieces. Empty: no price given.',
  })
  serviceYearly(@Parent() { serviceYearlyMinor, currency }: Quote) {
    return serviceYearlyMinor === null ? null : toMoneyModel(serviceYearlyMinor, currency);
  }
}
