import type { ScreeningTotals, WaterSourceView } from '@brimgate/rules';
import { memo } from 'react';
import { useFieldArray, type UseFormReturn, useWatch } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { Button } from '../../components/button';
import { NumberField } from '../../components/number-field';
import { Section } from '../../components/section';
import { SelectField } from '../../components/select-field';
import { fieldId } from '../../lib/form/field-id';
import { formatDate, formatWithUnit } from '../../lib/format';
import { paths } from '../../paths';
import { missing } from './lines-total';
import { typedSum } from './ration-content';
import type { RationValues } from './ration-values';
import { RowActs } from './row-acts';
import { waterChoices, type WaterChoice } from './water-choices';
import { WaterIntakeFields } from './water-intake-fields';
import styles from './water-section.module.css';

interface WaterSectionProps {
  form: UseFormReturn<RationValues>;
  sources: readonly WaterSourceView[];
  totals: ScreeningTotals | null;
  canEdit: boolean;
  faultAt: (path: string) => string | undefined;
}

const MOST_WATERS = 10;

/** What the cattle drink: which analyses, in which shares, and how much a day. */
export const WaterSection = memo(function WaterSection({ form, sources, totals, canEdit, faultAt }: WaterSectionProps) {
  const { control } = form;
  const waters = useFieldArray({ control, name: 'waters' });
  const typed = useWatch({ control, name: 'waters' });
  const choices = waterChoices(sources);
  const sum = typedSum(typed.map((water) => water.sharePct));
  const addFault =
    choices.length === 0
      ? 'This yard has no water analysis yet: enter one under Water'
      : waters.fields.length >= MOST_WATERS
        ? `At most ${MOST_WATERS} waters`
        : null;
  const handleAdd = () =>
    // The first water is all of it until another joins; a further one is for the person to weigh.
    waters.append({ waterAnalysisId: '', sharePct: waters.fields.length === 0 ? '100' : '' }, { shouldFocus: false });

  return (
    <Section title="What is drunk" aside="% of the water drunk">
      {waters.fields.length === 0 && (
        <p className={styles.unknown}>No water is named: sulfur from water is not determined.</p>
      )}
      <ul className={styles.rows}>
        {waters.fields.map((field, index) => (
          <WaterRow
            key={field.id}
            form={form}
            index={index}
            count={waters.fields.length}
            choices={choices}
            canEdit={canEdit}
            faultAt={faultAt}
            onRemove={() => waters.remove(index)}
          />
        ))}
      </ul>
      {typed.length > 0 && (
        <p id={fieldId('waters')} tabIndex={-1} role="status" className={styles.missing}>
          {missing(sum)}
        </p>
      )}
      {canEdit && (
        <div className={`${styles.acts} no-print`}>
          <Button size="small" onClick={handleAdd} disabledReason={addFault}>
            Add a water
          </Button>
          {choices.length === 0 && <Link to={paths.water()}>Go to the yard’s waters</Link>}
        </div>
      )}
      <WaterIntakeFields form={form} canEdit={canEdit} faultAt={faultAt} />
      <p className={styles.brings}>
        Drinking water {formatWithUnit(totals?.drinkingWaterLitresPerDay, 1, 'L a head and day')}; it brings sulfur{' '}
        {formatWithUnit(totals?.waterSulfurPctDm, 3, '% of DM')}.
      </p>
    </Section>
  );
});

interface WaterRowProps extends Pick<WaterSectionProps, 'form' | 'canEdit' | 'faultAt'> {
  index: number;
  count: number;
  choices: readonly WaterChoice[];
  onRemove: () => void;
}

function WaterRow({ form, index, count, choices, canEdit, faultAt, onRemove }: WaterRowProps) {
  const { register, control } = form;
  const water = useWatch({ control, name: `waters.${index}` });
  const chosen = choices.find(({ analysis }) => analysis.id === water.waterAnalysisId);
  const options = choices.map(({ analysis, label }) => ({ value: analysis.id, label }));
  const isOlder = water.waterAnalysisId !== '' && !chosen;
  // Only the newest analyses of a water come with the page; an older one that was chosen stays chosen.
  if (isOlder) options.unshift({ value: water.waterAnalysisId, label: 'An older analysis, kept as it was chosen' });
  if (!canEdit) {
    return (
      <li className={`${styles.row} ${styles.read}`}>
        <span>
          {chosen?.name ?? 'An older analysis'}
          {chosen && (
            <span className={styles.quiet}>
              sampled {formatDate(chosen.analysis.sampledOn)} · {chosen.sulfate}
            </span>
          )}
        </span>
        <span className={styles.shareText}>{water.sharePct} %</span>
      </li>
    );
  }
  return (
    <li className={styles.row}>
      <div>
        <SelectField
          {...register(`waters.${index}.waterAnalysisId`)}
          label={`Water analysis, water ${index + 1}`}
          isLabelHidden
          options={options}
          emptyLabel="Choose an analysis"
          error={faultAt(`waters.${index}.waterAnalysisId`)}
        />
        {chosen && (
          <span className={styles.quiet}>
            {chosen.sulfate}, sampled {formatDate(chosen.analysis.sampledOn)}
            {chosen.analysis.laboratory && `, ${chosen.analysis.laboratory}`}
          </span>
        )}
      </div>
      <div className={styles.share}>
        <NumberField
          {...register(`waters.${index}.sharePct`)}
          label={`Share of the water, water ${index + 1}`}
          isLabelHidden
          error={faultAt(`waters.${index}.sharePct`)}
        />
      </div>
      <RowActs what={`water ${index + 1}`} index={index} count={count} onRemove={onRemove} />
    </li>
  );
}
