/** Every action that the trail knows, and how it reads. The names in the data are those at the time. */
const SENTENCES = {
  'demo.loaded': () => 'Demo data loaded',
  'session.opened': () => 'Signed in',
  'round.ceiling': (d) => `Budget ceiling set to ${d.after}, was ${d.before}`,
  'round.stage': (d) => `Round moved from ${stageName(d.before)} to ${stageName(d.after)}`,
  'candidate.created': () => 'Candidate added',
  'candidate.changed': () => 'Candidate changed',
  'quote.created': (d) => `Quote ${d.number} of ${d.vendor} entered`,
  'quote.changed': (d) => `Quote ${d.number} of ${d.vendor} changed`,
  'quote.kept': (d) =>
    d.number ? `Quote ${d.number} of ${d.vendor} kept` : 'Choice of the quote left to the rule',
  'document.uploaded': (d) => `Document ${d.fileName} uploaded`,
  'document.opened': (d) => `Document ${d.fileName} opened`,
  'limit.created': (d) => `Limit “${d.name}” added`,
  'limit.changed': (d) => `Limit “${d.name}” changed`,
  'limit.deleted': (d) => `Limit “${d.name}” removed`,
  'score.saved': () => 'Score given',
  'run.started': (d) => `Run ${d.number} started`,
  'run.stop': (d) => `Run ${d.number} asked to stop`,
  'run.ended': (d) => `Run ${d.number} ended: ${d.outcome}`,
  'selection.submitted': (d) => `Portfolio of run ${d.run} sent for approval, memo ${d.memo}`,
  'selection.approved': (d) => `Memo ${d.memo} approved`,
  'selection.returned': (d) => `Memo ${d.memo} returned`,
  'selection.declined': (d) => `Memo ${d.memo} declined`,
} satisfies Record<string, (data: Record<string, string>) => string>;

/** "SEARCH" reads "Search". */
function stageName(stage: string): string {
  return stage.charAt(0) + stage.slice(1).toLowerCase();
}

export type AuditAction = keyof typeof SENTENCES;

export interface AuditData {
  /** What it happened to, or the reason given: the second line of an entry. */
  detail?: string;
  [name: string]: string | number | boolean | null | undefined;
}

export function sentenceOf(action: string, data: AuditData): string {
  const sentence = (SENTENCES as Record<string, ((data: Record<string, string>) => string) | undefined>)[
    action
  ];
  const words = Object.fromEntries(Object.entries(data).map(([name, value]) => [name, String(value ?? '')]));
  return sentence ? sentence(words) : action;
}
