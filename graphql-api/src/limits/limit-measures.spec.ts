import { LimitMeasure } from './entities/limit.entity.js';
import { boundOf, formatUse, useOf, type MeasuredCandidate } from './limit-measures.js';

const { ADDED_RUNNING_COST, INSTALLATION_DAYS, FLOOR_AREA, CANDIDATES } = LimitMeasure;

const aCandidate = (facts: Partial<MeasuredCandidate> = {}): MeasuredCandidate => ({
  siteId: 'north',
  addedRunningYearlyMinor: -125_050,
  installationDays: '0.29',
  floorAreaM2: '12.50',
  ...facts,
});

describe('what a candidate takes of a limit', () => {
  it.each([
    ['running cost in minor units, below zero where it is saved', ADDED_RUNNING_COST, -125_050],
    ['days in hundredths, without the slips of floating point', INSTALLATION_DAYS, 29],
    ['floor area in hundredths of a square metre', FLOOR_AREA, 1_250],
    ['one for being a candidate', CANDIDATES, 1],
  ])('is %s', (_what, measure, use) => {
    expect(useOf({ measure, siteId: null }, aCandidate())).toBe(use);
  });

  it('is nothing where the limit is of another site', () => {
    expect(useOf({ measure: CANDIDATES, siteId: 'south' }, aCandidate())).toBe(0);
    expect(useOf({ measure: CANDIDATES, siteId: 'north' }, aCandidate())).toBe(1);
  });
});

describe('the bound of a limit', () => {
  it.each([
    ['30000.00', ADDED_RUNNING_COST, 'EUR', 3_000_000],
    ['-500.5', ADDED_RUNNING_COST, 'EUR', -50_050],
    ['30000.00', ADDED_RUNNING_COST, 'JPY', 30_000],
    ['50.00', INSTALLATION_DAYS, 'EUR', 5_000],
    ['14.25', FLOOR_AREA, 'EUR', 1_425],
    ['3.00', CANDIDATES, 'EUR', 3],
  ])('%s for %s in %s is %s', (text, measure, currency, bound) => {
    expect(boundOf(measure, text, currency)).toBe(bound);
  });

  it.each([
    ['parts of a candidate', '1.5', CANDIDATES, 'EUR'],
    ['cents of a currency without any', '30000.5', ADDED_RUNNING_COST, 'JPY'],
    ['thousandths of a day', '1.125', INSTALLATION_DAYS, 'EUR'],
  ])('cannot have %s', (_what, text, measure, currency) => {
    expect(() => boundOf(measure, text, currency)).toThrow(text);
  });
});

describe('a sum of uses', () => {
  it.each([
    [2_616_000, ADDED_RUNNING_COST, '26160.00'],
    [5_000, INSTALLATION_DAYS, '50'],
    [1_250, FLOOR_AREA, '12.5'],
    [29, CANDIDATES, '29'],
  ])('%s of %s reads %s', (use, measure, text) => {
    expect(formatUse(measure, use, 'EUR')).toBe(text);
  });
});
