import type { SignOff } from '@brimgate/reference-tables';
import type { RationState, RationView } from '@brimgate/rules';

export const stateWords: Readonly<Record<RationState, string>> = {
  draft: 'draft',
  screened: 'screened',
  'in-review': 'in review',
  signed: 'signed',
  'sent-back': 'sent back',
  released: 'released',
  superseded: 'superseded',
  stopped: 'stopped',
};

export const stateOptions = Object.entries(stateWords).map(([value, label]) => ({ value, label }));

/** What the person who builds rations can do with this one now; one of them at a time is the page's main act. */
export type NextAct = 'screen' | 'submit' | 'wait' | 'release' | 'none';

type GateFacts = Pick<RationView, 'state' | 'screening' | 'gate' | 'review'>;

const openRequirements = (ration: GateFacts) =>
  ration.gate?.requirements.filter((requirement) => !requirement.isSatisfied) ?? [];

/** Whether a reason given with the release would be all that is missing. */
export const needsOnlyReason = (ration: GateFacts): boolean =>
  openRequirements(ration).every(({ signOff }) => signOff === 'reason');

export function nextAct(ration: GateFacts, hasUnscreenedChanges: boolean): NextAct {
  if (hasUnscreenedChanges || !ration.screening) return 'screen';
  if (ration.state === 'released' || ration.state === 'superseded' || ration.state === 'stopped') return 'none';
  if (ration.gate?.isOpen || needsOnlyReason(ration)) return ration.state === 'sent-back' ? 'submit' : 'release';
  return ration.state === 'in-review' ? 'wait' : 'submit';
}

const signers: Partial<Record<SignOff, string>> = {
  veterinarian: 'the veterinarian',
  compliance: 'compliance staff',
};

/** Whose signature is still missing, in words: "the veterinarian and compliance staff". */
export function awaitedSigners(ration: GateFacts): string {
  const awaited = openRequirements(ration).flatMap(({ signOff }) => signers[signOff] ?? []);
  return [...new Set(awaited)].join(' and ');
}

/** Where the ration stands and who moves next, in one sentence. */
export function standing(ration: GateFacts): string {
  const awaited = awaitedSigners(ration);
  switch (ration.state) {
    case 'draft':
      return 'A draft: the nutritionist screens it next.';
    case 'screened':
      if (awaited !== '')
        return `Screened: before release it needs ${awaited}. The nutritionist sends it for review next.`;
      return needsOnlyReason(ration) && !ration.gate?.isOpen
        ? 'Screened: the nutritionist releases it next, with a reason for what is over.'
        : 'Screened: nobody has to sign. The nutritionist releases it next.';
    case 'in-review':
      return awaited === '' ? 'In review.' : `In review: it waits for ${awaited}.`;
    case 'signed':
      return awaited === '' ? 'Signed: the nutritionist releases it next.' : `Signed, but it still needs ${awaited}.`;
    case 'sent-back':
      return 'Sent back: the nutritionist mends it and screens it again.';
    case 'released':
      return 'Released: this version is fed.';
    case 'superseded':
      return 'Superseded: a later version is fed.';
    case 'stopped':
      return 'Stopped: it is no longer to be fed.';
  }
}
