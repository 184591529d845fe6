import { WaterAnalysisInput } from '@brimgate/rules';
import type { Fault } from '../../lib/form/faults-to-form';
import { judged, type Judged, typedNumber } from '../../lib/form/judged';

/** One result as typed: `<5` means less than the laboratory can measure. */
export interface ResultText {
  value: string;
  as: string;
  unit: string;
}

export interface AnalysisValues {
  sampledOn: string;
  samplingPoint: string;
  laboratory: string;
  treatment: string;
  sulfate: ResultText;
  nitrate: ResultText;
  totalDissolvedSolidsMgPerL: string;
}

export const newAnalysisValues = (): AnalysisValues => ({
  sampledOn: '',
  samplingPoint: '',
  laboratory: '',
  treatment: '',
  // Never chosen beforehand: the wrong species is a threefold error.
  sulfate: { value: '', as: '', unit: 'mg/L' },
  nitrate: { value: '', as: '', unit: 'mg/L' },
  totalDissolvedSolidsMgPerL: '',
});

const textOrNull = (text: string): string | null => (text.trim() === '' ? null : text);

/** What a result's box says, ready for its schema; null when it is empty: not analysed. */
export function resultCandidate({ value, as, unit }: ResultText): Record<string, unknown> | null {
  const text = value.trim();
  if (text === '') return null;
  const isBelow = text.startsWith('<');
  return {
    value: typedNumber(isBelow ? text.slice(1) : text),
    as: as === '' ? undefined : as,
    unit,
    qualifier: isBelow ? '<' : null,
  };
}

/** What would be sent; what was not analysed is null, never 0. */
export function analysisInput(values: AnalysisValues): Judged<WaterAnalysisInput> {
  const dissolved = typedNumber(values.totalDissolvedSolidsMgPerL);
  const input = judged(WaterAnalysisInput, {
    sampledOn: textOrNull(values.sampledOn) ?? undefined,
    samplingPoint: textOrNull(values.samplingPoint),
    laboratory: textOrNull(values.laboratory),
    treatment: textOrNull(values.treatment),
    sulfate: resultCandidate(values.sulfate),
    nitrate: resultCandidate(values.nitrate),
    totalDissolvedSolidsMgPerL: dissolved ?? null,
  });
  return input.isValid ? input : { isValid: false, faults: input.faults.map(withResult) };
}

const resultLabels: Readonly<Record<string, string>> = {
  sulfate: 'Sulfate',
  nitrate: 'Nitrate',
  totalDissolvedSolidsMgPerL: 'Total dissolved solids',
};

/** The result that a fault is about is named, so that the list of faults can be read on its own. */
function withResult({ path, message }: Fault): Fault {
  const label = resultLabels[path.split('.')[0] ?? ''];
  return { path, message: label ? `${label}: ${message}` : message };
}
