import { describe, expect, it } from 'vitest';
import { aDelivery } from '../../../test/an-advisory';
import { deliveryWords, summaryOfDeliveries } from './delivery-words';

describe('what has become of a mail', () => {
  it('names the moment of sending with the yard’s zone', () => {
    // 15:44 UTC is 10:44 in Chicago in summer.
    expect(deliveryWords(aDelivery(), 'America/Chicago')).toEqual({
      tone: 'done',
      state: 'Sent',
      detail: '12 July 2026, 10:44 (America/Chicago)',
    });
  });

  it('says which try comes next, when, and what the last one met', () => {
    const waiting = aDelivery({
      state: 'waiting',
      attempts: 2,
      lastError: '451 try later',
      nextAttemptAt: '2026-07-12T15:50:00.000Z',
      sentAt: null,
    });
    expect(deliveryWords(waiting, 'America/Chicago')).toEqual({
      tone: 'moving',
      state: 'Waiting for try 3',
      detail: 'at 12 July 2026, 10:50 (America/Chicago); the last try said: 451 try later',
    });
  });

  it('gives the reason of a mail that was parked', () => {
    const parked = aDelivery({ state: 'parked', attempts: 1, lastError: '550 no such mailbox', sentAt: null });
    expect(deliveryWords(parked, 'UTC')).toMatchObject({
      tone: 'stuck',
      state: 'Not delivered',
      detail: 'parked after 1 try: 550 no such mailbox',
    });
  });
});

describe('an advisory’s deliveries together', () => {
  it('are sent only when every one is', () => {
    expect(summaryOfDeliveries([aDelivery(), aDelivery()]).words).toBe('Sent to all 2');
    expect(summaryOfDeliveries([aDelivery(), aDelivery({ state: 'queued' })]).words).toBe('Sent to 1 of 2');
  });

  it('put the one that is stuck first', () => {
    const deliveries = [aDelivery(), aDelivery({ state: 'parked' }), aDelivery({ state: 'waiting' })];
    expect(summaryOfDeliveries(deliveries)).toEqual({ tone: 'stuck', words: 'Not delivered to 1 of 3' });
  });

  it('without a recipient are not taken for sent', () => {
    expect(summaryOfDeliveries([])).toEqual({ tone: 'stuck', words: 'No recipient' });
  });
});
