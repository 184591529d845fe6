import type { Role } from '@brimgate/rules';
import { paths } from '../paths';

export interface NavigationItem {
  label: string;
  to: string;
}

const work = { label: 'Work', to: paths.work() };
const reviewDesk = { label: 'Review desk', to: paths.reviewDesk() };
const rations = { label: 'Rations', to: paths.rations() };
const feedstuffs = { label: 'Feedstuffs', to: paths.feedstuffs() };
const water = { label: 'Water', to: paths.water() };
const advisories = { label: 'Advisories', to: paths.advisories() };
const lots = { label: 'Lots', to: paths.lots() };
const ledger = { label: 'Ledger', to: paths.ledger() };
const yards = { label: 'Yards', to: paths.yards() };
const people = { label: 'People', to: paths.people() };
const audit = { label: 'Audit', to: paths.audit() };

/** What each role comes for stands first; what it may not read is absent. */
export const navigationOf: Readonly<Record<Role, readonly NavigationItem[]>> = {
  nutritionist: [work, rations, feedstuffs, water, advisories, lots, ledger],
  veterinarian: [reviewDesk, work, rations, feedstuffs, water, advisories, lots],
  compliance: [work, reviewDesk, lots, ledger, rations, water, advisories],
  'yard-manager': [work, advisories, rations, water, lots],
  administrator: [work, yards, people, audit, rations, feedstuffs, water, advisories, lots, ledger],
};
