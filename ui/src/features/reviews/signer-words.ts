import type { Decision, SignerRole } from '@brimgate/rules';

export const signerWords: Readonly<Record<SignerRole, string>> = {
  veterinarian: 'veterinarian',
  compliance: 'compliance staff',
};

/** "Veterinarian and compliance staff"; an empty list means that nobody is waited for. */
export function awaitsWords(awaits: readonly SignerRole[]): string {
  if (awaits.length === 0) return 'nobody';
  return awaits.map((role) => signerWords[role]).join(' and ');
}

export const decisionWords: Readonly<Record<Decision, { choice: string; meaning: string; done: string }>> = {
  concur: { choice: 'Concur', meaning: 'this version only', done: 'concurred' },
  'concur-with-conditions': {
    choice: 'Concur with conditions',
    meaning: 'they travel with the release and stand in the advisory',
    done: 'concurred with conditions',
  },
  'send-back': {
    choice: 'Send back',
    meaning: 'with a reason; the ration becomes a draft again',
    done: 'sent it back',
  },
};

/** A content hash short enough to read aloud: `5f2c 91ab … 77e0`. */
export function shortHash(contentHash: string): string {
  return `${contentHash.slice(0, 4)} ${contentHash.slice(4, 8)} … ${contentHash.slice(-4)}`;
}
