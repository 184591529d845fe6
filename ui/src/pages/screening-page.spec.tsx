import { screen as screenRation, type ScreeningRequest } from '@brimgate/rules';
import { aRequest } from '@brimgate/rules/testing';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { aScreeningView } from '../../test/a-screening-view';
import { axeViolations } from '../../test/axe-violations';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { aRefusal, stubApi } from '../../test/stub-api';
import ScreeningPage from './screening-page';

/** 40 L × 1800 mg/L = 72 g sulfate = 24.0 g sulfur in 10 kg = 0.24 %; with 0.20 of the feed 0.44 % of DM. */
const salty = aRequest({ waters: [{ name: 'north well', sharePct: 100, sulfate: { value: 1800, as: 'SO4' } }] });

function open(request: ScreeningRequest) {
  const view = aScreeningView({ request, screening: screenRation(request) });
  stubApi({ [`GET /api/screenings/${view.id}`]: { body: view } });
  return renderSignedIn(<ScreeningPage />, {
    session: aSession('veterinarian'),
    at: `/screenings/${view.id}`,
    route: '/screenings/:screeningId',
  });
}

describe('a stored screening', () => {
  it('says its verdict first, then when it was made, in the yard’s zone', async () => {
    open(salty);
    expect(await screen.findByText('Over on total sulfur: 0.44 % of DM, limit 0.30.')).toBeInTheDocument();
    expect(screen.getByText(/12 July 2026, 10:44 \(America\/Chicago\)/)).toBeInTheDocument();
  });

  it('opens why a finding stands where it does, by keyboard, and closes it again', async () => {
    open(salty);
    const row = await screen.findByRole('button', { name: /^Total sulfur over/ });
    row.focus();
    await userEvent.keyboard('{Enter}');
    const detail = await screen.findByRole('dialog', { name: 'Total sulfur' });
    expect(detail).toHaveTextContent('Drinking water');
    expect(detail).toHaveTextContent('Limit 0.30 % of DM, published');
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
    expect(row).toHaveFocus();
  });

  it('has a table twin with every limit that was asked', async () => {
    open(salty);
    await userEvent.click((await screen.findAllByText('The same as a table'))[0] as HTMLElement);
    const table = screen.getByRole('table', { name: /as drawn in the headroom chart/ });
    const asked = screenRation(salty).findings.filter((finding) => finding.applies);
    // One row a finding, and the header.
    expect(within(table).getAllByRole('row')).toHaveLength(asked.length + 1);
    expect(within(table).getByRole('rowheader', { name: 'Total sulfur' }).closest('tr')).toHaveTextContent('0.44');
  });

  it('shows where the sulfur comes from, water and feed, adding up to the whole', async () => {
    open(salty);
    const table = await screen.findByRole('table', { name: 'Sulfur by feedstuff and water', hidden: true });
    expect(
      within(table).getByRole('rowheader', { name: 'Drinking water', hidden: true }).closest('tr'),
    ).toHaveTextContent('0.240');
    // 0.20 of the feed and 0.2403 of the water
    expect(table.querySelector('tfoot')).toHaveTextContent('0.440');
  });

  it('says "not determined" for what nobody knows, and never a zero', async () => {
    const request = aRequest();
    delete request.waters;
    open(request);
    expect(await screen.findByText('Not determined: total sulfur.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: /^Total sulfur not determined/ })).toBeInTheDocument();
    expect(screen.queryByText(/0\.000 % of DM/)).not.toBeInTheDocument();
  });

  it('says that it is not there when it belongs to somebody else', async () => {
    const { id } = aScreeningView();
    stubApi({ [`GET /api/screenings/${id}`]: aRefusal(404, 'screening-not-found', 'There is no such screening') });
    const where = { session: aSession('nutritionist'), at: `/screenings/${id}`, route: '/screenings/:screeningId' };
    renderSignedIn(<ScreeningPage />, where);
    expect(await screen.findByRole('heading', { name: 'There is no such page' })).toBeInTheDocument();
  });

  it('has no fault that axe can find', async () => {
    const { container } = open(salty);
    await screen.findByRole('heading', { name: 'Headroom' });
    expect(await axeViolations(container)).toEqual([]);
  });
});
