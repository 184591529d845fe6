import { queryText } from './lib/api-client';

/** Every link of the interface; the spec matches each against the route table. */
export const paths = {
  signIn: () => '/sign-in',
  work: () => '/',
  rations: () => '/rations',
  newRation: () => '/rations/new',
  ration: (rationId: string) => `/rations/${rationId}`,
  rationRelease: (rationId: string) => `/rations/${rationId}/release`,
  screening: (screeningId: string) => `/screenings/${screeningId}`,
  feedstuffs: () => '/feedstuffs',
  newFeedstuff: () => '/feedstuffs/new',
  feedstuff: (feedstuffId: string) => `/feedstuffs/${feedstuffId}`,
  water: () => '/water',
  reviewDesk: () => '/review-desk',
  review: (reviewId: string) => `/review-desk/${reviewId}`,
  advisories: () => '/advisories',
  advisory: (advisoryId: string) => `/advisories/${advisoryId}`,
  lots: () => '/lots',
  newLot: () => '/lots/new',
  lot: (lotId: string) => `/lots/${lotId}`,
  ledger: (query: { yard?: string; from?: string; to?: string } = {}) => `/ledger${queryText(query)}`,
  yards: () => '/yards',
  yard: (yardId: string) => `/yards/${yardId}`,
  people: () => '/people',
  audit: () => '/audit',
  sources: () => '/sources',
} as const;
