import * as v from 'valibot';
import { Instant } from '../common/wire.schema';

export const WorkItemKind = v.picklist(['ration', 'review', 'advisory', 'lot']);

/** One thing that waits for the person. */
export const WorkItem = v.strictObject({
  kind: WorkItemKind,
  id: v.string(),
  title: v.string(),
  yard: v.string(),
  /** Why it waits: "Total sulfur 0.43 % of DM, limit 0.30". */
  detail: v.string(),
  /** Finding status of what waits, where it has one. */
  status: v.nullable(v.string()),
  since: Instant,
});
export type WorkItem = v.InferOutput<typeof WorkItem>;

export const WorkGroup = v.strictObject({
  key: v.picklist([
    'to-sign',
    'sent-back',
    'ready-to-release',
    'waiting-for-others',
    'drafts',
    'to-acknowledge',
    'mail-not-delivered',
    'lots-incomplete',
    'recently-released',
  ]),
  items: v.array(WorkItem),
  /** How many there are in all; the items are the newest of them. */
  total: v.number(),
});
export type WorkGroup = v.InferOutput<typeof WorkGroup>;

/** What waits for this person in their role, the most pressing first. */
export const WorkView = v.strictObject({ groups: v.array(WorkGroup) });
export type WorkView = v.InferOutput<typeof WorkView>;
