import type { CertificateStatus, RunState } from '../../generated/graphql';
import { formatPercent } from '../../lib/money';
import type { IconName } from '../../ui/icon';
import type { TagTone } from '../../ui/tag';

export function isActive(state: RunState): boolean {
  return state === 'WAITING' || state === 'SEARCHING';
}

interface Standing {
  state: RunState;
  certificate: { status: CertificateStatus; gapPercent?: number | null };
}

interface StateTag {
  text: string;
  tone: TagTone;
  icon: IconName;
}

/** How a run stands, in the words of its tag. */
export function stateTag({ state, certificate }: Standing): StateTag {
  switch (state) {
    case 'WAITING':
      return { text: 'Waiting', tone: 'plain', icon: 'clock' };
    case 'SEARCHING':
      return { text: searching(certificate), tone: 'plain', icon: 'clock' };
    case 'FAILED':
      return { text: 'Failed', tone: 'bad', icon: 'warn' };
    case 'INFEASIBLE':
      return { text: 'Limits collide', tone: 'bad', icon: 'warn' };
    case 'STOPPED':
      return { text: `Stopped and kept, ${lowerFirst(proof(certificate))}`, tone: 'caution', icon: 'stop' };
    case 'FINISHED':
      return finishedTag(certificate);
  }
}

function finishedTag(certificate: Standing['certificate']): StateTag {
  if (certificate.status === 'COMPLETE') return { text: 'Proven complete', tone: 'good', icon: 'ok' };
  if (certificate.status === 'BOUNDED') return { text: proof(certificate), tone: 'caution', icon: 'clock' };
  return { text: `Ended, ${proof(certificate)}`, tone: 'caution', icon: 'warn' };
}

/** The gap beside the word once one is proven: while a search goes on, it shrinks. */
function searching(certificate: Standing['certificate']): string {
  const { status, gapPercent } = certificate;
  if (status !== 'BOUNDED' || gapPercent == null) return 'Searching';
  return `Searching, ${lowerFirst(proof(certificate))}`;
}

function lowerFirst(text: string): string {
  return text.charAt(0).toLowerCase() + text.slice(1);
}

function proof({ status, gapPercent }: Standing['certificate']): string {
  if (status !== 'BOUNDED') return 'not yet proven';
  if (gapPercent === null || gapPercent === undefined) return 'Within a bound';
  return `Within ${formatPercent(gapPercent / 100, 1)} of the bound`;
}

/** Seconds as "12 s", "4 min", "1 h 5 min". */
export function elapsedText(seconds: number): string {
  const whole = Math.max(0, Math.floor(seconds));
  if (whole < 120) return `${whole}\u00a0s`;
  const minutes = Math.floor(whole / 60);
  if (minutes < 60) return `${minutes}\u00a0min`;
  return `${Math.floor(minutes / 60)}\u00a0h ${minutes % 60}\u00a0min`;
}
