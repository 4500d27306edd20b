import { formatNumber } from './money';

/** Days, square metres, counts: as many decimals as the decimal text has, without idle zeros. "12.50" → "12.5". */
export function formatQuantity(value: string): string {
  const decimals = value.split('.')[1]?.replace(/0+$/u, '').length ?? 0;
  return formatNumber(value, decimals);
}
