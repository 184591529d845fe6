import { LotInput, type LotView } from '@brimgate/rules';
import { typedNumber } from '../../lib/form/judged';
import { textFromNumber } from '../../lib/form/number-text';
import { typedResolver } from '../../lib/form/typed-resolver';

/** The lot as typed: text stays text until it is saved. */
export interface LotFormValues {
  yardId: string;
  name: string;
  head: string;
  startedOn: string;
  endedOn: string;
  entryWeightKg: string;
  exitWeightKg: string;
  weightBasis: '' | 'full' | 'shrunk';
  dryMatterIntakeKgPerDay: string;
  releaseId: string;
}

/** What each field is called, in the form and where a conflict names it; its order is the form's. */
export const lotFieldLabels: Readonly<Record<keyof LotFormValues, string>> = {
  yardId: 'Yard',
  name: 'Name',
  head: 'Head',
  startedOn: 'First day on feed',
  endedOn: 'Last day on feed',
  entryWeightKg: 'Weight in',
  exitWeightKg: 'Weight out',
  weightBasis: 'Weights are',
  dryMatterIntakeKgPerDay: 'Dry matter eaten',
  releaseId: 'Ration fed',
};

export function emptyLotForm(yardId: string): LotFormValues {
  return {
    yardId,
    name: '',
    head: '',
    startedOn: '',
    endedOn: '',
    entryWeightKg: '',
    exitWeightKg: '',
    weightBasis: '',
    dryMatterIntakeKgPerDay: '',
    releaseId: '',
  };
}

export function lotFormOf(lot: LotView): LotFormValues {
  return {
    yardId: lot.yard.id,
    name: lot.name,
    head: textFromNumber(lot.head),
    startedOn: lot.startedOn,
    endedOn: lot.endedOn ?? '',
    entryWeightKg: textFromNumber(lot.entryWeightKg),
    exitWeightKg: textFromNumber(lot.exitWeightKg),
    weightBasis: lot.weightBasis,
    dryMatterIntakeKgPerDay: textFromNumber(lot.dryMatterIntakeKgPerDay),
    releaseId: lot.release?.id ?? '',
  };
}

/** What was typed, ready for the schema; an empty box is absent (null where the lot may lack it), never 0. */
function lotCandidate(values: LotFormValues): Record<string, unknown> {
  return {
    yardId: values.yardId,
    name: values.name,
    head: typedNumber(values.head),
    startedOn: values.startedOn,
    endedOn: values.endedOn || null,
    entryWeightKg: typedNumber(values.entryWeightKg),
    exitWeightKg: optionalNumber(values.exitWeightKg),
    weightBasis: values.weightBasis || undefined,
    dryMatterIntakeKgPerDay: optionalNumber(values.dryMatterIntakeKgPerDay),
    releaseId: values.releaseId || null,
  };
}

const optionalNumber = (text: string) => typedNumber(text) ?? null;

export const lotResolver = typedResolver<LotFormValues, typeof LotInput>({
  schema: LotInput,
  candidateOf: lotCandidate,
});
