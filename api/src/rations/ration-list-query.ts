import { Id, RationState } from '@brimgate/rules';
import * as v from 'valibot';
import { pageEntries } from '../common/page-query';

export const RationListQuery = v.strictObject({
  ...pageEntries,
  yardId: v.optional(Id),
  state: v.optional(RationState),
});
export type RationListQuery = v.InferOutput<typeof RationListQuery>;
