import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { aDecision, aReview } from '../../test/a-review';
import { aSession, renderSignedIn } from '../../test/render-signed-in';
import { aRefusal, stubApi } from '../../test/stub-api';
import ReviewPage from './review-page';

const review = aReview();
const GET = `GET /api/reviews/${review.id}`;
const DECIDE = `POST /api/reviews/${review.id}/decisions`;
const LIST = { 'GET /api/reviews?state=open': { body: { items: [], nextCursor: null } } };
const where = { session: aSession('veterinarian'), at: `/review-desk/${review.id}`, route: '/review-desk/:reviewId' };

const decisionCalls = (calls: ReturnType<typeof stubApi>) => calls.filter((call) => call.method === 'POST');

async function concur(password = 'a long enough password') {
  await userEvent.click(await screen.findByRole('radio', { name: 'Concur' }));
  await userEvent.type(screen.getByLabelText('Password, to sign'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Sign' }));
}

describe('signing a review', () => {
  it('states who signs, as what, with which licence and for which content', async () => {
    stubApi({ ...LIST, [GET]: { body: review } });
    renderSignedIn(<ReviewPage />, where);
    const statement = await screen.findByText(/^Signs as/);
    expect(statement).toHaveTextContent('Robin Example, Licence 20871, veterinarian');
    expect(statement).toHaveTextContent('(America/Chicago), for exactly this content: 5f2c 91ab … 0000');
  });

  it('sends nothing without a decision and a password, and says both at once', async () => {
    const calls = stubApi({ ...LIST, [GET]: { body: review } });
    renderSignedIn(<ReviewPage />, where);
    await userEvent.click(await screen.findByRole('button', { name: 'Sign' }));
    const summary = await screen.findByRole('alert');
    expect(within(summary).getByText('Choose a decision')).toBeInTheDocument();
    expect(within(summary).getByText('Enter your password to sign')).toBeInTheDocument();
    expect(summary).toHaveFocus();
    expect(decisionCalls(calls)).toHaveLength(0);
  });

  it('binds the decision to the content shown and then says what was signed', async () => {
    const signed = aReview({
      state: 'signed',
      decisions: [aDecision()],
      awaits: [],
      mySignature: { as: null, refusal: null },
    });
    const calls = stubApi({ ...LIST, [GET]: { body: review }, [DECIDE]: { status: 201, body: signed } });
    renderSignedIn(<ReviewPage />, where);
    await userEvent.click(await screen.findByRole('radio', { name: 'Concur with conditions' }));
    await userEvent.click(screen.getByRole('button', { name: 'Add a condition' }));
    await userEvent.type(screen.getByLabelText('Condition 1'), 'Look at the pens twice a day');
    await userEvent.type(screen.getByLabelText('Password, to sign'), 'a long enough password');
    await userEvent.click(screen.getByRole('button', { name: 'Sign' }));
    expect(await screen.findByText(/Everything that the review desk signs is signed/)).toBeInTheDocument();
    expect(screen.getByText(/12 July 2026, 12:46 \(America\/Chicago\)/)).toBeInTheDocument();
    expect(decisionCalls(calls)[0]?.body).toEqual({
      decision: 'concur-with-conditions',
      reason: null,
      conditions: ['Look at the pens twice a day'],
      contentHash: review.contentHash,
      password: 'a long enough password',
    });
  });

  it('keeps everything but names the password when it is wrong', async () => {
    const wrong = aRefusal(422, 'password-wrong', 'The password is not right', [
      { path: 'password', message: 'This is not your password' },
    ]);
    stubApi({ ...LIST, [GET]: { body: review }, [DECIDE]: wrong });
    renderSignedIn(<ReviewPage />, where);
    await concur('not the right password');
    expect(await screen.findByRole('link', { name: 'This is not your password' })).toBeInTheDocument();
    expect(screen.getByLabelText('Password, to sign')).toHaveAccessibleDescription('This is not your password');
    expect(screen.getByRole('radio', { name: 'Concur' })).toBeChecked();
  });

  it('tries again under the same key while nobody knows whether it was signed, and under a new one after a refusal', async () => {
    const wrong = aRefusal(422, 'password-wrong', 'The password is not right', [
      { path: 'password', message: 'This is not your password' },
    ]);
    const calls = stubApi({ ...LIST, [GET]: { body: review }, [DECIDE]: ['offline', wrong, wrong] });
    renderSignedIn(<ReviewPage />, where);
    await concur();
    await screen.findByText(/Check the connection and try again/);
    await userEvent.click(screen.getByRole('button', { name: 'Sign' }));
    await screen.findByRole('link', { name: 'This is not your password' });
    await userEvent.type(screen.getByLabelText('Password, to sign'), 'x');
    await userEvent.click(screen.getByRole('button', { name: 'Sign' }));
    await waitFor(() => expect(decisionCalls(calls)).toHaveLength(3));
    const [first, second, third] = decisionCalls(calls).map((call) => call.headers.get('Idempotency-Key'));
    expect(first).toBe(second);
    expect(third).not.toBe(second);
  });

  it('shows what changed when the content is no longer what was shown, and holds the signature until that is read', async () => {
    const other = aReview({ contentHash: 'ab'.repeat(32) });
    other.screening.screening.totals.sulfurPctDm = 0.52;
    stubApi({
      ...LIST,
      [GET]: [{ body: review }, { body: other }],
      [DECIDE]: aRefusal(409, 'content-changed', 'The ration has changed since'),
    });
    renderSignedIn(<ReviewPage />, where);
    await concur();
    expect(await screen.findByText('This review changed while you had it open')).toBeInTheDocument();
    expect(await screen.findByRole('row', { name: /Total sulfur not determined .*0\.52/ })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Sign' })).toHaveAttribute('aria-disabled', 'true');
    await userEvent.click(screen.getByRole('button', { name: 'I have read this' }));
    expect(screen.getByRole('button', { name: 'Sign' })).not.toHaveAttribute('aria-disabled');
    expect(screen.getByLabelText('Password, to sign')).toHaveValue('a long enough password');
  });

  it('says who signed first when two decide at once', async () => {
    const signedByOther = aReview({
      state: 'signed',
      decisions: [aDecision({ signerName: 'Sasha Example' })],
      awaits: [],
      mySignature: { as: 'veterinarian', refusal: 'This review has been signed in your role already' },
    });
    stubApi({
      ...LIST,
      [GET]: [{ body: review }, { body: signedByOther }],
      [DECIDE]: aRefusal(409, 'already-signed', 'This review has been signed in your role already'),
    });
    renderSignedIn(<ReviewPage />, where);
    await concur();
    const notice = (await screen.findByText('This review changed while you had it open')).closest('[role="alert"]');
    await waitFor(() =>
      expect(notice).toHaveTextContent('Sasha Example, Licence 20871, veterinarian, concurred with conditions'),
    );
    expect(screen.queryByRole('button', { name: 'Sign' })).not.toBeInTheDocument();
  });
});

describe('whoever may not sign', () => {
  it('reads why, and finds no form', async () => {
    const refused = aReview({
      mySignature: { as: 'veterinarian', refusal: 'Who submitted a ration cannot sign it as veterinarian' },
    });
    stubApi({ ...LIST, [GET]: { body: refused } });
    renderSignedIn(<ReviewPage />, where);
    expect(await screen.findByText(/Who submitted a ration cannot sign it as veterinarian\./)).toBeInTheDocument();
    expect(screen.queryByLabelText('Password, to sign')).not.toBeInTheDocument();
  });
});
