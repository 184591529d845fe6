import { type FormEvent } from 'react';
import { Button } from '../../components/button';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import styles from './period-form.module.css';
import type { PeriodOfAddress } from './ledger-period';

interface PeriodFormProps {
  yards: readonly { id: string; name: string }[];
  period: PeriodOfAddress;
  onChoose: (period: { yard: string; from: string; to: string }) => void;
}

/** Which yard, from when to when; the choice goes into the address. */
export function PeriodForm({ yards, period, onChoose }: PeriodFormProps) {
  const handleSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const chosen = new FormData(event.currentTarget);
    const text = (name: string) => {
      const typed = chosen.get(name);
      return typeof typed === 'string' ? typed : '';
    };
    onChoose({ yard: text('yard'), from: text('from'), to: text('to') });
  };
  const faultOf = (path: string) => period.faults.find((fault) => fault.path === path)?.message;
  return (
    // Boxes start from the address; another address is another form.
    <form
      key={`${period.yardId} ${period.from} ${period.to}`}
      className={`${styles.form} no-print`}
      aria-label="Yard and period"
      noValidate
      onSubmit={handleSubmit}
    >
      <SelectField
        label="Yard"
        name="yard"
        error={faultOf('yardId')}
        defaultValue={period.yardId}
        options={yards.map((yard) => ({ value: yard.id, label: yard.name }))}
      />
      <TextField label="From" name="from" type="date" error={faultOf('from')} defaultValue={period.from} />
      <TextField label="To, the day included" name="to" type="date" error={faultOf('to')} defaultValue={period.to} />
      <div className={styles.show}>
        <Button type="submit">Show</Button>
      </div>
    </form>
  );
}
