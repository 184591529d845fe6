import type { Model, ModelStatic, Transaction } from 'sequelize';
import { DomainError } from '../common/domain-error';

export class VersionStale extends DomainError {
  constructor(currentVersion: number) {
    super({
      status: 412,
      code: 'version-stale',
      title: 'Somebody saved this in the meantime: look at the newer version before you save again',
      currentVersion,
    });
  }
}

type Versioned = { firmId: number; id: number; version: number };

/**
 * Changes a row only if it still has the version the person saw, and counts the version up by one.
 * The one place where the version is compared: check and change are a single statement.
 */
export async function saveVersion(
  model: ModelStatic<Model>,
  { firmId, id, version }: Versioned,
  values: Readonly<Record<string, unknown>>,
  transaction: Transaction,
): Promise<number> {
  const next = version + 1;
  const [affectedRows] = await model.update(
    { ...values, version: next },
    { where: { firmId, id, version }, transaction },
  );
  if (affectedRows === 1) return next;
  const current = await model.findOne({ where: { firmId, id }, attributes: ['version'], transaction });
  throw new VersionStale(Number(current?.get('version') ?? 0));
}
