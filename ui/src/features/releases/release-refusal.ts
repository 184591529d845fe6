import type { RationView } from '@brimgate/rules';

/** Why this ration cannot be released now, in words; null when it can, at most with a reason still to be given. */
export function releaseRefusal(ration: Pick<RationView, 'screening' | 'gate' | 'state'>): string | null {
  if (ration.state === 'released') return 'This version is released already';
  if (!ration.screening || !ration.gate) return 'What stands in the ration now has not been screened';
  const missing = ration.gate.requirements.filter(({ isSatisfied, signOff }) => !isSatisfied && signOff !== 'reason');
  if (missing.length > 0) return missing.map(({ answer }) => answer).join('; ');
  const lacksOnlyReason = ration.gate.requirements.some(({ isSatisfied }) => !isSatisfied);
  return ration.gate.isOpen || lacksOnlyReason
    ? null
    : 'It was sent back, or something is still missing before release';
}
