import { CostingError } from './costing-error.js';

export function checkNumber(field: string, value: number): void {
  if (!Number.isFinite(value)) throw new CostingError(field, `must be a number, got ${value}.`);
}

export function checkWhole(field: string, value: number, least: number): void {
  if (!Number.isSafeInteger(value) || value < least) {
    throw new CostingError(field, `must be a whole number of at least ${least}, got ${value}.`);
  }
}

/** A whole number of minor units, below zero for a saving. */
export function checkMinor(field: string, value: number): void {
  if (!Number.isSafeInteger(value)) throw new CostingError(field, `must be a whole number, got ${value}.`);
}

/** A discount rate, inflation or price rise: 0.035 for 3.5 %, above −1. */
export function checkRate(field: string, value: number): void {
  if (!Number.isFinite(value) || value <= -1) {
    throw new CostingError(field, `must be a rate above -1 (0.035 for 3.5 %), got ${value}.`);
  }
}

export function checkYear(field: string, value: number, years: number): void {
  checkWhole(field, value, 0);
  if (value > years) throw new CostingError(field, `must not lie after year ${years}, got ${value}.`);
}

/** A day as 2027-02-15; days that no calendar has are refused. */
export function checkDay(field: string, value: string): void {
  const day = /^\d{4}-\d{2}-\d{2}$/.test(value) ? new Date(`${value}T00:00:00Z`) : undefined;
  if (day && !Number.isNaN(day.getTime()) && day.toISOString().startsWith(value)) return;
  throw new CostingError(field, `must be a day such as 2027-02-15, got ${value}.`);
}
