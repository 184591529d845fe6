import {
  newestAtomicWeights,
  nitrateFromNitrateNitrogenMgPerL,
  sulfateMgPerL,
  type WaterSourceView,
} from '@brimgate/rules';
import { useState } from 'react';
import { type Control, useForm, type UseFormRegister, useWatch } from 'react-hook-form';
import { Button } from '../../components/button';
import { ErrorSummary } from '../../components/error-summary';
import { NumberField } from '../../components/number-field';
import { SelectField } from '../../components/select-field';
import { TextField } from '../../components/text-field';
import { newIdempotencyKey } from '../../lib/api-client';
import { problemOf } from '../../lib/api-problem';
import { useRefusal } from '../../lib/form/use-refusal';
import { formatNumber } from '../../lib/format';
import styles from './analysis-form.module.css';
import { analysisInput, type AnalysisValues, newAnalysisValues, resultCandidate } from './analysis-values';
import { asSulfate } from './sulfate-words';
import { useWaterAnalysisEntry } from './water.queries';

interface AnalysisFormProps {
  source: WaterSourceView;
  onEntered: () => void;
  onClose: () => void;
}

const units = [
  { value: 'mg/L', label: 'mg/L' },
  { value: 'ppm', label: 'ppm' },
];
const sulfateSpecies = [
  { value: 'SO4', label: 'SO4: sulfate' },
  { value: 'SO4-S', label: 'SO4-S: sulfur in sulfate' },
  { value: 'S', label: 'S: sulfur' },
];
const nitrateSpecies = [
  { value: 'NO3', label: 'NO3: nitrate' },
  { value: 'NO3-N', label: 'NO3-N: nitrogen in nitrate' },
];

// From the atomic weights of the tables, to the one decimal that a sentence needs.
const sulfatePerSulfur = formatNumber(sulfateMgPerL({ value: 1, as: 'S' }, newestAtomicWeights), 1);
const nitratePerNitrogen = formatNumber(nitrateFromNitrateNitrogenMgPerL(1), 1);

/** A laboratory's sheet typed in: species and unit are asked as they are printed. */
export function AnalysisForm({ source, onEntered, onClose }: AnalysisFormProps) {
  const entry = useWaterAnalysisEntry(source.id);
  const [idempotencyKey] = useState(newIdempotencyKey);
  const { register, handleSubmit, control } = useForm<AnalysisValues>({ defaultValues: newAnalysisValues() });
  const refusal = useRefusal();

  const handleEnter = (values: AnalysisValues) => {
    const input = analysisInput(values);
    if (!input.isValid) return refusal.refuse(input.faults);
    entry.mutate(
      { input: input.output, idempotencyKey },
      { onSuccess: onEntered, onError: (error) => refusal.refuseWith(problemOf(error)) },
    );
  };

  return (
    <form noValidate className={styles.form} onSubmit={(event) => void handleSubmit(handleEnter)(event)}>
      <h3 className={styles.title}>New analysis of {source.name}</h3>
      <ErrorSummary faults={refusal.faults} attempt={refusal.attempt} title="The analysis cannot be entered yet" />
      <div className={styles.fields}>
        <TextField {...register('sampledOn')} type="date" label="Sampled on" error={refusal.at('sampledOn')} />
        <TextField
          {...register('samplingPoint')}
          label="Sampling point"
          hint="Such as well head, or trough 3."
          error={refusal.at('samplingPoint')}
          autoComplete="off"
        />
        <TextField {...register('laboratory')} label="Laboratory" error={refusal.at('laboratory')} autoComplete="off" />
        <TextField
          {...register('treatment')}
          label="Treatment"
          hint="Of the water before it was sampled."
          error={refusal.at('treatment')}
          autoComplete="off"
        />
      </div>
      <ResultFields
        name="sulfate"
        title="Sulfate"
        explanation={`Look at the sheet for what the figure is. One mg/L given as sulfur (SO4-S or S) is ${sulfatePerSulfur} mg/L of sulfate: the wrong choice makes a threefold error, so nothing is chosen beforehand.`}
        species={sulfateSpecies}
        register={register}
        at={refusal.at}
      />
      <SulfateReading control={control} />
      <ResultFields
        name="nitrate"
        title="Nitrate"
        explanation={`One mg/L given as nitrogen (NO3-N) is ${nitratePerNitrogen} mg/L of nitrate. Leave it empty when it was not analysed.`}
        species={nitrateSpecies}
        register={register}
        at={refusal.at}
      />
      <div className={styles.fields}>
        <NumberField
          {...register('totalDissolvedSolidsMgPerL')}
          label="Total dissolved solids"
          unit="mg/L"
          hint="Empty: not analysed."
          error={refusal.at('totalDissolvedSolidsMgPerL')}
        />
      </div>
      <div className={styles.acts}>
        <Button onClick={onClose}>Cancel</Button>
        <Button kind="primary" type="submit" busyText={entry.isPending && 'Entering …'}>
          Enter the analysis
        </Button>
      </div>
    </form>
  );
}

interface ResultFieldsProps {
  name: 'sulfate' | 'nitrate';
  title: string;
  explanation: string;
  species: readonly { value: string; label: string }[];
  register: UseFormRegister<AnalysisValues>;
  at: (path: string) => string | undefined;
}

function ResultFields({ name, title, explanation, species, register, at }: ResultFieldsProps) {
  return (
    <fieldset className={styles.result}>
      <legend className={styles.legend}>{title}</legend>
      <p className={styles.explanation}>{explanation}</p>
      <div className={styles.fields}>
        <NumberField
          {...register(`${name}.value`)}
          label={`${title}, figure`}
          hint="Write <5 when the sheet says less than 5. Empty: not analysed."
          error={at(`${name}.value`)}
        />
        <SelectField
          {...register(`${name}.as`)}
          label={`${title}, given as`}
          options={species}
          emptyLabel="Choose as printed"
          error={at(`${name}.as`)}
        />
        <SelectField
          {...register(`${name}.unit`)}
          label={`${title}, unit`}
          options={units}
          error={at(`${name}.unit`)}
        />
      </div>
    </fieldset>
  );
}

/** What the figure comes to as sulfate, while it is typed. */
function SulfateReading({ control }: { control: Control<AnalysisValues> }) {
  const typed = useWatch({ control, name: 'sulfate' });
  const result = resultCandidate(typed);
  const isReadable = typeof result?.value === 'number' && typed.as !== '';
  return (
    <p role="status" className={styles.reading}>
      {isReadable && `That is ${asSulfate(result as Parameters<typeof asSulfate>[0])} mg/L of sulfate (SO4).`}
    </p>
  );
}
