/** What solving a relaxation counts for, in branches of an enumeration: the unit in which effort is reckoned. */
export const RELAXATION = 500;
