import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { aLot, aLotNotDetermined } from '../../test/a-lot';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { aRefusal, stubApi } from '../../test/stub-api';
import LotPage from './lot-page';

const lot = aLot({ version: 3 });
const GET = `GET /api/lots/${lot.id}`;
const PUT = `PUT /api/lots/${lot.id}`;
const RELEASES = { [`GET /api/releases?yardId=${lot.yard.id}&limit=100`]: { body: { items: [], nextCursor: null } } };
const asRole = (role: Parameters<typeof aSession>[0]) => ({
  session: aSession(role),
  at: `/lots/${lot.id}`,
  route: '/lots/:lotId',
});

async function changeHead(head: string) {
  await userEvent.click(await screen.findByRole('button', { name: 'Change the lot' }));
  const box = screen.getByLabelText(/^Head/);
  await userEvent.clear(box);
  await userEvent.type(box, head);
  await userEvent.click(screen.getByRole('button', { name: 'Save the lot' }));
}

describe('a lot', () => {
  it('shows what was excreted a head and by the whole lot', async () => {
    stubApi({ [GET]: { body: lot } });
    renderSignedIn(<LotPage />, asRole('nutritionist'));
    // 30 kg nitrogen eaten, 4 kept: 26 a head, 5,200 for 200 head.
    const table = await screen.findByRole('table', { name: /Nutrients a head/ });
    const row = within(table).getByRole('row', { name: /^Nitrogen/ });
    expect(
      within(row)
        .getAllByRole('cell')
        .map((cell) => cell.lastChild?.textContent),
    ).toEqual(['30.00', '4.00', '26.00', '5,200']);
  });

  it('says what is not determined and why, and never shows it as zero', async () => {
    stubApi({ [GET]: { body: aLotNotDetermined({ id: lot.id }) } });
    renderSignedIn(<LotPage />, asRole('nutritionist'));
    expect(await screen.findByText('The weight out is not known.')).toBeInTheDocument();
    const table = screen.getByRole('table', { name: /Nutrients a head/ });
    expect(within(table).queryByText('0.00')).not.toBeInTheDocument();
    expect(within(table).getAllByText('not determined').length).toBeGreaterThan(0);
  });

  it('is changed by compliance staff only', async () => {
    stubApi({ [GET]: { body: lot } });
    renderSignedIn(<LotPage />, asRole('nutritionist'));
    await screen.findByRole('heading', { name: 'Lot 118' });
    expect(screen.queryByRole('button', { name: 'Change the lot' })).not.toBeInTheDocument();
  });

  it('still shows the release that was fed when it is not among the newest of the yard', async () => {
    stubApi({ ...RELEASES, [GET]: { body: lot } });
    renderSignedIn(<LotPage />, asRole('compliance'));
    await userEvent.click(await screen.findByRole('button', { name: 'Change the lot' }));
    expect(await screen.findByLabelText('Ration fed')).toHaveDisplayValue('Finisher 4, version 6');
  });

  it('is saved against the version that was opened', async () => {
    const calls = stubApi({ ...RELEASES, [GET]: { body: lot }, [PUT]: { body: aLot({ head: 206, version: 4 }) } });
    renderSignedIn(<LotPage />, asRole('compliance'));
    await changeHead('206');
    await screen.findByText(/The lot is saved/);
    const put = calls.find((call) => call.method === 'PUT');
    expect(put?.headers.get('If-Match')).toBe('"3"');
    expect(put?.body).toMatchObject({ head: 206, exitWeightKg: 554, releaseId: lot.release?.id });
  });

  it('shows mine and theirs when somebody saved meanwhile, and saves mine over theirs when that is chosen', async () => {
    const theirs = aLot({ head: 198, version: 5 });
    const calls = stubApi({
      ...RELEASES,
      [GET]: [{ body: lot }, { body: theirs }],
      [PUT]: [aRefusal(412, 'version-stale', 'Somebody saved meanwhile'), { body: aLot({ head: 206, version: 6 }) }],
    });
    renderSignedIn(<LotPage />, asRole('compliance'));
    await changeHead('206');
    const row = await screen.findByRole('row', { name: /^Head/ });
    expect(row).toHaveTextContent('206');
    expect(row).toHaveTextContent('198');
    await userEvent.click(screen.getByRole('button', { name: 'Keep mine, to save over it' }));
    expect(screen.getByLabelText(/^Head/)).toHaveValue('206');
    await userEvent.click(screen.getByRole('button', { name: 'Save the lot' }));
    await screen.findByText(/The lot is saved/);
    const puts = calls.filter((call) => call.method === 'PUT');
    expect(puts.map((call) => call.headers.get('If-Match'))).toEqual(['"3"', '"5"']);
  });

  it('puts the server’s faults beside their fields and keeps what was typed', async () => {
    stubApi({
      ...RELEASES,
      [GET]: { body: lot },
      [PUT]: aRefusal(422, 'invalid', 'Some fields need mending', [
        { path: 'head', message: 'More head than the yard holds' },
      ]),
    });
    renderSignedIn(<LotPage />, asRole('compliance'));
    await changeHead('99999');
    await waitFor(() =>
      expect(screen.getByLabelText(/^Head/)).toHaveAccessibleDescription('More head than the yard holds'),
    );
    expect(screen.getByLabelText(/^Head/)).toHaveValue('99999');
  });
});
