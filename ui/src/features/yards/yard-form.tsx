import type { YardInput, YardView } from '@brimgate/rules';
import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '../../components/button';
import { ConflictNotice, conflictFields } from '../../components/conflict-notice';
import { ErrorSummary } from '../../components/error-summary';
import { useToast } from '../../components/toast';
import { isApiProblem, problemOf } from '../../lib/api-problem';
import { type Fault, faultsOfForm, faultsToForm } from '../../lib/form/faults-to-form';
import { usePermission } from '../../lib/session';
import { YardCapFields, YardGateFields, YardPlaceFields } from './yard-fields';
import { yardFieldLabels, yardFormOf, type YardFormValues, yardResolver } from './yard-form-values';
import styles from '../../components/grouped-form.module.css';
import { useYardConflict, useYardSave } from './yards.queries';

/** The settings of a yard; everybody who reads yards sees them, an administrator changes them. */
export function YardForm({ yard }: { yard: YardView }) {
  const form = useForm<YardFormValues, unknown, YardInput>({
    defaultValues: yardFormOf(yard),
    resolver: yardResolver,
    shouldFocusError: false,
  });
  const [version, setVersion] = useState(yard.version);
  const [homeless, setHomeless] = useState<Fault[]>([]);
  const mayEdit = usePermission('edit-yards');
  const showToast = useToast();
  const { mutate, isPending } = useYardSave(yard.id);
  const { theirs, fetchTheirs, settleConflict } = useYardConflict(yard.id);

  const open = (saved: YardView, { keepTyped }: { keepTyped: boolean }) => {
    setVersion(saved.version);
    if (!keepTyped) form.reset(yardFormOf(saved));
    settleConflict();
  };
  const save = (input: YardInput) => {
    setHomeless([]);
    mutate(
      { input, version },
      {
        onSuccess: (saved) => {
          open(saved, { keepTyped: false });
          showToast(`${saved.name} is saved.`);
        },
        onError: (error) => {
          if (isApiProblem(error) && error.status === 412) fetchTheirs();
          else setHomeless(faultsToForm(problemOf(error), form.setError, (path) => path in yardFieldLabels));
        },
      },
    );
  };

  return (
    <FormProvider {...form}>
      <form className={styles.form} noValidate onSubmit={form.handleSubmit(save)} aria-label="Yard">
        <ErrorSummary
          faults={[...faultsOfForm(form.formState.errors), ...homeless]}
          attempt={form.formState.submitCount}
        />
        {theirs && (
          <ConflictNotice
            what="the yard"
            fields={conflictFields(yardFieldLabels, form.getValues(), yardFormOf(theirs))}
            onKeepMine={() => open(theirs, { keepTyped: true })}
            onTakeTheirs={() => open(theirs, { keepTyped: false })}
          />
        )}
        <YardPlaceFields />
        <YardGateFields />
        <YardCapFields />
        <Button
          kind="primary"
          type="submit"
          busyText={isPending && 'Saving …'}
          disabledReason={mayEdit ? null : 'Only an administrator of the firm changes a yard'}
        >
          Save the yard
        </Button>
      </form>
    </FormProvider>
  );
}
