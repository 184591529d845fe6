import type { ConflictPart } from './conflict';
import type { CattleText, RationValues } from './ration-values';
import { stageText } from './stage-words';

export const cattleLabels: Readonly<Record<keyof CattleText, string>> = {
  stage: 'Stage',
  sex: 'Sex',
  bodyWeightKg: 'Body weight, kg',
  dryMatterIntakeKgPerDay: 'Dry matter intake, kg a day',
  entryWeightKg: 'Entry weight, kg',
  exitWeightKg: 'Exit weight, kg',
  daysOnFeed: 'Days on feed',
  standardReferenceWeightKg: 'Standard reference weight, kg',
  pregnant: 'Pregnant',
};

const isCattleKey = (key: string): key is keyof CattleText => key in cattleLabels;

export function partLabel(part: ConflictPart): string {
  if (part === 'name') return 'Name of the ration';
  if (part === 'lines') return 'What is fed';
  if (part === 'waters') return 'What is drunk';
  if (part === 'waterIntake') return 'Water intake';
  const key = part.slice('cattle.'.length);
  return isCattleKey(key) ? cattleLabels[key] : part;
}

/** One side of a conflict as it would be read on the page, a line each. */
export function partText(values: RationValues, part: ConflictPart, nameOf: (feedstuffId: string) => string): string {
  if (part === 'name') return values.name;
  if (part === 'lines') {
    return (
      values.lines.map((line) => `${line.sharePctDm || '–'} % ${nameOf(line.feedstuffId)}`).join('\n') || 'no lines'
    );
  }
  if (part === 'waters') return values.waters.map((water) => `${water.sharePct || '–'} %`).join(', ') || 'no water';
  if (part === 'waterIntake') {
    const { kind, ...figures } = values.waterIntake;
    const typed = Object.values(figures).filter((text) => text !== '');
    return kind === 'unknown' ? 'not known' : [kind, ...typed].join(', ');
  }
  const key = part.slice('cattle.'.length);
  const text = isCattleKey(key) ? values.cattle[key] : '';
  return key === 'stage' ? stageText(text) : text === '' ? 'not stated' : text;
}
