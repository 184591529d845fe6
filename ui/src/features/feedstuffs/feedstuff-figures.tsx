import { sources } from '@brimgate/reference-tables';
import { type FeedstuffView, type FigureView, nutrientNames, type NutrientName } from '@brimgate/rules';
import { type Column, DataTable } from '../../components/data-table';
import { ProvenanceTag } from '../../components/provenance-tag';
import { Section } from '../../components/section';
import { formatNumber } from '../../lib/format';
import styles from './feedstuff-figures.module.css';
import { nutrients } from './nutrients';

interface NutrientRow {
  name: NutrientName;
  counting: FigureView | null;
  beside: readonly FigureView[];
}

/** Every figure with how it is known; where sources differ they stand side by side, the one that counts first. */
export function FeedstuffFigures({ feedstuff }: { feedstuff: FeedstuffView }) {
  const rows: NutrientRow[] = nutrientNames.map((name) => {
    const [counting = null, ...beside] = feedstuff.figures[name] ?? [];
    return { name, counting, beside };
  });
  const columns: Column<NutrientRow>[] = [
    { key: 'nutrient', header: 'Figure', isRowHeader: true, cell: ({ name }) => nutrients[name].label },
    {
      key: 'value',
      header: 'Counts',
      align: 'number',
      cell: ({ name, counting }) =>
        counting === null ? (
          <span className={styles.unknown}>not determined</span>
        ) : (
          formatNumber(counting.value, nutrients[name].decimals)
        ),
    },
    { key: 'unit', header: 'Unit', cell: ({ name }) => nutrients[name].unit },
    {
      key: 'spread',
      header: 'Spread of loads',
      unit: 'standard deviation (number)',
      align: 'number',
      cell: ({ name, counting }) => counting && <Spread figure={counting} decimals={nutrients[name].decimals} />,
    },
    {
      key: 'known',
      header: 'How it is known',
      cell: ({ name, counting }) => counting && <Known figure={counting} of={nutrients[name].label.toLowerCase()} />,
    },
    {
      key: 'beside',
      header: 'Other sources',
      cell: ({ name, beside }) => beside.length > 0 && <Others name={name} figures={beside} />,
    },
  ];
  return (
    <Section title="Composition" aside="per dry matter, unless it says otherwise">
      <DataTable
        caption={`Composition of ${feedstuff.name}`}
        columns={columns}
        rows={rows}
        rowKey={({ name }) => name}
      />
    </Section>
  );
}

const sourceOf = (figure: FigureView) => (figure.sourceId === null ? null : (sources[figure.sourceId] ?? null));

const Known = ({ figure, of }: { figure: FigureView; of: string }) => (
  <ProvenanceTag status={figure.status} locator={figure.locator} source={sourceOf(figure)} of={of} />
);

function Spread({ figure, decimals }: { figure: FigureView; decimals: number }) {
  if (figure.standardDeviation === null) return <span className={styles.unknown}>not known</span>;
  const count = figure.count === null ? '' : ` (${formatNumber(figure.count, 0)})`;
  return `${formatNumber(figure.standardDeviation, decimals)}${count}`;
}

function Others({ name, figures }: { name: NutrientName; figures: readonly FigureView[] }) {
  const { label, decimals } = nutrients[name];
  return (
    <ul className={styles.others}>
      {figures.map((figure, index) => (
        <li key={`${figure.sourceId ?? 'own'} ${figure.locator}`}>
          {formatNumber(figure.value, decimals)}{' '}
          <Known figure={figure} of={`${label.toLowerCase()}, other source ${index + 1}`} />
        </li>
      ))}
    </ul>
  );
}
