import { InvalidInputError } from '../common/domain-error.js';
import { readAmounts } from '../common/read-amounts.js';
import { amountInWords } from '../common/words.js';
import type { QuoteFieldsInput } from './dto/save-quote.input.js';
import { DiscountExceedsPrice } from './dto/save-quote.result.js';

/** One thousand million in a currency with cents, as for a single amount. */
const LARGEST_QUOTE_MINOR = 100_000_000_000;

/** The amounts of a quote in minor units of its currency, which must be one the money kernel knows. */
export function figuresOf({
  currency,
  unitPrice,
  delivery,
  installation,
  training,
  discount,
  serviceYearly,
}: QuoteFieldsInput) {
  const amounts = {
    unitPrice,
    delivery,
    installation,
    training,
    discount,
    serviceYearly: serviceYearly ?? null,
  };
  const minor = readAmounts(currency, 'fields.', amounts);
  return {
    unitPriceMinor: minor.unitPrice,
    deliveryMinor: minor.delivery,
    installationMinor: minor.installation,
    trainingMinor: minor.training,
    discountMinor: minor.discount,
    serviceYearlyMinor: minor.serviceYearly,
  };
}

type Figures = ReturnType<typeof figuresOf>;

/** A discount larger than everything quoted is refused; a sum too large to plan with is malformed. */
export function discountProblem(
  figures: Figures,
  quantity: number,
  currency: string,
): DiscountExceedsPrice | null {
  const { unitPriceMinor, deliveryMinor, installationMinor, trainingMinor, discountMinor } = figures;
  const quotedMinor = unitPriceMinor * quantity + deliveryMinor + installationMinor + trainingMinor;
  if (quotedMinor > LARGEST_QUOTE_MINOR) {
    const message = 'unitPrice: the whole quote comes to more than can be planned with here.';
    throw new InvalidInputError([{ field: 'fields.unitPrice', message }]);
  }
  if (discountMinor <= quotedMinor) return null;
  return new DiscountExceedsPrice(
    amountInWords(discountMinor, currency),
    amountInWords(quotedMinor, currency),
  );
}
