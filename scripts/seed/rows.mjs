import { randomUUID } from 'node:crypto';

const MINOR = 100;

/** Turns one organisation of the demo scenario into rows by table, in the order in which they can be inserted. */
export function rowsOf(scenario, people) {
  const ids = {
    site: {},
    department: {},
    member: {},
    candidate: {},
    vendor: {},
    criterion: {},
    round: randomUUID(),
  };
  return [
    ['site', scenario.sites.map((site) => siteRow(site, ids))],
    ['department', scenario.departments.map((name) => ({ id: (ids.department[name] = randomUUID()), name }))],
    ['membership', people.map((person) => membershipRow(person, ids))],
    ['round', [roundRow(scenario, ids)]],
    ['exchange_rate', exchangeRateRows(scenario, ids)],
    ['criterion', scenario.criteria.map((criterion, position) => criterionRow(criterion, position, ids))],
    ['candidate', scenario.candidates.map((candidate) => candidateRow(candidate, scenario, ids))],
    ['vendor', vendorRows(scenario, ids)],
    ['quote', scenario.quotes.map((quote) => quoteRow(quote, ids))],
    ...linkRows(scenario, ids),
    ['round_limit', limitRows(scenario, ids)],
    ['score', scenario.candidates.flatMap((candidate) => scoreRows(candidate, ids))],
  ];
}

/** "C01" of the scenario reads "C-01" in the product. */
export function codeOf(id) {
  return `${id[0]}-${id.slice(1)}`;
}

function siteRow({ id: code, name, note }, ids) {
  return { id: (ids.site[code] = randomUUID()), code, name, note };
}

function membershipRow({ userId, name, email, roles, title, assessor, department }, ids) {
  const id = randomUUID();
  if (assessor) ids.member[assessor] = id;
  return {
    id,
    user_id: userId,
    name,
    email,
    title,
    roles,
    department_id: department ? ids.department[department] : null,
  };
}

function roundRow({ round, assumptions, constraints, stage }, ids) {
  const closing = round.calendar.find(({ what }) => what.startsWith('Scoring closes'));
  return {
    id: ids.round,
    name: round.name,
    stage,
    opened_on: round.calendar[0].date,
    scoring_closes_on: closing.date,
    decision_date: round.decisionDate,
    ceiling_minor: constraints.capitalBudgetGross * MINOR,
    held_back_percent: constraints.contingencyPercent,
    discount_rate: assumptions.realDiscountRate,
    vat_rate: assumptions.vatRate,
    price_basis: assumptions.priceBasis,
  };
}

function exchangeRateRows({ assumptions, currency, round }, ids) {
  return Object.entries(assumptions.exchangeRates)
    .filter(([code]) => code !== currency)
    .map(([code, rate]) => ({
      id: randomUUID(),
      round_id: ids.round,
      currency: code,
      rate,
      as_of: round.calendar[0].date,
      source: 'invented for the demo',
    }));
}

function criterionRow({ id: key, name, anchors, rawSwingWeight }, position, ids) {
  const [low, high] = anchors.split(/;\s*100 = /);
  const id = (ids.criterion[key] = randomUUID());
  return {
    id,
    round_id: ids.round,
    name,
    low_anchor: sentence(low.replace(/^0 = /, '')),
    high_anchor: sentence(high),
    swing_weight: rawSwingWeight,
    position,
  };
}

function candidateRow(candidate, { sites }, ids) {
  const site = sites.find(({ id }) => id === candidate.site);
  return {
    id: (ids.candidate[candidate.id] = randomUUID()),
    round_id: ids.round,
    code: codeOf(candidate.id),
    name: candidate.name,
    need: `${sentence(candidate.kind)} asked for by ${candidate.department} at ${site.name}.`,
    department_id: ids.department[candidate.department],
    site_id: ids.site[candidate.site],
    kind: candidate.kind.toUpperCase().replace(' ', '_'),
    generic_group: candidate.genericGroup,
    quantity: candidate.quantity,
    useful_life_years: candidate.usefulLifeYears,
    residual_percent: candidate.residualPercentOfUnitPrice,
    works_net_minor: candidate.worksEstimateNet * MINOR,
    consumables_yearly_minor: candidate.consumablesYearlyGross * MINOR,
    energy_yearly_minor: candidate.energyYearlyGross * MINOR,
    current_running_yearly_minor: candidate.currentRunningYearlyGross * MINOR,
    installation_days: candidate.installDaysInHouse,
    floor_area_m2: candidate.floorAreaM2,
    mandatory: candidate.mandatory,
    mandatory_reason: candidate.mandatoryReason ? sentence(candidate.mandatoryReason) : '',
    site_needs: candidate.facilityRequirements,
  };
}

function vendorRows({ quotes }, ids) {
  const names = [...new Set(quotes.map(({ vendor }) => vendor))];
  return names.map((name) => ({ id: (ids.vendor[name] = randomUUID()), name }));
}

function quoteRow(quote, ids) {
  return {
    id: randomUUID(),
    candidate_id: ids.candidate[quote.id.split('-')[0]],
    vendor_id: ids.vendor[quote.vendor],
    number: quote.id,
    quote_date: quote.quoteDate,
    valid_until: quote.validUntil,
    currency: quote.currency,
    prices_include_vat: quote.pricesIncludeVat,
    unit_price_minor: quote.unitPriceNet * MINOR,
    quantity: quote.quantity,
    delivery_minor: quote.deliveryNet * MINOR,
    installation_minor: quote.installationNet * MINOR,
    training_minor: quote.trainingNet * MINOR,
    discount_minor: quote.discountNet * MINOR,
    warranty_years: quote.warrantyYears,
    service_tier: quote.serviceTier,
    service_yearly_minor: quote.serviceYearlyGross === null ? null : quote.serviceYearlyGross * MINOR,
    lead_weeks: quote.leadWeeks,
    incoterm: quote.incoterm,
    named_place: quote.namedPlace,
    payment_terms: quote.paymentTerms,
  };
}

function linkRows({ dependencies, exclusiveGroups }, ids) {
  const needs = dependencies.map(({ item, needs: members, why }) =>
    link('NEEDS', ids.candidate[item], members, why, ids),
  );
  const eitherOr = exclusiveGroups.map(({ items, why }) => link('EITHER_OR', null, items, why, ids));
  const all = [...needs, ...eitherOr];
  return [
    ['link', all.map(({ row }) => row)],
    ['link_member', all.flatMap(({ members }) => members)],
  ];
}

function link(kind, candidateId, items, why, ids) {
  const id = randomUUID();
  return {
    row: { id, round_id: ids.round, kind, candidate_id: candidateId, reason: sentence(why) },
    members: items.map((item) => ({ id: randomUUID(), link_id: id, candidate_id: ids.candidate[item] })),
  };
}

function limitRows({ sites, constraints }, ids) {
  const row = (name, measure, site, least, most) => ({
    id: randomUUID(),
    round_id: ids.round,
    name,
    measure,
    site_id: site,
    least,
    most,
  });
  return [
    row('Added running cost a year', 'ADDED_RUNNING_COST', null, null, constraints.incrementalRunningCap),
    row('Installation days in house', 'INSTALLATION_DAYS', null, null, constraints.installDaysCap),
    ...sites.map(({ id, name }) =>
      row(`Floor area, ${name}`, 'FLOOR_AREA', ids.site[id], null, constraints.floorBySite[id]),
    ),
    ...sites.map(({ id, name }) =>
      row(`Candidates at ${name}`, 'CANDIDATES', ids.site[id], constraints.minItemsBySite[id], null),
    ),
  ];
}

function scoreRows({ id, ratings }, ids) {
  return Object.entries(ratings).flatMap(([assessor, byCriterion]) =>
    Object.entries(byCriterion).map(([criterion, points]) => ({
      id: randomUUID(),
      candidate_id: ids.candidate[id],
      criterion_id: ids.criterion[criterion],
      membership_id: ids.member[assessor],
      points,
    })),
  );
}

function sentence(text) {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
