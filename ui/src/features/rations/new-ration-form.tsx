import { RationCreateInput, type CattleStage, type RationView } from '@brimgate/rules';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '../../components/button';
import { ErrorSummary } from '../../components/error-summary';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { problemOf } from '../../lib/api-problem';
import { type Fault, faultsToForm } from '../../lib/form/faults-to-form';
import { judged } from '../../lib/form/judged';
import styles from './new-ration-form.module.css';
import { useRationCreation } from './rations.queries';
import { stageOptions } from './stage-words';

interface NewRationValues {
  yardId: string;
  name: string;
  stage: string;
}

interface NewRationFormProps {
  yards: readonly { id: string; name: string }[];
  initialYardId: string;
  onCreated: (ration: RationView) => void;
}

/** Where, what it is called, for which cattle: the rest is written in the notebook itself. */
export function NewRationForm({ yards, initialYardId, onCreated }: NewRationFormProps) {
  const creation = useRationCreation();
  const { register, handleSubmit, setError, formState } = useForm<NewRationValues>({
    defaultValues: { yardId: initialYardId, name: '', stage: '' },
  });
  const [refusal, setRefusal] = useState<{ faults: Fault[]; attempt: number }>({ faults: [], attempt: 0 });

  const refuse = (faults: readonly Fault[]) => {
    for (const { path, message } of faults) {
      if (path !== '') setError(path as keyof NewRationValues, { message });
    }
    setRefusal((before) => ({ faults: [...faults], attempt: before.attempt + 1 }));
  };
  const handleCreate = (values: NewRationValues) => {
    const faults = ownFaults(values);
    if (faults.length > 0) return refuse(faults);
    creation.mutate(creationInput(values), {
      onSuccess: onCreated,
      onError: (error) => {
        const problem = problemOf(error);
        const homeless = faultsToForm(problem, setError, (path) => path in values);
        refuse([...problem.errors.filter(({ path }) => path in values), ...homeless]);
      },
    });
  };

  return (
    <form noValidate className={styles.form} onSubmit={(event) => void handleSubmit(handleCreate)(event)}>
      <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="The ration cannot be opened yet" />
      <SelectField
        {...register('yardId')}
        label="Yard"
        emptyLabel="Choose"
        options={yards.map((yard) => ({ value: yard.id, label: yard.name }))}
        error={formState.errors.yardId?.message}
      />
      <TextField
        {...register('name')}
        label="Name"
        hint="As it is called at the yard, such as Finisher 4."
        error={formState.errors.name?.message}
        autoComplete="off"
      />
      <SelectField
        {...register('stage')}
        label="Stage of the cattle"
        emptyLabel="Choose"
        options={stageOptions}
        error={formState.errors.stage?.message}
      />
      <div>
        <Button kind="primary" type="submit" busyText={creation.isPending && 'Opening …'}>
          Open the ration
        </Button>
      </div>
    </form>
  );
}

const creationInput = ({ yardId, name, stage }: NewRationValues): RationCreateInput => ({
  yardId,
  name,
  draft: { cattle: { stage: stage as CattleStage }, lines: [], waters: [], waterIntake: null },
});

/** The wire's own messages, at the fields of this form; the three of them are all that is asked. */
function ownFaults(values: NewRationValues): Fault[] {
  const input = judged(RationCreateInput, creationInput(values));
  const faults = input.isValid
    ? []
    : input.faults.map(({ path, message }) => ({ path: path.replace('draft.cattle.', ''), message }));
  return faults.map((fault) => (fault.path === 'yardId' ? { path: 'yardId', message: 'Choose the yard' } : fault));
}
