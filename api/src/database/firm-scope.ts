import { type Model, type ModelStatic, Op, type Sequelize } from 'sequelize';
import type { CurrentUser } from '../common/current-user';

/** A query on a firm's rows that names no firm would show one firm's data to another: it is a fault of the program. */
export class FirmScopeMissing extends Error {
  constructor(model: string, act: string) {
    super(`${act} on ${model} names no firm: add firmId to the where clause`);
    this.name = 'FirmScopeMissing';
  }
}

/** The where part that keeps a query inside the person's firm. */
export const ofFirm = (user: Pick<CurrentUser, 'firmId'>) => ({ firmId: user.firmId });

/** The where part that keeps a query inside the yards the person is assigned to. */
export const ofYards = (user: Pick<CurrentUser, 'firmId' | 'yardIds'>) => ({
  firmId: user.firmId,
  yardId: [...user.yardIds],
});

/** Lets one query look across firms; the reason stands beside the query and is never used otherwise. */
export const acrossFirms = <Options extends object>(options: Options, reason: string) => ({
  ...options,
  acrossFirms: reason,
});

function namesFirm(where: unknown): boolean {
  if (Array.isArray(where)) return where.some(namesFirm);
  if (typeof where !== 'object' || where === null) return false;
  const clause = where as Record<PropertyKey, unknown>;
  // Sequelize asks for a `separate` include with the column's name instead of the attribute's.
  const firm = clause['firmId'] ?? clause['firm_id'];
  if (firm !== undefined && firm !== null) return true;
  return clause[Op.and] !== undefined && namesFirm(clause[Op.and]);
}

type Scoped = { where?: unknown; acrossFirms?: string };

const isFirmOwned = (model: ModelStatic<Model>) => 'firmId' in model.getAttributes();

function guard(model: ModelStatic<Model>, act: string, options: Scoped | undefined): void {
  if (!isFirmOwned(model) || options?.acrossFirms || namesFirm(options?.where)) return;
  throw new FirmScopeMissing(model.name, act);
}

/** A row that was read inside its firm may be written; one that was not carries no firm. */
function guardRow(row: Model, act: string): void {
  const model = row.constructor as ModelStatic<Model>;
  if (isFirmOwned(model) && row.get('firmId') === undefined) throw new FirmScopeMissing(model.name, act);
}

/** Refuses every find, count, sum, update and destroy on a firm's rows that names no firm. */
export function installFirmScope(sequelize: Sequelize): void {
  for (const model of Object.values(sequelize.models)) {
    model.addHook('beforeFind', 'firm-scope', (options) => guard(model, 'find', options as Scoped));
    model.addHook('beforeCount', 'firm-scope', (options) => guard(model, 'count', options as Scoped));
    model.addHook('beforeBulkUpdate', 'firm-scope', (options) => guard(model, 'update', options as Scoped));
    model.addHook('beforeBulkDestroy', 'firm-scope', (options) => guard(model, 'destroy', options as Scoped));
    model.addHook('beforeUpdate', 'firm-scope', (row) => guardRow(row, 'update'));
    model.addHook('beforeDestroy', 'firm-scope', (row) => guardRow(row, 'destroy'));
    // sum, max and min have no hook of their own.
    const aggregate = model.aggregate.bind(model);
    model.aggregate = ((...[attribute, fn, options]: Parameters<typeof aggregate>) => {
      guard(model, String(fn), options as Scoped);
      return aggregate(attribute, fn, options);
    }) as typeof model.aggregate;
  }
}
