import { newestAtomicWeights, sulfateMgPerL, type WaterAnalysisInput } from '@brimgate/rules';
import { formatAsEntered, formatNumber, NOT_DETERMINED, THIN_SPACE } from '../../lib/format';

type Sulfate = WaterAnalysisInput['sulfate'];
type Nitrate = WaterAnalysisInput['nitrate'];

/** A result as the laboratory printed it: `<5 mg/L as SO4-S`; digits are neither added nor taken away. */
export function resultAsEntered(result: Sulfate | Nitrate): string {
  if (!result) return 'not analysed';
  return `${result.qualifier ?? ''}${formatAsEntered(result.value)}${THIN_SPACE}${result.unit} as ${result.as}`;
}

/** The same result as sulfate, in which limits are written; below what the laboratory can measure it stays below. */
export function asSulfate(sulfate: Sulfate): string {
  if (!sulfate) return NOT_DETERMINED;
  const mgPerL = sulfateMgPerL(sulfate, newestAtomicWeights);
  return `${sulfate.qualifier ?? ''}${formatNumber(mgPerL, mgPerL < 100 ? 1 : 0)}`;
}
