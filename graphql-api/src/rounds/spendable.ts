/**
 * The ceiling without the share held back, in minor units, rounded down so that it is never passed.
 * Whole-number arithmetic: the percent has at most two decimals, so the divisor is 100 × 100.
 */
export function spendableMinor(ceilingMinor: number, heldBackPercent: string): number {
  const hundredths = BigInt(Math.round(Number(heldBackPercent) * 100));
  return Number((BigInt(ceilingMinor) * (10_000n - hundredths)) / 10_000n);
}
