import { Section } from '../../components/section';
import styles from './cattle-section.module.css';
import type { RationValues } from './ration-values';
import { sexOptions, stageText } from './stage-words';

/** The cattle as stated, for those who read; what was not stated is left out. */
export function CattleFacts({ cattle }: { cattle: RationValues['cattle'] }) {
  const facts: [string, string, string][] = [
    ['Stage', cattle.stage && stageText(cattle.stage), ''],
    ['Sex', sexOptions.find(({ value }) => value === cattle.sex)?.label ?? '', ''],
    ['Body weight', cattle.bodyWeightKg, 'kg'],
    ['Dry matter intake', cattle.dryMatterIntakeKgPerDay, 'kg a day'],
    ['Entry weight', cattle.entryWeightKg, 'kg'],
    ['Exit weight', cattle.exitWeightKg, 'kg'],
    ['Days on feed', cattle.daysOnFeed, 'days'],
  ];
  return (
    <Section title="Cattle" aside="per head">
      <dl className={styles.facts}>
        {facts.map(
          ([term, text, unit]) =>
            text !== '' && (
              <div key={term}>
                <dt>{term}</dt>
                <dd>
                  {text} {unit}
                </dd>
              </div>
            ),
        )}
      </dl>
    </Section>
  );
}
