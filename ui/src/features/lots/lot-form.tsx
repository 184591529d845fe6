import type { LotInput, LotView } from '@brimgate/rules';
import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '../../components/button';
import { ConflictNotice, conflictFields } from '../../components/conflict-notice';
import { ErrorSummary } from '../../components/error-summary';
import { isApiProblem, problemOf } from '../../lib/api-problem';
import { type Fault, faultsOfForm, faultsToForm } from '../../lib/form/faults-to-form';
import { LotFeedingFields, LotIdentityFields, LotWeightFields } from './lot-fields';
import { emptyLotForm, type LotFormValues, lotFieldLabels, lotFormOf, lotResolver } from './lot-form-values';
import styles from '../../components/grouped-form.module.css';
import { useLotConflict, useLotSave } from './lots.queries';

interface LotFormProps {
  yards: readonly { id: string; name: string }[];
  /** Null: a new lot. */
  lot: LotView | null;
  onSaved: (lot: LotView) => void;
  onCancel?: () => void;
}

/** The one form of a lot. What is not known yet stays empty; its excretion is then not determined. */
export function LotForm({ yards, lot, onSaved, onCancel }: LotFormProps) {
  const form = useForm<LotFormValues, unknown, LotInput>({
    defaultValues: lot ? lotFormOf(lot) : emptyLotForm(yards.length === 1 ? (yards[0]?.id ?? '') : ''),
    resolver: lotResolver,
    shouldFocusError: false,
  });
  const [opened, setOpened] = useState(lot);
  const [homeless, setHomeless] = useState<Fault[]>([]);
  const { mutate, isPending } = useLotSave();
  const { theirs, fetchTheirs, settleConflict } = useLotConflict();

  const save = (input: LotInput) => {
    setHomeless([]);
    mutate(
      { input, opened },
      {
        onSuccess: onSaved,
        onError: (error) => {
          if (opened && isApiProblem(error) && error.status === 412) fetchTheirs(opened.id);
          else setHomeless(faultsToForm(problemOf(error), form.setError, (path) => path in lotFieldLabels));
        },
      },
    );
  };
  const take = (saved: LotView, side: 'mine' | 'theirs') => {
    setOpened(saved);
    if (side === 'theirs') form.reset(lotFormOf(saved));
    settleConflict();
  };

  return (
    <FormProvider {...form}>
      <form className={styles.form} noValidate onSubmit={form.handleSubmit(save)} aria-label="Lot">
        <ErrorSummary
          faults={[...faultsOfForm(form.formState.errors), ...homeless]}
          attempt={form.formState.submitCount}
        />
        {theirs && (
          <ConflictNotice
            what="the lot"
            fields={conflictFields(lotFieldLabels, form.getValues(), lotFormOf(theirs))}
            onKeepMine={() => take(theirs, 'mine')}
            onTakeTheirs={() => take(theirs, 'theirs')}
          />
        )}
        <LotIdentityFields yards={yards} />
        <LotWeightFields />
        <LotFeedingFields fed={opened?.release ?? null} />
        <div className={styles.actions}>
          <Button kind="primary" type="submit" busyText={isPending && 'Saving …'}>
            {lot ? 'Save the lot' : 'Enter the lot'}
          </Button>
          {onCancel && <Button onClick={onCancel}>Leave it as it was</Button>}
        </div>
      </form>
    </FormProvider>
  );
}
