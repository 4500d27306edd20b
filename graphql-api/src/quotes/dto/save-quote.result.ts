import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { dayInWords } from '../../common/words.js';
import { Quote } from '../entities/quote.entity.js';

@ObjectType()
export class UnknownCurrency {
  @Field()
  message: string;

  constructor(currency: string, known: readonly string[]) {
    this.message =
      `The round has no exchange rate for ${currency}, so the quote cannot be compared. ` +
      `Enter it in ${known.join(', ')}, or have a rate for ${currency} set in the round first.`;
  }
}

@ObjectType()
export class QuoteNumberTaken {
  @Field()
  message: string;

  constructor(number: string, vendorName: string) {
    this.message = `Quote ${number} of ${vendorName} is already entered for this candidate. Change that one, or check the number.`;
  }
}

@ObjectType()
export class QuoteDatesReversed {
  @Field()
  message: string;

  constructor(quoteDate: string, validUntil: string) {
    this.message = `The quote would run out on ${dayInWords(validUntil)}, before its own date, ${dayInWords(quoteDate)}. Check both dates.`;
  }
}

@ObjectType()
export class DiscountExceedsPrice {
  @Field()
  message: string;

  /** Both as text with the currency. */
  constructor(discount: string, quoted: string) {
    this.message = `The discount, ${discount}, is more than all that is quoted, ${quoted}. Check the discount.`;
  }
}

export const SaveQuoteResult = createUnionType({
  name: 'SaveQuoteResult',
  types: () => [Quote, UnknownCurrency, QuoteNumberTaken, QuoteDatesReversed, DiscountExceedsPrice] as const,
});

export type SaveQuoteRefusal = UnknownCurrency | QuoteNumberTaken | QuoteDatesReversed | DiscountExceedsPrice;
