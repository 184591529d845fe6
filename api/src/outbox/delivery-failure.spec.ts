import { isPermanent, reasonOf, waitBeforeNextTryMs } from './delivery-failure';
import { LineBreakRefused, oneLine } from './one-line';

describe('a delivery that failed', () => {
  it.each([
    ['a recipient refused for good', { code: 'EENVELOPE', responseCode: 550 }, true],
    ['a message refused for good', { code: 'EMESSAGE', responseCode: 554 }, true],
    ['a recipient refused for now', { code: 'EENVELOPE', responseCode: 451 }, false],
    ['a sign-in refused, which concerns every mail', { code: 'EAUTH', responseCode: 535 }, false],
    ['a greeting refused, which concerns every mail', { code: 'EPROTOCOL', responseCode: 554 }, false],
    ['no connection', { code: 'ECONNECTION' }, false],
    ['a line break in the address', new LineBreakRefused('address'), true],
    ['something that is no error at all', 'odd', false],
  ])('is for good or not: %s', (_, error, expected) => {
    expect(isPermanent(error)).toBe(expected);
  });

  it('is told in the server’s words, in one line', () => {
    expect(reasonOf({ response: '550-No such\r\n550 mailbox', message: 'Message failed' })).toBe(
      '550-No such 550 mailbox',
    );
    expect(reasonOf(new Error('connect ECONNREFUSED'))).toBe('connect ECONNREFUSED');
  });
});

describe('the wait before the next try', () => {
  it('doubles, between half and all of it at random', () => {
    expect(waitBeforeNextTryMs(1, 30_000, () => 1)).toBe(30_000);
    expect(waitBeforeNextTryMs(1, 30_000, () => 0)).toBe(15_000);
    expect(waitBeforeNextTryMs(3, 30_000, () => 1)).toBe(120_000);
  });

  it('is never longer than an hour', () => {
    expect(waitBeforeNextTryMs(80, 30_000, () => 1)).toBe(3_600_000);
  });
});

describe('a header’s text', () => {
  it.each(['a\r\nBcc: b', 'a\nb', 'a\rb', 'a\u0000b', 'a\u007fb'])(
    'is refused with a control character in it (%j)',
    (text) => {
      expect(() => oneLine('subject', text)).toThrow(LineBreakRefused);
    },
  );

  it('is handed on unchanged otherwise', () => {
    expect(oneLine('subject', 'Añejo – Ω')).toBe('Añejo – Ω');
  });
});
