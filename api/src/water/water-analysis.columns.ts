import type { WaterAnalysisInput } from '@brimgate/rules';

/** An analysis as it stands in its row; what was not analysed is null. */
export function toColumns({ sulfate, nitrate, ...rest }: WaterAnalysisInput) {
  return {
    ...rest,
    sulfateValue: sulfate?.value ?? null,
    sulfateAs: sulfate?.as ?? null,
    sulfateUnit: sulfate?.unit ?? null,
    sulfateQualifier: sulfate?.qualifier ?? null,
    nitrateValue: nitrate?.value ?? null,
    nitrateAs: nitrate?.as ?? null,
    nitrateUnit: nitrate?.unit ?? null,
    nitrateQualifier: nitrate?.qualifier ?? null,
  };
}
