import type { ResolverOptions } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { decisionResolver, type DecisionValues, emptyDecision } from './decision-values';

const contentHash = '5f'.repeat(32);
const resolve = decisionResolver(contentHash);
const judge = (values: Partial<DecisionValues>) =>
  resolve(
    { ...emptyDecision, password: 'a long enough password', ...values },
    undefined,
    {} as ResolverOptions<DecisionValues>,
  );

describe('a decision', () => {
  it('is bound to the content that was shown', async () => {
    const { values } = await judge({ decision: 'concur' });
    expect(values).toMatchObject({ decision: 'concur', contentHash, reason: null, conditions: [] });
  });

  it('asks for a choice and the password, both at once', async () => {
    const { errors } = await judge({ password: '' });
    expect(errors).toMatchObject({
      decision: { message: 'Choose a decision' },
      password: { message: 'Enter your password to sign' },
    });
  });

  it('asks for a reason when it sends back', async () => {
    const { errors } = await judge({ decision: 'send-back', reason: 'no' });
    expect(errors).toMatchObject({ reason: { message: 'Say in at least 10 characters why' } });
  });

  it('asks for at least one condition when it concurs with conditions', async () => {
    const { errors } = await judge({ decision: 'concur-with-conditions' });
    expect(errors).toMatchObject({ conditions: { message: 'Write at least one condition' } });
  });

  it('names the condition that says nothing', async () => {
    const { errors } = await judge({
      decision: 'concur-with-conditions',
      conditions: [{ text: 'Look at the pens twice a day' }, { text: '' }],
    });
    expect(errors).toMatchObject({
      conditions: { 1: { text: { message: 'Say the condition in at least 5 characters' } } },
    });
  });

  it('leaves out conditions that were typed before the mind changed', async () => {
    const { values } = await judge({ decision: 'concur', conditions: [{ text: 'Look at the pens twice a day' }] });
    expect(values).toMatchObject({ conditions: [] });
  });
});
