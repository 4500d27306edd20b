/** How the clinic group writes numbers and dates. Set once the viewer is known, read by money.ts and dates.ts. */
interface Conventions {
  /** BCP 47, such as "de-DE": decides decimal sign and the place of the currency. Texts stay English. */
  locale: string;
  /** IANA zone that the group's calendar dates are counted in. */
  timeZone: string;
}

let current: Conventions = { locale: 'en-GB', timeZone: 'UTC' };

export function conventions(): Conventions {
  return current;
}

export function setConventions(next: Conventions): void {
  current = { locale: supported(next.locale), timeZone: next.timeZone };
}

function supported(locale: string): string {
  try {
    return Intl.NumberFormat.supportedLocalesOf(locale)[0] ?? 'en-GB';
  } catch {
    return 'en-GB';
  }
}
