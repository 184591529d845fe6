import { type FeedstuffListItem, type FeedstuffView, nutrientNames } from '@brimgate/rules';
import { useForm, useWatch } from 'react-hook-form';
import { Button } from '../../components/button';
import { ConflictNotice } from '../../components/conflict-notice';
import { Combobox } from '../../components/combobox';
import { ErrorSummary } from '../../components/error-summary';
import { NumberField } from '../../components/number-field';
import { provenanceWords } from '../../components/provenance-tag';
import { Section } from '../../components/section';
import { TextArea, TextField } from '../../components/text-field';
import { isApiProblem, problemOf } from '../../lib/api-problem';
import { useRefusal } from '../../lib/form/use-refusal';
import { formatNumber } from '../../lib/format';
import styles from './feedstuff-form.module.css';
import { feedstuffInput, feedstuffValues, newFeedstuffValues, type FeedstuffValues } from './feedstuff-values';
import { useFeedstuffSave } from './feedstuffs.queries';
import { feedstuffConflicts } from './feedstuff-conflicts';
import { nutrients } from './nutrients';
import { useStaleFeedstuff } from './use-stale-feedstuff';

interface FeedstuffFormProps {
  /** The feedstuff that was opened; null: a new one. */
  opened: FeedstuffView | null;
  bookFeedstuffs: readonly FeedstuffListItem[];
  onSaved: (feedstuff: FeedstuffView) => void;
  onCancel: () => void;
}

/** A load or a plant's product as analysed; what was not analysed rests on a book feedstuff, or stays unknown. */
export function FeedstuffForm({ opened, bookFeedstuffs, onSaved, onCancel }: FeedstuffFormProps) {
  const save = useFeedstuffSave();
  const { register, handleSubmit, control, setValue, getValues, reset } = useForm<FeedstuffValues>({
    defaultValues: opened ? feedstuffValues(opened) : newFeedstuffValues(),
  });
  const refusal = useRefusal();
  const bookFeedstuffId = useWatch({ control, name: 'bookFeedstuffId' });
  const book = bookFeedstuffs.find(({ id }) => id === bookFeedstuffId) ?? null;

  const stale = useStaleFeedstuff(opened);
  const refuseWith = (error: unknown) => refusal.refuseWith(problemOf(error));

  const handleSave = (values: FeedstuffValues) => {
    const input = feedstuffInput(values);
    if (!input.isValid) return refusal.refuse(input.faults);
    save.mutate(
      { input: input.output, opened: stale.base },
      {
        onSuccess: onSaved,
        onError: (error) => {
          if (isApiProblem(error) && error.status === 412) stale.look().catch(refuseWith);
          else refuseWith(error);
        },
      },
    );
  };

  return (
    <form noValidate onSubmit={(event) => void handleSubmit(handleSave)(event)}>
      <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="The feedstuff cannot be saved yet" />
      {stale.current && (
        <ConflictNotice
          what="the feedstuff"
          fields={feedstuffConflicts(getValues(), feedstuffValues(stale.current))}
          onKeepMine={stale.keepMine}
          onTakeTheirs={() => {
            if (stale.current) reset(feedstuffValues(stale.current));
            stale.keepMine();
          }}
        />
      )}
      <Section title="What it is">
        <div className={styles.fields}>
          <TextField {...register('name')} label="Name" error={refusal.at('name')} autoComplete="off" />
          <Combobox
            name="bookFeedstuffId"
            label="Rests on the book feedstuff"
            hint="Its figures stand in for what was not analysed. Left empty, what was not analysed is not determined."
            options={bookFeedstuffs.map(({ id, name, category }) => ({ value: id, label: name, detail: category }))}
            value={bookFeedstuffId}
            placeholder="None"
            isClearable
            error={refusal.at('bookFeedstuffId')}
            onChoose={(id) => setValue('bookFeedstuffId', id, { shouldDirty: true })}
          />
          <TextField {...register('analysedOn')} type="date" label="Analysed on" error={refusal.at('analysedOn')} />
          <TextField
            {...register('laboratory')}
            label="Laboratory"
            error={refusal.at('laboratory')}
            autoComplete="off"
          />
        </div>
        <div className={styles.note}>
          <TextArea {...register('note')} label="Note" rows={2} error={refusal.at('note')} />
        </div>
      </Section>
      <Section title="As analysed" aside="an empty box was not analysed: it is never taken for 0">
        <div className={styles.figures}>
          {nutrientNames.map((name) => (
            <NumberField
              key={name}
              {...register(`analysed.${name}`)}
              label={nutrients[name].label}
              unit={nutrients[name].unit}
              hint={standIn(book, name)}
              error={refusal.at(`analysed.${name}`)}
            />
          ))}
        </div>
      </Section>
      <div className={styles.acts}>
        <Button onClick={onCancel}>Cancel</Button>
        <Button kind="primary" type="submit" busyText={save.isPending && 'Saving …'}>
          Save the feedstuff
        </Button>
      </div>
    </form>
  );
}

/** What counts when the box stays empty. */
function standIn(book: FeedstuffListItem | null, name: keyof typeof nutrients): string {
  const value = book?.composition[name];
  const status = book?.statuses[name];
  if (value === undefined) return 'Empty: not determined';
  return `Empty: book ${formatNumber(value, nutrients[name].decimals)}${status ? `, ${provenanceWords[status]}` : ''}`;
}
