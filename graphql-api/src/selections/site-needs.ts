import type { Candidate } from '../candidates/entities/candidate.entity.js';

/**
 * Who confirms a site need before an order (common practice; standards differ by country, and local codes and licensed
 * practice prevail). The product lists and asks; it never designs or clears.
 */
const WHO_CONFIRMS: Readonly<Record<string, string>> = {
  shielding: 'a qualified medical physicist or radiation protection expert, and the authority',
  'radiation protection': 'a qualified medical physicist or radiation protection expert, and the authority',
  electrical: 'a competent electrician or electrical engineer',
  'rf shielding': 'the MR safety expert, the MR medical lead and the installer',
  'quench pipe': 'the MR safety expert, the MR medical lead and the installer',
  'medical gases': 'the authorised person for medical gases',
  'compressed air': 'the authorised person for medical gases',
  steam: 'the sterile-supply lead, a validator and the inspection body',
  'laser room': 'the laser protection adviser or laser safety officer',
  'floor load': 'a structural engineer',
  'ceiling load': 'a structural engineer',
  hvac: 'a building-services engineer',
  ventilation: 'a building-services engineer and infection control',
  'dust extraction': 'a building-services engineer',
  water: 'a building-services engineer and infection control',
  drain: 'a building-services engineer and infection control',
  'radio network': 'IT security and the data protection officer',
};

export const SITE_NEEDS_CAUTION =
  'Listed needs come from the request and quotes. They are not checked by this tool. A qualified person must confirm them in writing before an order.';

/** One sentence for each need of these candidates: what, where asked for, confirmed by whom. */
export function siteNeedSentences(candidates: readonly Candidate[]): string[] {
  const needs = [...new Set(candidates.flatMap(({ siteNeeds }) => siteNeeds))].sort();
  return needs.map((need) => {
    const codes = candidates.filter(({ siteNeeds }) => siteNeeds.includes(need)).map(({ code }) => code);
    const who = WHO_CONFIRMS[need.toLowerCase()] ?? 'a qualified person';
    return `${need.charAt(0).toUpperCase()}${need.slice(1)} (${codes.join(', ')}): ${who}.`;
  });
}
