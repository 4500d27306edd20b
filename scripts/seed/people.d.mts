import type { DemoPerson } from './demo.mjs';

export const PEOPLE: Record<'T1' | 'T2', DemoPerson[]>;
