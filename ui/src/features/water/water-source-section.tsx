import type { WaterAnalysisView, WaterSourceView } from '@brimgate/rules';
import { useState } from 'react';
import { Button } from '../../components/button';
import { type Column, DataTable } from '../../components/data-table';
import { Section } from '../../components/section';
import { useToast } from '../../components/toast';
import { formatDate, formatMoment, formatNumber } from '../../lib/format';
import { AnalysisForm } from './analysis-form';
import { asSulfate, resultAsEntered } from './sulfate-words';
import styles from './water-source-section.module.css';

interface WaterSourceSectionProps {
  source: WaterSourceView;
  timeZone: string;
  mayEdit: boolean;
}

const columnsIn = (timeZone: string): Column<WaterAnalysisView>[] => [
  { key: 'sampled', header: 'Sampled', isRowHeader: true, cell: (analysis) => formatDate(analysis.sampledOn) },
  { key: 'point', header: 'Sampling point', cell: ({ samplingPoint }) => samplingPoint ?? 'not stated' },
  {
    key: 'entered',
    header: 'Sulfate',
    unit: 'as printed',
    align: 'number',
    cell: ({ sulfate }) => resultAsEntered(sulfate),
  },
  {
    key: 'sulfate',
    header: 'Sulfate',
    unit: 'mg/L as SO4',
    align: 'number',
    cell: ({ sulfate }) => asSulfate(sulfate),
  },
  {
    key: 'nitrate',
    header: 'Nitrate',
    unit: 'as printed',
    align: 'number',
    cell: ({ nitrate }) => resultAsEntered(nitrate),
  },
  {
    key: 'tds',
    header: 'Dissolved solids',
    unit: 'mg/L',
    align: 'number',
    cell: ({ totalDissolvedSolidsMgPerL: solids }) => (solids === null ? 'not analysed' : formatNumber(solids, 0)),
  },
  { key: 'laboratory', header: 'Laboratory', cell: ({ laboratory }) => laboratory ?? 'not stated' },
  { key: 'treatment', header: 'Treatment', cell: ({ treatment }) => treatment ?? 'none stated' },
  {
    key: 'by',
    header: 'Entered',
    cell: ({ enteredBy, enteredAt }) => `${enteredBy}, ${formatMoment(enteredAt, timeZone)}`,
  },
];

/** One water with its analyses; an analysis is never changed, a new one is added. */
export function WaterSourceSection({ source, timeZone, mayEdit }: WaterSourceSectionProps) {
  const [isAdding, setIsAdding] = useState(false);
  const showToast = useToast();
  return (
    <Section title={source.name} aside={source.yard.name}>
      {source.analyses.length === 0 ? (
        <p>Not analysed yet: rations with this water have their sulfur from water not determined.</p>
      ) : (
        <DataTable
          caption={`Analyses of ${source.name}, newest first`}
          columns={columnsIn(timeZone)}
          rows={source.analyses}
          rowKey={(analysis) => analysis.id}
          whenNarrow="stack"
        />
      )}
      {mayEdit && !isAdding && (
        <p className={styles.acts}>
          <Button size="small" onClick={() => setIsAdding(true)}>
            Add an analysis<span className="visually-hidden"> of {source.name}</span>
          </Button>
        </p>
      )}
      {isAdding && (
        <AnalysisForm
          source={source}
          onClose={() => setIsAdding(false)}
          onEntered={() => {
            setIsAdding(false);
            showToast(`The analysis of ${source.name} is entered.`);
          }}
        />
      )}
    </Section>
  );
}
