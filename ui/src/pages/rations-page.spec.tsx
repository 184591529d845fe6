import type { RationListItem } from '@brimgate/rules';
import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { RATION_ID, YARD_ID } from '../../test/builders/rations';
import { axeFaults } from '../../test/axe-faults';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { stubApi } from '../../test/stub-api';
import RationsPage from './rations-page';

const item: RationListItem = {
  id: RATION_ID,
  name: 'Finisher 9',
  yard: { id: YARD_ID, name: 'Bitter Creek' },
  stage: 'finishing',
  state: 'draft',
  versionNumber: 2,
  verdict: null,
  signOff: null,
  sulfurPctDm: null,
  savedAt: '2026-07-12T15:42:00.000Z',
  releasedVersionNumber: 1,
};

const openRations = (items: RationListItem[], query = '') => {
  stubApi({ [`GET /api/rations${query}`]: { body: { items, nextCursor: null } } });
  renderSignedIn(<RationsPage />, { session: aSession('nutritionist'), at: `/rations${query}`, route: '/rations' });
};

describe('the list of rations', () => {
  it('has no accessibility fault', async () => {
    openRations([item]);
    await screen.findByRole('link', { name: 'Finisher 9' });
    expect(await axeFaults()).toEqual([]);
  });

  it('says which version is fed while a later one is built, and never shows a figure it does not have', async () => {
    openRations([item]);
    expect(await screen.findByText('draft, version 2; version 1 is fed')).toBeInTheDocument();
    expect(screen.getByText('not determined')).toBeInTheDocument();
    expect(screen.getByText('not screened')).toBeInTheDocument();
  });

  it('tells that nothing exists yet from that nothing fits', async () => {
    openRations([]);
    expect(await screen.findByText('No rations yet')).toBeInTheDocument();
  });

  it('offers all rations when the filter hides them', async () => {
    openRations([], '?state=stopped');
    expect(await screen.findByRole('link', { name: 'Show all rations' })).toBeInTheDocument();
  });
});
