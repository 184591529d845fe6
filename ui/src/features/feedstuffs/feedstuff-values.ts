import { type FeedstuffView, FeedstuffInput, nutrientNames, type NutrientName } from '@brimgate/rules';
import type { Fault } from '../../lib/form/faults-to-form';
import { judged, type Judged, typedNumber } from '../../lib/form/judged';
import { textFromNumber } from '../../lib/form/number-text';
import { nutrients } from './nutrients';

/** An own feedstuff as it stands in its form: text as typed, an empty box for what was not analysed. */
export interface FeedstuffValues {
  name: string;
  bookFeedstuffId: string;
  analysedOn: string;
  laboratory: string;
  note: string;
  analysed: Record<NutrientName, string>;
}

const analysedText = (analysed: FeedstuffView['analysed']) =>
  Object.fromEntries(nutrientNames.map((name) => [name, textFromNumber(analysed?.[name])])) as Record<
    NutrientName,
    string
  >;

export const newFeedstuffValues = (): FeedstuffValues => ({
  name: '',
  bookFeedstuffId: '',
  analysedOn: '',
  laboratory: '',
  note: '',
  analysed: analysedText(null),
});

export const feedstuffValues = (feedstuff: FeedstuffView): FeedstuffValues => ({
  name: feedstuff.name,
  bookFeedstuffId: feedstuff.bookFeedstuffId ?? '',
  analysedOn: feedstuff.analysedOn ?? '',
  laboratory: feedstuff.laboratory ?? '',
  note: feedstuff.note ?? '',
  analysed: analysedText(feedstuff.analysed),
});

const textOrNull = (text: string): string | null => (text.trim() === '' ? null : text);

/** What would be sent: a nutrient whose box is empty was not analysed and stays absent, never 0. */
export function feedstuffInput(values: FeedstuffValues): Judged<FeedstuffInput> {
  const typed = nutrientNames.map((name) => [name, typedNumber(values.analysed[name])] as const);
  const input = judged(FeedstuffInput, {
    name: values.name,
    bookFeedstuffId: textOrNull(values.bookFeedstuffId),
    analysedOn: textOrNull(values.analysedOn),
    laboratory: textOrNull(values.laboratory),
    note: textOrNull(values.note),
    analysed: Object.fromEntries(typed.filter(([, value]) => value !== undefined)),
  });
  return input.isValid ? input : { isValid: false, faults: input.faults.map(withFigure) };
}

/** Twenty boxes look alike in a list of faults: the figure is named. */
function withFigure({ path, message }: Fault): Fault {
  const name = nutrientNames.find((nutrient) => path === `analysed.${nutrient}`);
  return { path, message: name ? `${nutrients[name].label}: ${message}` : message };
}
