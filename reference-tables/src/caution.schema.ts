import * as v from 'valibot';
import { ValueStatus } from './limit-table.schema';

/** A caution in four parts: the severity word, what is wrong, what follows, how to avoid it. */
export const Caution = v.strictObject({
  id: v.pipe(v.string(), v.regex(/^[a-z]+(-[a-z]+)*$/)),
  /** `danger` and `warning` are kept for harm to people. */
  severity: v.picklist(['danger', 'warning', 'caution', 'notice']),
  title: v.pipe(v.string(), v.nonEmpty()),
  whatIsWrong: v.pipe(v.string(), v.nonEmpty()),
  whatFollows: v.pipe(v.string(), v.nonEmpty()),
  howToAvoid: v.pipe(v.string(), v.nonEmpty()),
  status: ValueStatus,
  sourceIds: v.pipe(v.array(v.string()), v.minLength(1)),
});
export type Caution = v.InferOutput<typeof Caution>;

export const CautionTable = v.strictObject({
  subject: v.literal('cautions'),
  validFrom: v.pipe(v.string(), v.isoDate()),
  cautions: v.array(Caution),
});
export type CautionTable = v.InferOutput<typeof CautionTable>;
