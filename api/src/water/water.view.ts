import type { WaterAnalysisInput, WaterAnalysisView, WaterSourceView } from '@brimgate/rules';
import type { WaterAnalysisModel } from './water-analysis.model';
import type { WaterSourceModel } from './water-source.model';

function toSulfate(row: WaterAnalysisModel): WaterAnalysisInput['sulfate'] {
  const { sulfateValue: value, sulfateAs: as, sulfateUnit: unit, sulfateQualifier: qualifier } = row;
  return value === null || as === null || unit === null ? null : { value, as, unit, qualifier };
}

function toNitrate(row: WaterAnalysisModel): WaterAnalysisInput['nitrate'] {
  const { nitrateValue: value, nitrateAs: as, nitrateUnit: unit, nitrateQualifier: qualifier } = row;
  return value === null || as === null || unit === null ? null : { value, as, unit, qualifier };
}

type Source = Pick<WaterSourceModel, 'uuid' | 'name'>;

export function toWaterAnalysisView(row: WaterAnalysisModel, source: Source, enteredBy: string): WaterAnalysisView {
  return {
    id: row.uuid,
    waterSource: { id: source.uuid, name: source.name },
    sampledOn: row.sampledOn,
    samplingPoint: row.samplingPoint,
    laboratory: row.laboratory,
    treatment: row.treatment,
    sulfate: toSulfate(row),
    nitrate: toNitrate(row),
    totalDissolvedSolidsMgPerL: row.totalDissolvedSolidsMgPerL,
    enteredAt: row.enteredAt.toISOString(),
    enteredBy,
  };
}

export function toWaterSourceView(row: WaterSourceModel, analyses: readonly WaterAnalysisModel[]): WaterSourceView {
  return {
    id: row.uuid,
    yard: { id: row.yard.uuid, name: row.yard.name },
    name: row.name,
    version: row.version,
    analyses: analyses.map((analysis) => toWaterAnalysisView(analysis, row, analysis.enteredBy.name)),
  };
}
