import type { Finding } from '@brimgate/rules';

const weights = { veterinarian: 4, compliance: 3, reason: 2, notice: 1, none: 0 } as const;

export interface WhySentences {
  /** Over its limit, the heaviest sign-off first. */
  asking: string[];
  /** Findings without an answer: they are named, never passed over. */
  notDetermined: string[];
}

/** The findings' own sentences, those that ask for a signature first. */
export function whySentences(findings: readonly Finding[]): WhySentences {
  const asked = findings.filter((finding) => finding.applies);
  const byWeight = [...asked].sort((one, other) => weights[other.signOff] - weights[one.signOff]);
  return {
    asking: byWeight.filter(({ status }) => status === 'over').map(sentenceOf),
    notDetermined: byWeight.filter(({ status }) => status === 'undetermined').map(sentenceOf),
  };
}

const sentenceOf = ({ why }: Finding) => (/[.!?]$/.test(why.trim()) ? why.trim() : `${why.trim()}.`);
