import { act, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { Disclosure } from './disclosure';

const open = () => render(<Disclosure summary="All totals">Sulfur 0.41 % of DM</Disclosure>);
const print = (moment: 'beforeprint' | 'afterprint') => {
  act(() => {
    window.dispatchEvent(new Event(moment));
  });
};
const content = () => screen.getByText('Sulfur 0.41 % of DM');

describe('what is folded away', () => {
  it('opens when its summary is pressed', async () => {
    open();
    expect(content()).not.toBeVisible();
    await userEvent.click(screen.getByText('All totals'));
    expect(content()).toBeVisible();
  });

  it('is on paper, and folded again after printing', () => {
    open();
    print('beforeprint');
    expect(content()).toBeVisible();
    print('afterprint');
    expect(content()).not.toBeVisible();
  });

  it('stays open after printing when somebody had opened it', async () => {
    open();
    await userEvent.click(screen.getByText('All totals'));
    print('beforeprint');
    print('afterprint');
    expect(content()).toBeVisible();
  });
});
