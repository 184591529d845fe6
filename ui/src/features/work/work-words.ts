import type { Role, WorkGroup } from '@brimgate/rules';

/** What a group of waiting things asks for. */
export const groupWords: Readonly<Record<WorkGroup['key'], { title: string; aside: string }>> = {
  'to-sign': { title: 'To sign', aside: 'oldest first' },
  'sent-back': { title: 'Sent back to you', aside: 'with a reason' },
  'ready-to-release': { title: 'Ready to release', aside: 'waits for nobody else' },
  'waiting-for-others': { title: 'Waiting for others', aside: 'in review' },
  drafts: { title: 'In hand', aside: 'neither sent for review nor released' },
  'to-acknowledge': { title: 'To acknowledge', aside: 'advisories for your yard' },
  'mail-not-delivered': { title: 'Mail that did not arrive', aside: 'parked or waiting for another try' },
  'lots-incomplete': { title: 'Lots with something missing', aside: 'their excretion is not determined' },
  'recently-released': { title: 'Being fed', aside: 'released lately' },
};

/** Said when nothing waits: what comes next for this role, and from whom. */
export const emptyWords: Readonly<Record<Role, { title: string; next: string }>> = {
  nutritionist: {
    title: 'Nothing waits for you',
    next: 'Enter a ration with its water to screen it; what it exceeds, and who signs, shows while you type.',
  },
  veterinarian: {
    title: 'Nothing waits for your signature',
    next: 'A ration comes here when a nutritionist sends it for review. What was fed before stands under Rations.',
  },
  compliance: {
    title: 'Nothing waits for you',
    next: 'Enter a lot with its weights and days, and the ledger counts what it excretes.',
  },
  'yard-manager': {
    title: 'Nothing waits for you',
    next: 'When a ration is released for your yard, its advisory comes here and by e-mail.',
  },
  administrator: {
    title: 'Nothing waits for you',
    next: 'Look after the yards’ addresses, caps and gates; what people did stands in the audit trail.',
  },
};

/** A finding to value and limit: what qualifies the limit and where the most comes from stand on the ration's page. */
export const brieflyFound = (detail: string): string =>
  detail.replace(/((?:above|below|near|within) the (?:limit|minimum) of [^(]+?) \(.*$/s, '$1.');
