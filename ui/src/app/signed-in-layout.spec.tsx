import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router-dom';
import * as v from 'valibot';
import { describe, expect, it } from 'vitest';
import { aSession } from '../../test/render-signed-in';
import { aRefusal, stubApi, type Reply } from '../../test/stub-api';
import { api } from '../lib/api-client';
import { createQueryClient } from '../lib/query-client';
import { useSession } from '../lib/session';
import { Providers } from './providers';
import { SignedInLayout } from './signed-in-layout';

const signedOut = aRefusal(401, 'session-missing', 'You are signed out');
const expired = aRefusal(401, 'session-expired', 'Your session has ended');
const session = aSession('nutritionist');

function NotePage() {
  const { person } = useSession();
  const [note, setNote] = useState('');
  const [saved, setSaved] = useState('');
  const save = async () => setSaved(await api.send('POST', '/notes', v.string(), { body: { note } }));
  return (
    <>
      <h1>Notes of {person.name}</h1>
      <input aria-label="Note" value={note} onChange={(event) => setNote(event.target.value)} />
      <button type="button" onClick={() => void save().catch((error: Error) => setSaved(error.message))}>
        Save
      </button>
      <p>{saved}</p>
    </>
  );
}

function SignInPlace() {
  const { pathname, search } = useLocation();
  return <p>{decodeURIComponent(pathname + search)}</p>;
}

function open(replies: Record<string, Reply | Reply[]>, at = '/notes?yard=1') {
  const calls = stubApi(replies);
  const router = createMemoryRouter(
    [
      { path: '/sign-in', element: <SignInPlace /> },
      {
        element: <SignedInLayout />,
        children: [
          { path: '/', element: <h1>Work</h1> },
          { path: '/notes', element: <NotePage /> },
        ],
      },
    ],
    { initialEntries: [at] },
  );
  render(
    <Providers queryClient={createQueryClient()}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return calls;
}

async function typeAndSave() {
  await userEvent.type(await screen.findByLabelText('Note'), 'north well salty');
  await userEvent.click(screen.getByRole('button', { name: 'Save' }));
}

describe('the signed-in layout', () => {
  it('sends who is signed out to sign in, and remembers where they were going', async () => {
    open({ 'GET /api/session': signedOut });
    expect(await screen.findByText('/sign-in?to=/notes?yard=1')).toBeInTheDocument();
  });

  it('remembers nothing when they were going to their work anyway', async () => {
    open({ 'GET /api/session': signedOut }, '/');
    expect(await screen.findByText('/sign-in')).toBeInTheDocument();
  });

  it('says so when the server does not answer, and tries again on request', async () => {
    const refused = aRefusal(500, 'unexpected', 'Something went wrong');
    open({ 'GET /api/session': [refused, { body: session }] });
    await userEvent.click(await screen.findByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { name: /^Notes of/ })).toBeInTheDocument();
  });

  it('shows the navigation of the role and a way past it', async () => {
    open({ 'GET /api/session': { body: aSession('veterinarian') } });
    await screen.findByRole('heading', { name: /^Notes of/ });
    const [main] = screen.getAllByRole('navigation', { name: 'Main' });
    expect([...(main?.querySelectorAll('a') ?? [])].map((link) => link.textContent)[0]).toBe('Review desk');
    expect(screen.queryByRole('link', { name: 'People' })).not.toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Skip to the page' })).toHaveAttribute('href', '#page');
  });
});

describe('a session that ends while somebody types', () => {
  const whileTyping = {
    'GET /api/session': { body: session },
    'POST /api/notes': [expired, { status: 201, body: 'kept' }],
  };

  it('is signed in again in place, the save goes through and nothing typed is lost', async () => {
    const calls = open({ ...whileTyping, 'POST /api/session': { status: 201, body: session } });
    await typeAndSave();
    const dialog = await screen.findByRole('dialog', { name: 'Your session has ended' });
    expect(dialog).toBeInTheDocument();
    expect(screen.getByLabelText('E-mail address')).toHaveValue(session.person.email);
    await userEvent.type(screen.getByLabelText('Password'), 'a long enough password');
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('kept')).toBeInTheDocument();
    expect(screen.getByLabelText('Note')).toHaveValue('north well salty');
    expect(calls.at(-1)?.body).toEqual({ note: 'north well salty' });
  });

  it('goes on under the same membership, whichever the server opens first', async () => {
    const other = { ...session, membership: { ...session.membership, id: '9a3b1f0e-9999-4a53-9c3b-0a4f5f2f6c12' } };
    const calls = open({
      ...whileTyping,
      'POST /api/session': { status: 201, body: other },
      'PUT /api/session/membership': { body: session },
    });
    await typeAndSave();
    await userEvent.type(await screen.findByLabelText('Password'), 'a long enough password');
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('kept')).toBeInTheDocument();
    const choice = calls.find((call) => call.path === '/api/session/membership');
    expect(choice?.body).toEqual({ membershipId: session.membership.id });
  });

  it('keeps the dialog open with the reason when the password is wrong', async () => {
    const refused = aRefusal(401, 'sign-in-refused', 'The e-mail address or the password is wrong');
    open({ ...whileTyping, 'POST /api/session': refused });
    await typeAndSave();
    await userEvent.type(await screen.findByLabelText('Password'), 'wrong');
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('The e-mail address or the password is wrong');
    expect(screen.getByRole('dialog')).toBeInTheDocument();
  });

  it('leaves the page as it is when the dialog is dismissed, and says why nothing was saved', async () => {
    open(whileTyping);
    await typeAndSave();
    await screen.findByRole('dialog');
    await userEvent.keyboard('{Escape}');
    expect(await screen.findByText('Your session has ended')).toBeInTheDocument();
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(screen.getByLabelText('Note')).toHaveValue('north well salty');
  });
});
