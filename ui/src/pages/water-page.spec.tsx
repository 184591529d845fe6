import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { aWaterAnalysisView, aWaterSource, SOURCE_ID } from '../../test/builders/rations';
import { axeFaults } from '../../test/axe-faults';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { stubApi } from '../../test/stub-api';
import WaterPage from './water-page';

const entry = `POST /api/water-sources/${SOURCE_ID}/analyses`;

async function openWater() {
  const calls = stubApi({
    'GET /api/water-sources': { body: { items: [aWaterSource()], nextCursor: null } },
    [entry]: { status: 201, body: aWaterAnalysisView() },
  });
  renderSignedIn(<WaterPage />, { session: aSession('nutritionist') });
  const user = userEvent.setup();
  await user.click(await screen.findByRole('button', { name: /Add an analysis/ }));
  return { calls, user };
}

describe('the water page', () => {
  it('has no accessibility fault, with the form open', async () => {
    await openWater();
    expect(await axeFaults()).toEqual([]);
  });

  it('asks for the species and never chooses it beforehand', async () => {
    const { calls, user } = await openWater();
    expect(screen.getByLabelText('Sulfate, given as')).toHaveValue('');
    await user.type(screen.getByLabelText('Sulfate, figure'), '213');
    await user.click(screen.getByRole('button', { name: 'Enter the analysis' }));
    const summary = await screen.findByRole('alert');
    expect(summary).toHaveFocus();
    expect(summary).toHaveTextContent('Say whether the figure is SO4, SO4-S or S');
    expect(calls.filter(({ method }) => method === 'POST')).toEqual([]);
  });

  it('enters what the sheet says, once', async () => {
    const { calls, user } = await openWater();
    await user.type(screen.getByLabelText('Sampled on'), '2026-06-12');
    await user.type(screen.getByLabelText('Sulfate, figure'), '<5');
    await user.selectOptions(screen.getByLabelText('Sulfate, given as'), 'SO4-S');
    await user.click(screen.getByRole('button', { name: 'Enter the analysis' }));
    await screen.findByText('The analysis of East well is entered.');
    const post = calls.find(({ method }) => method === 'POST');
    expect(post?.body).toMatchObject({
      sampledOn: '2026-06-12',
      sulfate: { value: 5, as: 'SO4-S', unit: 'mg/L', qualifier: '<' },
      nitrate: null,
      totalDissolvedSolidsMgPerL: null,
    });
    expect(post?.headers.get('Idempotency-Key')).toMatch(/^[0-9a-f-]{36}$/);
  });
});
