import { nutrientNames } from '@brimgate/rules';
import { type ConflictField, conflictFields } from '../../components/conflict-notice';
import type { FeedstuffValues } from './feedstuff-values';
import { nutrients } from './nutrients';

const labels = {
  name: 'Name',
  bookFeedstuffId: 'Rests on the book feedstuff',
  analysedOn: 'Analysed on',
  laboratory: 'Laboratory',
  note: 'Note',
};

const nutrientLabels = Object.fromEntries(
  nutrientNames.map((name) => [name, `${nutrients[name].label}, ${nutrients[name].unit}`]),
);

/** Where two forms of the same feedstuff differ, head first, then figure by figure. */
export const feedstuffConflicts = (mine: FeedstuffValues, theirs: FeedstuffValues): ConflictField[] => [
  ...conflictFields(labels, mine, theirs),
  ...conflictFields(nutrientLabels, mine.analysed, theirs.analysed),
];
