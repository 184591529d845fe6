import * as v from 'valibot';
import coProduct from '../feedstuffs/co-product.2026-12.json';
import energy from '../feedstuffs/energy.2026-12.json';
import fat from '../feedstuffs/fat.2026-12.json';
import liquid from '../feedstuffs/liquid.2026-12.json';
import mineral from '../feedstuffs/mineral.2026-12.json';
import npn from '../feedstuffs/npn.2026-12.json';
import protein from '../feedstuffs/protein.2026-12.json';
import roughage from '../feedstuffs/roughage.2026-12.json';
import { FeedstuffTable, type BookFeedstuff } from './feedstuff.schema';

export type { BookFeedstuff, FeedstuffCategory, NutrientValue, OtherNutrientValue } from './feedstuff.schema';
export { compositionKeys, furtherNutrientKeys, nutrientKeys } from './nutrient-keys';
export type { CompositionKey, FurtherNutrientKey, NutrientKey } from './nutrient-keys';

/** Grain first, then what goes with it: the order in which a feeder thinks of a ration. */
export const feedstuffs: readonly BookFeedstuff[] = [
  energy,
  roughage,
  coProduct,
  protein,
  liquid,
  fat,
  npn,
  mineral,
].flatMap((table) => v.parse(FeedstuffTable, table).feedstuffs);

const byId: ReadonlyMap<string, BookFeedstuff> = new Map(feedstuffs.map((feedstuff) => [feedstuff.id, feedstuff]));

export function findFeedstuff(id: string): BookFeedstuff | undefined {
  return byId.get(id);
}
