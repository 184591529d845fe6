import type { ReferenceTables } from '@brimgate/reference-tables';
import type { BoundedQuantity } from '../quantities/bounded-quantity';
import type { Diet } from '../rations/diet';
import type { ScreeningRequest } from '../screenings/screening-request.schema';

/** Everything a limit may be measured on. */
export interface Quantities extends Diet {
  /** Body weight of cattle that get added NPN; without a ceiling while it is not known whether they do. */
  readonly npnFedBodyWeightKg: BoundedQuantity;
  readonly nitrogenExcretedKgPerHead: BoundedQuantity;
  readonly phosphorusExcretedKgPerHead: BoundedQuantity;
}

export type QuantityName = keyof Quantities;

/** What a limit judges: the request, what was summed from it, and the tables of the edition. */
export interface LimitFacts {
  readonly request: ScreeningRequest;
  readonly quantities: Quantities;
  readonly tables: ReferenceTables;
}
