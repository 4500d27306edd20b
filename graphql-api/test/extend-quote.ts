import type { Member } from './app.js';

const QUOTE = `query ($id: ID!) {
  quote(id: $id) {
    version number quoteDate pricesIncludeVat quantity warrantyYears serviceTier leadWeeks incoterm namedPlace paymentTerms
    vendor { name } unitPrice { amount currency } delivery { amount } installation { amount } training { amount }
    discount { amount } serviceYearly { amount }
  }
}`;

const UPDATE = `mutation ($input: UpdateQuoteInput!) {
  updateQuote(input: $input) { __typename ... on Quote { validUntil faults } }
}`;

/** The vendor lets the quote hold longer; everything else stays as it is. */
export async function extendQuote(coordinator: Member, id: string, validUntil: string) {
  const { quote } = await coordinator.get(QUOTE, { id });
  const { version, vendor, unitPrice, delivery, installation, training, discount, serviceYearly, ...rest } =
    quote;
  const fields = {
    ...rest,
    validUntil,
    vendorName: vendor.name,
    currency: unitPrice.currency,
    unitPrice: unitPrice.amount,
    delivery: delivery.amount,
    installation: installation.amount,
    training: training.amount,
    discount: discount.amount,
    serviceYearly: serviceYearly?.amount ?? null,
  };
  const { updateQuote } = await coordinator.get(UPDATE, { input: { id, version, fields } });
  if (updateQuote.validUntil !== validUntil) throw new Error(JSON.stringify(updateQuote));
}
