import { findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import { Composition, type FeedstuffInput } from '@brimgate/rules';
import * as v from 'valibot';
import type { FieldError } from '../common/domain-error';
import { InputInvalid } from '../common/request-errors';
import { fieldErrors } from '../common/valid.pipe';
import { mergedComposition } from './merged-composition';

/** Judges what a schema cannot: whether the book knows the feedstuff, and whether analysis and book fit together. */
export function checkFeedstuff(input: FeedstuffInput): void {
  const errors: FieldError[] = [];
  const book = input.bookFeedstuffId === null ? undefined : findFeedstuff(input.bookFeedstuffId);
  if (input.bookFeedstuffId !== null && book === undefined) {
    errors.push({ path: 'bookFeedstuffId', message: 'The book has no such feedstuff' });
  }
  if (Object.keys(input.analysed).length === 0) {
    errors.push({ path: 'analysed', message: 'Enter at least one analysed figure' });
  }
  const merged = v.safeParse(Composition, mergedComposition(book, input.analysed).composition);
  if (!merged.success) {
    errors.push(...fieldErrors(merged.issues).map(({ path, message }) => ({ path: `analysed.${path}`, message })));
  }
  if (errors.length > 0) throw new InputInvalid(errors);
}

export const nameTaken = () =>
  new InputInvalid([{ path: 'name', message: 'Another feedstuff of the firm has this name' }]);
