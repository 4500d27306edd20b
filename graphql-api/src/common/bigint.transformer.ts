import type { ValueTransformer } from 'typeorm';

/** bigint columns come as text; money and sizes stay within 2^53, which is checked here. */
export const safeInteger: ValueTransformer = {
  to: (value: number | null | undefined) => value,
  from: (value: string | null) => {
    if (value === null) return null;
    const number = Number(value);
    if (!Number.isSafeInteger(number)) throw new Error(`${value} is no safe integer.`);
    return number;
  },
};
