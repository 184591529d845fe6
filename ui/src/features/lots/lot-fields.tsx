import type { LotView } from '@brimgate/rules';
import { useQuery } from '@tanstack/react-query';
import { useFormContext, useWatch } from 'react-hook-form';
import { NumberField } from '../../components/number-field';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { useYardZone } from '../../lib/session';
import { type LotFormValues, lotFieldLabels } from './lot-form-values';
import styles from '../../components/grouped-form.module.css';
import { fedReleasesQuery } from './lots.queries';
import { releaseChoices } from './release-choice';

function useLotField() {
  const { register, formState } = useFormContext<LotFormValues>();
  return (name: keyof LotFormValues) => ({
    ...register(name),
    label: lotFieldLabels[name],
    error: formState.errors[name]?.message,
  });
}

export function LotIdentityFields({ yards }: { yards: readonly { id: string; name: string }[] }) {
  const field = useLotField();
  const { setValue } = useFormContext<LotFormValues>();
  const { onChange: changeYard, ...yard } = field('yardId');
  const handleYardChange: typeof changeYard = (event) => {
    // A release of another yard was not fed here.
    setValue('releaseId', '');
    return changeYard(event);
  };
  return (
    <fieldset className={styles.group}>
      <legend>The lot</legend>
      <SelectField
        {...yard}
        onChange={(event) => void handleYardChange(event)}
        emptyLabel={yards.length === 1 ? undefined : 'Choose a yard'}
        options={yards.map((yard) => ({ value: yard.id, label: yard.name }))}
      />
      <TextField {...field('name')} hint="As the yard calls it: Lot 118." />
      <NumberField {...field('head')} />
    </fieldset>
  );
}

export function LotWeightFields() {
  const field = useLotField();
  return (
    <fieldset className={styles.group}>
      <legend>Days and weights</legend>
      <TextField {...field('startedOn')} type="date" />
      <TextField {...field('endedOn')} type="date" hint="Empty while the lot is on feed." />
      <NumberField {...field('entryWeightKg')} unit="kg" hint="Mean of the lot." />
      <NumberField {...field('exitWeightKg')} unit="kg" hint="Empty until it is weighed." />
      <SelectField
        {...field('weightBasis')}
        hint="Shrunk: after transport, or a stand without feed and water."
        emptyLabel="Choose"
        options={[
          { value: 'full', label: 'Full, as on the scale' },
          { value: 'shrunk', label: 'Shrunk' },
        ]}
      />
    </fieldset>
  );
}

export function LotFeedingFields({ fed }: { fed: LotView['release'] }) {
  const field = useLotField();
  const yardId = useWatch<LotFormValues, 'yardId'>({ name: 'yardId' });
  const { data } = useQuery(fedReleasesQuery(yardId));
  const timeZone = useYardZone(yardId);
  return (
    <fieldset className={styles.group}>
      <legend>What it was fed</legend>
      <NumberField
        {...field('dryMatterIntakeKgPerDay')}
        unit="kg DM a head and day"
        hint="Mean over the days on feed. Empty: not known, and the excretion not determined."
      />
      <SelectField
        {...field('releaseId')}
        // The choices come after the form: without a new key the browser would show the first of them instead of the chosen one.
        key={data ? 'choices' : 'waiting'}
        hint={
          data?.nextCursor
            ? 'The newest releases of the yard; older ones are not listed.'
            : 'The version released for this yard. Not known: the excretion is not determined.'
        }
        emptyLabel="Not known"
        options={releaseChoices(data?.items ?? [], fed, timeZone)}
      />
    </fieldset>
  );
}
