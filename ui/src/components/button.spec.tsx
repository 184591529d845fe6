import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { Button } from './button';

describe('a button that cannot be pressed', () => {
  it('says why in words, stays reachable by keyboard and does nothing', async () => {
    const handleClick = vi.fn();
    render(
      <Button disabledReason="Only a veterinarian of this yard signs here" onClick={handleClick}>
        Sign
      </Button>,
    );
    const button = screen.getByRole('button', { name: 'Sign' });
    expect(button).toHaveAccessibleDescription('Only a veterinarian of this yard signs here');
    await userEvent.tab();
    expect(button).toHaveFocus();
    await userEvent.keyboard('{Enter}');
    expect(handleClick).not.toHaveBeenCalled();
  });

  it('does not send its form either', async () => {
    const handleSubmit = vi.fn();
    render(
      <form onSubmit={handleSubmit}>
        <Button type="submit" disabledReason="Shares add to 98, not 100">
          Screen and keep
        </Button>
      </form>,
    );
    await userEvent.click(screen.getByRole('button'));
    expect(handleSubmit).not.toHaveBeenCalled();
  });
});

describe('a button whose act is under way', () => {
  it('says so and cannot be pressed twice', async () => {
    const handleClick = vi.fn();
    render(
      <Button busyText="Saving …" onClick={handleClick}>
        Save
      </Button>,
    );
    await userEvent.click(screen.getByRole('button', { name: 'Saving …' }));
    expect(handleClick).not.toHaveBeenCalled();
  });
});
