import { addsToHundred, RationContent, RationSaveInput, sumOfShares } from '@brimgate/rules';
import type { Fault } from '../../lib/form/faults-to-form';
import { judged, type Judged, typedNumber } from '../../lib/form/judged';
import type { CattleText, RationValues, WaterIntakeText } from './ration-values';

const chosen = (text: string): string | undefined => (text === '' ? undefined : text);

/** Keys stay even when nothing is typed, so that the schema's own message names what is missing. */
function cattleCandidate(cattle: CattleText): Record<string, unknown> {
  return {
    stage: chosen(cattle.stage),
    sex: chosen(cattle.sex),
    bodyWeightKg: typedNumber(cattle.bodyWeightKg),
    dryMatterIntakeKgPerDay: typedNumber(cattle.dryMatterIntakeKgPerDay),
    entryWeightKg: typedNumber(cattle.entryWeightKg),
    exitWeightKg: typedNumber(cattle.exitWeightKg),
    daysOnFeed: typedNumber(cattle.daysOnFeed),
    standardReferenceWeightKg: typedNumber(cattle.standardReferenceWeightKg),
    pregnant: cattle.pregnant === '' ? undefined : cattle.pregnant === 'yes',
  };
}

function waterIntakeCandidate(intake: WaterIntakeText): Record<string, unknown> | null {
  switch (intake.kind) {
    case 'unknown':
      return null;
    case 'metered':
      return { litresPerDay: typedNumber(intake.litresPerDay), spread: typedNumber(intake.spread) };
    case 'nrc-winchester-morris-table':
      return {
        model: intake.kind,
        temperatureC: typedNumber(intake.temperatureC),
        cattleClass: chosen(intake.cattleClass),
      };
    case 'arias-mader-2011-1':
      return {
        model: intake.kind,
        solarRadiationWPerM2: typedNumber(intake.solarRadiationWPerM2),
        minimumTemperatureC: typedNumber(intake.minimumTemperatureC),
      };
    case 'arias-mader-2011-2':
      return {
        model: intake.kind,
        solarRadiationWPerM2: typedNumber(intake.solarRadiationWPerM2),
        temperatureHumidityIndex: typedNumber(intake.temperatureHumidityIndex),
      };
  }
}

function candidate(values: RationValues) {
  return {
    cattle: cattleCandidate(values.cattle),
    lines: values.lines.map((line) => ({
      feedstuffId: chosen(line.feedstuffId),
      sharePctDm: typedNumber(line.sharePctDm),
    })),
    waters: values.waters.map((water) => ({
      waterAnalysisId: chosen(water.waterAnalysisId),
      sharePct: typedNumber(water.sharePct),
    })),
    waterIntake: waterIntakeCandidate(values.waterIntake),
  };
}

/** What would be saved now: anything may still be missing, but what is typed must be readable. */
export function draftFromValues(values: RationValues): Judged<RationSaveInput> {
  const typed = candidate(values);
  const intake = typed.waterIntake;
  // A way of telling the intake without its figures is not yet a statement: it is kept as "unknown" until they come.
  const saysNothing =
    intake !== null && Object.entries(intake).every(([key, value]) => key === 'model' || value === undefined);
  const draft = judged(RationSaveInput, {
    name: values.name,
    draft: { ...typed, waterIntake: saysNothing ? null : intake },
  });
  return draft.isValid ? draft : { isValid: false, faults: draft.faults.map(atFormField) };
}

/** The form's fields lie where the content's do; a save wraps them in `draft`. */
export const atFormField = ({ path, message }: Fault): Fault => ({ path: path.replace(/^draft\./, ''), message });

/** The whole of what is screened; every gap is a fault that names its field. */
export function contentFromValues(values: RationValues): Judged<RationContent> {
  const content = judged(RationContent, candidate(values));
  const faults = [...(content.isValid ? [] : content.faults), ...shareFaults(values)];
  return faults.length > 0 || !content.isValid ? { isValid: false, faults } : content;
}

/** The shares that can be read, summed. [%] */
export function typedSum(shares: readonly string[]): number {
  return sumOfShares(shares.map(typedNumber).filter((share) => typeof share === 'number'));
}

/** Whether what is fed and what is drunk each add to 100; no water at all is a statement too. */
export function sharesAddUp(values: RationValues): boolean {
  const fed = values.lines.map((line) => line.sharePctDm);
  const drunk = values.waters.map((water) => water.sharePct);
  return addsToHundred([typedSum(fed)]) && (drunk.length === 0 || addsToHundred([typedSum(drunk)]));
}

const missesHundred = (sum: number) => `Shares add to ${Number(sum.toFixed(4))}, not 100`;

function shareFaults(values: RationValues): Fault[] {
  const faults: Fault[] = [];
  const fed = typedSum(values.lines.map((line) => line.sharePctDm));
  if (values.lines.length > 0 && !addsToHundred([fed])) faults.push({ path: 'lines', message: missesHundred(fed) });
  const drunk = typedSum(values.waters.map((water) => water.sharePct));
  if (values.waters.length > 0 && !addsToHundred([drunk])) {
    faults.push({ path: 'waters', message: `${missesHundred(drunk)}: the shares of the waters drunk` });
  }
  return faults;
}
