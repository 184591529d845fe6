import type { WaterAnalysisView, WaterSourceView } from '@brimgate/rules';
import { formatAsEntered, formatDate, THIN_SPACE } from '../../lib/format';

export interface WaterChoice {
  analysis: WaterAnalysisView;
  /** "North well, trough 3" */
  name: string;
  /** "sulfate 1,640 mg/L as SO4" as the laboratory printed it; "sulfate not analysed". */
  sulfate: string;
  /** Everything in one line, for the list. */
  label: string;
}

/** A result as it was printed: qualifier, value, unit, species. */
export function sulfateAsEntered(analysis: Pick<WaterAnalysisView, 'sulfate'>): string {
  const { sulfate } = analysis;
  if (!sulfate) return 'sulfate not analysed';
  return `sulfate ${sulfate.qualifier ?? ''}${formatAsEntered(sulfate.value)}${THIN_SPACE}${sulfate.unit} as ${sulfate.as}`;
}

/** Every analysis of the yard's waters that a ration can go with, newest first within each water. */
export function waterChoices(sources: readonly WaterSourceView[]): WaterChoice[] {
  return sources.flatMap((source) =>
    source.analyses.map((analysis) => {
      const name = analysis.samplingPoint ? `${source.name}, ${analysis.samplingPoint}` : source.name;
      const sulfate = sulfateAsEntered(analysis);
      return { analysis, name, sulfate, label: `${name} · ${sulfate} · ${formatDate(analysis.sampledOn)}` };
    }),
  );
}
