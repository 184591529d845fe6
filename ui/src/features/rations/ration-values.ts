import type { RationDraft, WaterIntakeInput } from '@brimgate/rules';
import { textFromNumber } from '../../lib/form/number-text';

export interface LineText {
  feedstuffId: string;
  sharePctDm: string;
}

export interface WaterText {
  waterAnalysisId: string;
  sharePct: string;
}

export interface CattleText {
  stage: string;
  sex: string;
  bodyWeightKg: string;
  dryMatterIntakeKgPerDay: string;
  entryWeightKg: string;
  exitWeightKg: string;
  daysOnFeed: string;
  standardReferenceWeightKg: string;
  pregnant: string;
}

/** `unknown`: nobody says how much is drunk; `metered`: litres as measured; otherwise the id of a published model. */
export type WaterIntakeKind =
  'unknown' | 'metered' | 'nrc-winchester-morris-table' | 'arias-mader-2011-1' | 'arias-mader-2011-2';

export interface WaterIntakeText {
  kind: WaterIntakeKind;
  litresPerDay: string;
  spread: string;
  temperatureC: string;
  cattleClass: string;
  solarRadiationWPerM2: string;
  minimumTemperatureC: string;
  temperatureHumidityIndex: string;
}

/** The ration as it stands in the form: text as typed, an empty box for what is not stated. */
export interface RationValues {
  name: string;
  cattle: CattleText;
  lines: LineText[];
  waters: WaterText[];
  waterIntake: WaterIntakeText;
}

const NO_INTAKE: WaterIntakeText = {
  kind: 'unknown',
  litresPerDay: '',
  spread: '',
  temperatureC: '',
  cattleClass: '',
  solarRadiationWPerM2: '',
  minimumTemperatureC: '',
  temperatureHumidityIndex: '',
};

function waterIntakeText(intake: WaterIntakeInput | null): WaterIntakeText {
  if (intake === null) return NO_INTAKE;
  switch (intake.model) {
    case undefined:
      return {
        ...NO_INTAKE,
        kind: 'metered',
        litresPerDay: textFromNumber(intake.litresPerDay),
        spread: textFromNumber(intake.spread),
      };
    case 'nrc-winchester-morris-table':
      return {
        ...NO_INTAKE,
        kind: intake.model,
        temperatureC: textFromNumber(intake.temperatureC),
        cattleClass: intake.cattleClass ?? '',
      };
    case 'arias-mader-2011-1':
      return {
        ...NO_INTAKE,
        kind: intake.model,
        solarRadiationWPerM2: textFromNumber(intake.solarRadiationWPerM2),
        minimumTemperatureC: textFromNumber(intake.minimumTemperatureC),
      };
    case 'arias-mader-2011-2':
      return {
        ...NO_INTAKE,
        kind: intake.model,
        solarRadiationWPerM2: textFromNumber(intake.solarRadiationWPerM2),
        temperatureHumidityIndex: textFromNumber(intake.temperatureHumidityIndex),
      };
  }
}

/** The form's text for a stored draft. */
export function rationValues(name: string, draft: RationDraft): RationValues {
  const { cattle } = draft;
  return {
    name,
    cattle: {
      stage: cattle.stage ?? '',
      sex: cattle.sex ?? '',
      bodyWeightKg: textFromNumber(cattle.bodyWeightKg),
      dryMatterIntakeKgPerDay: textFromNumber(cattle.dryMatterIntakeKgPerDay),
      entryWeightKg: textFromNumber(cattle.entryWeightKg),
      exitWeightKg: textFromNumber(cattle.exitWeightKg),
      daysOnFeed: textFromNumber(cattle.daysOnFeed),
      standardReferenceWeightKg: textFromNumber(cattle.standardReferenceWeightKg),
      pregnant: cattle.pregnant === undefined ? '' : cattle.pregnant ? 'yes' : 'no',
    },
    lines: draft.lines.map((line) => ({
      feedstuffId: line.feedstuffId ?? '',
      sharePctDm: textFromNumber(line.sharePctDm),
    })),
    waters: draft.waters.map((water) => ({
      waterAnalysisId: water.waterAnalysisId ?? '',
      sharePct: textFromNumber(water.sharePct),
    })),
    waterIntake: waterIntakeText(draft.waterIntake),
  };
}
