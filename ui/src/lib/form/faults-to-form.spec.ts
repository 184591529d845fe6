import type { Problem } from '@brimgate/rules';
import { describe, expect, it, vi } from 'vitest';
import { faultsOfForm, faultsToForm } from './faults-to-form';
import { fieldId } from './field-id';

const problem = (errors: Problem['errors'], detail?: string): Problem => ({
  type: 'about:blank',
  title: 'This cannot be saved',
  status: 422,
  code: 'invalid',
  detail,
  errors,
});

describe('faultsToForm', () => {
  it('puts each fault beside its field and returns the others', () => {
    const setError = vi.fn();
    const rest = faultsToForm(
      problem([
        { path: 'lines.2.sharePctDm', message: 'A share cannot be below 0' },
        { path: 'lines', message: 'Shares add to 98, not 100' },
      ]),
      setError,
      (path) => path.startsWith('lines.'),
    );
    expect(setError.mock.calls).toEqual([
      ['lines.2.sharePctDm', { type: 'server', message: 'A share cannot be below 0' }],
    ]);
    expect(rest).toEqual([{ path: 'lines', message: 'Shares add to 98, not 100' }]);
  });

  it('says what happened when no field is named', () => {
    expect(faultsToForm(problem([], 'Try again.'), vi.fn())).toEqual([{ path: '', message: 'Try again.' }]);
    expect(faultsToForm(problem([]), vi.fn())).toEqual([{ path: '', message: 'This cannot be saved' }]);
  });
});

describe('faultsOfForm', () => {
  it('lists nested faults with their full path', () => {
    const errors = {
      name: { type: 'server', message: 'Enter a name' },
      lines: [undefined, { sharePctDm: { type: 'server', message: 'Enter a share' } }],
    };
    expect(faultsOfForm(errors)).toEqual([
      { path: 'name', message: 'Enter a name' },
      { path: 'lines.1.sharePctDm', message: 'Enter a share' },
    ]);
  });

  it('gives the fault of a whole list the path of the list', () => {
    const errors = { lines: { root: { type: 'server', message: 'A ration has at least one feedstuff' } } };
    expect(faultsOfForm(errors)).toEqual([{ path: 'lines', message: 'A ration has at least one feedstuff' }]);
  });
});

it('makes one id of a path, for the field and for the summary', () => {
  expect(fieldId('lines.2.sharePctDm')).toBe('field-lines-2-sharePctDm');
});
