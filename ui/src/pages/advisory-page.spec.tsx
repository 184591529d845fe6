import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { aDelivery, anAdvisory } from '../../test/an-advisory';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { aRefusal, stubApi } from '../../test/stub-api';
import AdvisoryPage from './advisory-page';

const advisory = anAdvisory();
const GET = `GET /api/advisories/${advisory.id}`;
const ACKNOWLEDGE = `POST /api/advisories/${advisory.id}/acknowledgement`;
const asRole = (role: Parameters<typeof aSession>[0]) => ({
  session: aSession(role),
  at: `/advisories/${advisory.id}`,
  route: '/advisories/:advisoryId',
});

describe('an advisory', () => {
  it('is acknowledged by the yard manager, once', async () => {
    const read = anAdvisory({ acknowledgedBy: 'Robin Example', acknowledgedAt: '2026-07-12T16:00:00.000Z' });
    const calls = stubApi({ [GET]: { body: advisory }, [ACKNOWLEDGE]: { body: read } });
    renderSignedIn(<AdvisoryPage />, asRole('yard-manager'));
    await userEvent.click(await screen.findByRole('button', { name: 'Acknowledge' }));
    expect(await screen.findByText(/^Acknowledged by/)).toHaveTextContent(
      'Acknowledged by Robin Example, 12 July 2026, 11:00 (America/Chicago).',
    );
    expect(await screen.findByText(/The nutritionist sees that the yard has read it/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Acknowledge' })).not.toBeInTheDocument();
    expect(calls.filter((call) => call.method === 'POST').map((call) => call.headers.has('Idempotency-Key'))).toEqual([
      true,
    ]);
  });

  it('says to anybody else who acknowledges it', async () => {
    stubApi({ [GET]: { body: advisory } });
    renderSignedIn(<AdvisoryPage />, asRole('nutritionist'));
    expect(await screen.findByText(/a manager of Dry Fork does that after reading it/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Acknowledge' })).not.toBeInTheDocument();
  });

  it('shows why an acknowledgement was refused and lets it be tried again', async () => {
    stubApi({ [GET]: { body: advisory }, [ACKNOWLEDGE]: aRefusal(409, 'in-flight', 'The same request is under way') });
    renderSignedIn(<AdvisoryPage />, asRole('yard-manager'));
    await userEvent.click(await screen.findByRole('button', { name: 'Acknowledge' }));
    expect(await screen.findByText('The same request is under way')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Acknowledge' })).toBeInTheDocument();
  });

  it('runs nothing that a mail may hold', async () => {
    stubApi({ [GET]: { body: advisory } });
    renderSignedIn(<AdvisoryPage />, asRole('yard-manager'));
    const mail = await screen.findByTitle(`Mail: ${advisory.subject}`);
    expect(mail.getAttribute('sandbox')?.split(' ')).not.toContain('allow-scripts');
  });
});

describe('a mail that was parked', () => {
  const parked = anAdvisory({
    deliveries: [aDelivery({ state: 'parked', attempts: 3, lastError: '550 no such mailbox', sentAt: null })],
  });
  const [delivery] = parked.deliveries;
  const RETRY = `POST /api/advisories/${advisory.id}/deliveries/${delivery?.id}/retry`;

  it('names the reason and is sent again by whoever may', async () => {
    const queued = anAdvisory({ deliveries: [aDelivery({ state: 'queued', attempts: 3, sentAt: null })] });
    stubApi({ [GET]: { body: parked }, [RETRY]: { body: queued } });
    renderSignedIn(<AdvisoryPage />, asRole('nutritionist'));
    expect(await screen.findByText(/parked after 3 tries: 550 no such mailbox/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Send again' }));
    await waitFor(() => expect(screen.getByText('Queued')).toBeInTheDocument());
    expect(await screen.findByText('The mail to office@dry-fork.example is queued again.')).toBeInTheDocument();
  });

  it('is not sent again by a role that may not', async () => {
    stubApi({ [GET]: { body: parked } });
    renderSignedIn(<AdvisoryPage />, asRole('yard-manager'));
    await screen.findByText(/550 no such mailbox/);
    expect(screen.queryByRole('button', { name: 'Send again' })).not.toBeInTheDocument();
  });
});
