import { type GateView, type RationView, screen as screenRation, type ScreeningRequest } from '@brimgate/rules';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { aRationView, RATION_ID, SOURCE_ID } from '../../test/builders/rations';
import { axeFaults } from '../../test/axe-faults';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { stubApi } from '../../test/stub-api';
import ReleasePage from './release-page';

const path = `/api/rations/${RATION_ID}`;
const request: ScreeningRequest = {
  cattle: { stage: 'finishing', bodyWeightKg: 454, dryMatterIntakeKgPerDay: 10 },
  lines: [{ feedstuff: 'Wheat straw', sharePctDm: 100, composition: { sulfurPctDm: 0.15 } }],
};

function aScreenedRation(gate: GateView): RationView {
  return aRationView({
    state: 'screened',
    gate,
    screening: {
      id: SOURCE_ID,
      rationId: RATION_ID,
      rationName: 'Finisher 9',
      versionNumber: 1,
      contentHash: 'ab'.repeat(32),
      request,
      screening: screenRation(request),
      screenedAt: '2026-07-12T15:44:00.000Z',
      screenedBy: 'Test Nutritionist',
    },
  });
}

const requirement = (signOff: 'reason' | 'veterinarian', answer: string) => ({
  signOff,
  rules: ['total-sulfur'],
  why: 'Over on total sulfur',
  isSatisfied: false,
  answer,
});

async function openRelease(gate: GateView) {
  const ration = aScreenedRation(gate);
  const calls = stubApi({
    [`GET ${path}`]: { body: ration },
    [`GET ${path}/advisory-preview`]: {
      body: {
        subject: 'Finisher 9 to be fed',
        html: '<p>Feed it</p>',
        text: 'Feed it',
        recipients: [{ address: 'yard@example.test', role: 'yard' }],
      },
    },
    [`POST ${path}/releases`]: { status: 201, body: { ...ration, state: 'released', version: 4 } },
  });
  const at = `/rations/${RATION_ID}/release`;
  renderSignedIn(<ReleasePage />, { session: aSession('nutritionist'), at, route: '/rations/:rationId/release' });
  await screen.findByText('Finisher 9 to be fed');
  return { calls, user: userEvent.setup() };
}

describe('the release page', () => {
  it('has no accessibility fault', async () => {
    await openRelease({ isOpen: true, requirements: [] });
    expect(await axeFaults()).toEqual([]);
  });

  it('names who still has to sign and releases nothing before', async () => {
    const missing = requirement('veterinarian', 'The veterinarian has not signed');
    const { calls, user } = await openRelease({ isOpen: false, requirements: [missing] });
    const button = screen.getByRole('button', { name: 'Release' });
    expect(button).toHaveAccessibleDescription('The veterinarian has not signed');
    await user.click(button);
    expect(calls.filter(({ method }) => method === 'POST')).toEqual([]);
  });

  it('asks for the reason where a finding wants one, and sends exactly the screening that was looked at', async () => {
    const missing = requirement('reason', 'The nutritionist has not given a reason');
    const { calls, user } = await openRelease({ isOpen: false, requirements: [missing] });
    await user.click(screen.getByRole('button', { name: 'Release' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Say in at least 10 characters why');

    await user.type(screen.getByLabelText(/^Reason/), 'South well is out until Thursday');
    await user.click(screen.getByRole('button', { name: 'Release' }));
    await screen.findByText(/Released\. The advisory/);
    const post = calls.find(({ method }) => method === 'POST');
    expect(post?.body).toEqual({ screeningId: SOURCE_ID, reason: 'South well is out until Thursday' });
    expect(post?.headers.get('If-Match')).toBe('"3"');
    expect(post?.headers.get('Idempotency-Key')).toBeTruthy();
  });

  it('shows the mail shut in a frame that runs no script', async () => {
    await openRelease({ isOpen: true, requirements: [] });
    const frame = screen.getByTitle('Advisory e-mail, preview');
    expect(frame.getAttribute('sandbox')).not.toContain('allow-scripts');
  });
});
