import type { Role, WorkItem } from '@brimgate/rules';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { axeViolations } from '../../test/axe-violations';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { aRefusal, stubApi } from '../../test/stub-api';
import WorkPage from './work-page';

const anItem = (overrides: Partial<WorkItem> = {}): WorkItem => ({
  kind: 'review',
  id: 'r1',
  title: 'Finisher 4',
  yard: 'Dry Fork',
  detail: 'Total sulfur 0.43 % of DM, limit 0.30',
  status: 'over',
  since: '2026-07-12T10:00:00.000Z',
  ...overrides,
});

const open = (role: Role, groups: unknown[]) => {
  stubApi({ 'GET /api/work': { body: { groups } } });
  return renderSignedIn(<WorkPage />, { session: aSession(role) });
};

describe('the work page', () => {
  it('shows what waits, why, and where to do it', async () => {
    open('veterinarian', [{ key: 'to-sign', items: [anItem()], total: 1 }]);
    expect(await screen.findByRole('heading', { name: 'To sign, 1' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Finisher 4' })).toHaveAttribute('href', '/review-desk/r1');
    expect(screen.getByText('Total sulfur 0.43 % of DM, limit 0.30')).toBeInTheDocument();
    expect(screen.getByText('over')).toBeInTheDocument();
  });

  it.each([
    ['ration', '/rations/r1'],
    ['review', '/review-desk/r1'],
    ['advisory', '/advisories/r1'],
    ['lot', '/lots/r1'],
  ] as const)('leads to the %s', async (kind, href) => {
    open('administrator', [{ key: 'drafts', items: [anItem({ kind })], total: 1 }]);
    expect(await screen.findByRole('link', { name: 'Finisher 4' })).toHaveAttribute('href', href);
  });

  it('leaves out groups in which nothing waits, and counts what is not listed', async () => {
    open('nutritionist', [
      { key: 'drafts', items: [], total: 0 },
      { key: 'waiting-for-others', items: [anItem()], total: 12 },
    ]);
    expect(await screen.findByRole('heading', { name: 'Waiting for others, 12' })).toBeInTheDocument();
    expect(screen.getByText('and 11 more')).toBeInTheDocument();
    expect(screen.queryByRole('heading', { name: /In hand/ })).not.toBeInTheDocument();
  });

  it.each([
    ['nutritionist', 'New ration'],
    ['compliance', 'New lot'],
  ] as const)('lets the %s start a %s', async (role, action) => {
    open(role, []);
    expect(await screen.findByRole('link', { name: action })).toBeInTheDocument();
  });

  it('offers nothing to start to those who start nothing, and says what comes next', async () => {
    open('yard-manager', []);
    expect(await screen.findByText(/its advisory comes here and by e-mail/)).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: /New/ })).not.toBeInTheDocument();
  });

  it('says when it could not be fetched and tries again', async () => {
    stubApi({ 'GET /api/work': [aRefusal(500, 'unexpected', 'Something went wrong'), { body: { groups: [] } }] });
    renderSignedIn(<WorkPage />, { session: aSession('nutritionist') });
    await userEvent.click(await screen.findByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Nothing waits for you')).toBeInTheDocument();
  });

  it('has no fault that axe can find', async () => {
    const { container } = open('nutritionist', [{ key: 'sent-back', items: [anItem()], total: 1 }]);
    await screen.findByRole('heading', { name: 'Sent back to you, 1' });
    expect(await axeViolations(container)).toEqual([]);
  });
});
