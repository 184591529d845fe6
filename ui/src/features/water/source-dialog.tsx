import { WaterSourceInput } from '@brimgate/rules';
import { useForm } from 'react-hook-form';
import { Button } from '../../components/button';
import { Dialog, DialogActions } from '../../components/dialog';
import { ErrorSummary } from '../../components/error-summary';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { problemOf } from '../../lib/api-problem';
import { judged } from '../../lib/form/judged';
import { useRefusal } from '../../lib/form/use-refusal';
import styles from './analysis-form.module.css';
import { useWaterSourceCreation } from './water.queries';

interface SourceDialogProps {
  yards: readonly { id: string; name: string }[];
  initialYardId: string;
  onClose: () => void;
  onCreated: (name: string) => void;
}

/** Names a water of a yard: a well, a dugout, a line from town. */
export function SourceDialog({ yards, initialYardId, onClose, onCreated }: SourceDialogProps) {
  const creation = useWaterSourceCreation();
  const { register, handleSubmit } = useForm<WaterSourceInput>({ defaultValues: { yardId: initialYardId, name: '' } });
  const refusal = useRefusal();
  const handleCreate = (values: WaterSourceInput) => {
    const input = judged(WaterSourceInput, values);
    if (!input.isValid) {
      return refusal.refuse(
        input.faults.map((fault) => (fault.path === 'yardId' ? { ...fault, message: 'Choose the yard' } : fault)),
      );
    }
    creation.mutate(input.output, {
      onSuccess: (source) => onCreated(source.name),
      onError: (error) => refusal.refuseWith(problemOf(error)),
    });
  };
  return (
    <Dialog
      isOpen
      onClose={onClose}
      title="Add a water"
      description="A well, a dugout, a line from town. Its analyses come afterwards."
    >
      <form noValidate onSubmit={(event) => void handleSubmit(handleCreate)(event)}>
        <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="The water cannot be added yet" />
        <div className={styles.fields}>
          <SelectField
            {...register('yardId')}
            label="Yard of the water"
            emptyLabel="Choose"
            options={yards.map((yard) => ({ value: yard.id, label: yard.name }))}
            error={refusal.at('yardId')}
          />
          <TextField {...register('name')} label="Name of the water" error={refusal.at('name')} autoComplete="off" />
        </div>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button kind="primary" type="submit" busyText={creation.isPending && 'Adding …'}>
            Add the water
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
