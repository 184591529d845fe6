import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { axeViolations } from '../../test/axe-violations';
import { CheckboxField } from './checkbox-field';
import { ErrorSummary } from './error-summary';
import { NumberField } from './number-field';
import { SelectField } from './select-field';
import { TextArea, TextField } from './text-field';

const fault = 'A share cannot be below 0';

describe('fields', () => {
  it('are tied to their label, hint, unit and fault', () => {
    render(
      <NumberField label="Share" unit="% of DM" hint="of the whole ration" error={fault} name="lines.2.sharePctDm" />,
    );
    const box = screen.getByRole('textbox', { name: 'Share, % of DM' });
    expect(box).toHaveAccessibleDescription(`of the whole ration ${fault}`);
    expect(box).toBeInvalid();
  });

  it('keep what is typed as it is typed', async () => {
    render(<NumberField label="Share" />);
    await userEvent.type(screen.getByRole('textbox'), '1,50');
    expect(screen.getByRole('textbox')).toHaveValue('1,50');
  });

  it('have no fault that axe can find', async () => {
    const { container } = render(
      <form>
        <TextField label="Name" name="name" error="Enter a name" />
        <TextArea label="Reason" name="reason" hint="at least 10 characters" />
        <NumberField label="Weight" unit="kg" name="weight" isLabelHidden />
        <SelectField label="Yard" name="yard" emptyLabel="All yards" options={[{ value: 'a', label: 'Dry Fork' }]} />
        <CheckboxField label="Compliance staff sign" name="gate" hint="every version" />
      </form>,
    );
    expect(await axeViolations(container)).toEqual([]);
  });
});

describe('the error summary', () => {
  it('takes the focus and leads to the field', async () => {
    render(
      <>
        <ErrorSummary faults={[{ path: 'lines.2.sharePctDm', message: fault }]} />
        <NumberField label="Share" name="lines.2.sharePctDm" />
      </>,
    );
    expect(screen.getByRole('alert')).toHaveFocus();
    await userEvent.click(screen.getByRole('link', { name: fault }));
    expect(screen.getByRole('textbox', { name: 'Share' })).toHaveFocus();
  });

  it('takes the focus again at the next attempt', async () => {
    const faults = [{ path: '', message: 'Shares add to 98, not 100' }];
    const { rerender } = render(<ErrorSummary faults={faults} attempt={1} />);
    await userEvent.tab();
    rerender(<ErrorSummary faults={faults} attempt={2} />);
    expect(screen.getByRole('alert')).toHaveFocus();
  });

  it('is absent when nothing is wrong', () => {
    render(<ErrorSummary faults={[]} />);
    expect(screen.queryByRole('alert')).not.toBeInTheDocument();
  });
});
