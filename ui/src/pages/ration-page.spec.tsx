import { permissionsOf, type Role, type SessionView } from '@brimgate/rules';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  aDraft,
  aFeedstuff,
  aRationView,
  aStraw,
  aWaterSource,
  aYard,
  RATION_ID,
  YARD_ID,
} from '../../test/builders/rations';
import { axeFaults } from '../../test/axe-faults';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { type ApiCall, aRefusal, type Reply, stubApi } from '../../test/stub-api';
import RationPage from './ration-page';

const path = `/api/rations/${RATION_ID}`;
const page = (items: unknown[]) => ({ body: { items, nextCursor: null } });

function signedIn(role: Role): SessionView {
  const session = aSession(role);
  return { ...session, permissions: [...permissionsOf[role]] };
}

/** Opens the ration as the role, with the facts it rests on. */
async function openRation(replies: Record<string, Reply | Reply[]> = {}, role: Role = 'nutritionist') {
  const calls = stubApi({
    [`GET ${path}`]: { body: aRationView() },
    'GET /api/feedstuffs': page([aFeedstuff(), aStraw()]),
    [`GET /api/water-sources?yardId=${YARD_ID}`]: page([aWaterSource()]),
    [`GET /api/yards/${YARD_ID}`]: { body: aYard() },
    // A draft may be saved by itself at any time.
    [`PUT ${path}`]: { body: aRationView({ version: 4 }) },
    ...replies,
  });
  renderSignedIn(<RationPage />, { session: signedIn(role), at: `/rations/${RATION_ID}`, route: '/rations/:rationId' });
  await screen.findByRole('heading', { name: 'Headroom' }, { timeout: 5000 });
  return { calls, user: userEvent.setup() };
}

const share = (line: number) => screen.getByRole('textbox', { name: `Share, line ${line}` });
const writes = (calls: ApiCall[]) => calls.filter(({ method }) => method !== 'GET');

beforeEach(() => {
  document.title = '';
});

describe('the ration page', () => {
  it('has no accessibility fault', async () => {
    await openRation();
    expect(await axeFaults()).toEqual([]);
  });

  it('reckons while one types; nothing goes to the server but the draft to be saved', async () => {
    const { calls, user } = await openRation();
    const before = calls.length;
    // Corn 90 % × 0.10 % + straw 10 % × 0.15 % = 0.105 %; with straw at 0 and corn at 100: 0.100 %
    const total = within(screen.getByRole('row', { name: /^Ration/ }));
    expect(total.getByText('0.105')).toBeInTheDocument();
    await user.clear(share(2));
    await user.type(share(2), '0');
    await user.clear(share(1));
    await user.type(share(1), '100');
    expect(total.getByText('0.100')).toBeInTheDocument();
    const asked = calls.slice(before).map(({ method }) => method);
    expect(asked.filter((method) => method !== 'PUT')).toEqual([]);
  });

  it('says what shares miss to 100 and keeps the last findings', async () => {
    const { user } = await openRation();
    await user.clear(share(2));
    await user.type(share(2), '9,5');
    expect(screen.getByText('0.50 % is still missing to 100.')).toBeInTheDocument();
    expect(await screen.findByText(/The findings are of the last complete ration/)).toBeInTheDocument();
    expect(screen.getByRole('heading', { name: 'Headroom' })).toBeInTheDocument();
  });

  it('takes an emptied share for missing, never for zero', async () => {
    const { user } = await openRation();
    await user.clear(share(2));
    await user.click(screen.getByRole('button', { name: 'Screen and keep' }));
    const summary = await screen.findByRole('alert');
    expect(summary).toHaveFocus();
    expect(within(summary).getByText('Line 2: Enter a share')).toBeInTheDocument();
    expect(share(2)).toHaveAccessibleDescription('Enter a share');
  });

  it('screens and keeps exactly what stands there, on the version it was read in', async () => {
    const { calls, user } = await openRation({
      [`POST ${path}/screenings`]: { status: 201, body: aRationView({ version: 4, state: 'screened' }) },
    });
    await user.click(screen.getByRole('button', { name: 'Screen and keep' }));
    await screen.findByText('Screened and kept.');
    const [post] = writes(calls);
    expect(post?.body).toEqual(aDraft());
    expect(post?.headers.get('If-Match')).toBe('"3"');
  });

  it('puts the server’s faults at their fields', async () => {
    const { user } = await openRation({
      [`POST ${path}/screenings`]: aRefusal(422, 'input-invalid', 'Some entries need mending', [
        { path: 'cattle.bodyWeightKg', message: 'This weight is not of these cattle' },
      ]),
    });
    await user.click(screen.getByRole('button', { name: 'Screen and keep' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('This weight is not of these cattle');
    expect(screen.getByRole('textbox', { name: /^Body weight/ })).toHaveAccessibleDescription(/not of these cattle/);
  });

  it('shows mine and theirs when somebody else changed the same figure, and loses neither', async () => {
    const theirs = aRationView({
      version: 9,
      savedBy: 'Ira Pell',
      draft: aDraft({ cattle: { ...aDraft().cattle, bodyWeightKg: 500 } }),
    });
    const { calls, user } = await openRation({
      [`GET ${path}`]: [{ body: aRationView() }, { body: theirs }],
      [`PUT ${path}`]: [aRefusal(412, 'stale', 'Stale'), { body: { ...theirs, version: 10 } }],
    });
    const weight = screen.getByRole('textbox', { name: /^Body weight/ });
    await user.clear(weight);
    await user.type(weight, '480');
    const dialog = await screen.findByRole('dialog', { name: 'Two people changed this ration' }, { timeout: 4000 });
    expect(within(dialog).getByText('480')).toBeInTheDocument();
    expect(within(dialog).getByText('500')).toBeInTheDocument();
    await user.click(within(dialog).getByRole('button', { name: 'Save what I chose' }));
    await waitFor(() => expect(writes(calls).at(-1)?.headers.get('If-Match')).toBe('"9"'));
    expect(writes(calls).at(-1)?.body).toMatchObject({ draft: { cattle: { bodyWeightKg: 480 } } });
  });

  it('adds a line by keyboard alone', async () => {
    const { user } = await openRation();
    await user.click(screen.getByRole('button', { name: 'Add a feedstuff' }));
    await user.keyboard('wheat{Enter}');
    expect(share(3)).toHaveFocus();
    await user.keyboard('5{ArrowUp}');
    expect(share(2)).toHaveFocus();
  });

  it('shows a reader what is fed, with nothing to change', async () => {
    await openRation({}, 'yard-manager');
    expect(screen.queryByRole('textbox', { name: /^Share/ })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Screen and keep' })).toBeNull();
    const sheet = within(screen.getByRole('table', { name: /^Lines of the ration/ }));
    expect(sheet.getByRole('rowheader', { name: 'Wheat straw' })).toBeInTheDocument();
  });

  it('holds the content still while it is at the review desk', async () => {
    await openRation({ [`GET ${path}`]: { body: aRationView({ state: 'in-review' }) } });
    expect(screen.queryByRole('textbox', { name: /^Share/ })).toBeNull();
  });
});
