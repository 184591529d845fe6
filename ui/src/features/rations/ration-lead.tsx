import type { RationView } from '@brimgate/rules';
import { numberFromText } from '../../lib/form/number-text';
import { formatNumber } from '../../lib/format';
import type { DraftSaver, SaveState as State } from './draft-saver';
import { stateWords } from './ration-state';
import type { RationValues } from './ration-values';
import { SaveState } from './save-state';
import { stageText } from './stage-words';

interface RationLeadProps {
  ration: RationView;
  values: RationValues;
  intakeKgPerDay: number | null;
  saver: DraftSaver;
  saveState: State;
  timeZone: string;
}

/** Who eats it, which version this is and whether it is kept, in one line. */
export function RationLead({ ration, values, intakeKgPerDay, saver, saveState, timeZone }: RationLeadProps) {
  const bodyWeightKg = numberFromText(values.cattle.bodyWeightKg);
  const temperature =
    values.waterIntake.kind === 'nrc-winchester-morris-table' ? values.waterIntake.temperatureC.trim() : '';
  return (
    <>
      {stageText(values.cattle.stage)}
      {bodyWeightKg !== undefined && (
        <>
          , <strong>{formatNumber(bodyWeightKg, 0)} kg</strong>
        </>
      )}
      {intakeKgPerDay !== null && (
        <>
          , eating <strong>{formatNumber(intakeKgPerDay, 1)} kg</strong> DM a day
        </>
      )}
      {temperature !== '' && (
        <>
          {' '}
          · at <strong>{temperature} °C</strong>
        </>
      )}{' '}
      · version {ration.versionNumber}, {stateWords[ration.state]},{' '}
      <SaveState saver={saver} state={saveState} savedAt={ration.savedAt} timeZone={timeZone} />
    </>
  );
}
