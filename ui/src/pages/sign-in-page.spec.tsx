import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { axeViolations } from '../../test/axe-violations';
import { aSession } from '../../test/render-signed-in';
import { aRefusal, stubApi, type Reply } from '../../test/stub-api';
import { Providers } from '../app/providers';
import { createQueryClient } from '../lib/query-client';
import SignInPage from './sign-in-page';

const Elsewhere = () => <p>at {useLocation().pathname}</p>;

function open(reply: Reply, at = '/sign-in') {
  const calls = stubApi({ 'POST /api/session': reply });
  const routes = [
    { path: '/sign-in', element: <SignInPage /> },
    { path: '*', element: <Elsewhere /> },
  ];
  const view = render(
    <Providers queryClient={createQueryClient()}>
      <RouterProvider router={createMemoryRouter(routes, { initialEntries: [at] })} />
    </Providers>,
  );
  return { ...view, calls };
}

async function signIn(email: string, password: string) {
  if (email) await userEvent.type(screen.getByLabelText('E-mail address'), email);
  if (password) await userEvent.type(screen.getByLabelText('Password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

const accepted = { status: 201, body: aSession('nutritionist') };

describe('signing in', () => {
  it('leads to the work', async () => {
    const { calls } = open(accepted);
    await signIn(' robin@example.test ', 'a long enough password');
    expect(await screen.findByText('at /')).toBeInTheDocument();
    expect(calls[0]?.body).toEqual({ email: 'robin@example.test', password: 'a long enough password' });
  });

  it('leads back to where one came from', async () => {
    open(accepted, '/sign-in?to=%2Flots%2F7');
    await signIn('robin@example.test', 'a long enough password');
    expect(await screen.findByText('at /lots/7')).toBeInTheDocument();
  });

  it.each(['https://elsewhere.test', '//elsewhere.test', '/\\elsewhere.test'])(
    'never leads to another address: %s',
    async (to) => {
      open(accepted, `/sign-in?to=${encodeURIComponent(to)}`);
      await signIn('robin@example.test', 'a long enough password');
      expect(await screen.findByText('at /')).toBeInTheDocument();
    },
  );

  it('names both empty boxes at once and sends nothing', async () => {
    const { calls } = open(accepted);
    await signIn('', '');
    const summary = await screen.findByRole('alert');
    expect(summary).toHaveTextContent('Enter the e-mail address in full');
    expect(summary).toHaveTextContent('Enter your password');
    expect(calls).toEqual([]);
  });

  it('says what was refused and keeps what was typed', async () => {
    open(aRefusal(401, 'sign-in-refused', 'The e-mail address or the password is wrong'));
    await signIn('robin@example.test', 'not the password');
    expect(await screen.findByRole('alert')).toHaveTextContent('The e-mail address or the password is wrong');
    expect(screen.getByLabelText('E-mail address')).toHaveValue('robin@example.test');
  });

  it('lets password managers fill it in', () => {
    open(accepted);
    expect(screen.getByLabelText('E-mail address')).toHaveAttribute('autocomplete', 'username');
    expect(screen.getByLabelText('Password')).toHaveAttribute('autocomplete', 'current-password');
  });

  it('has no fault that axe can find, also when refused', async () => {
    const { container } = open(accepted);
    await signIn('', '');
    await screen.findByRole('alert');
    expect(await axeViolations(container)).toEqual([]);
  });
});
