import type { Transaction } from 'sequelize';
import type { Intake } from '../models/intake';
import type { Models } from '../models/index';

/** An intake that must be there, because a link leads to it. @throws RangeError when it is not */
export async function readIntake(models: Models, id: string, transaction?: Transaction, lock = false): Promise<Intake> {
  const intake = await models.Intake.findByPk(id, transaction ? { transaction, ...(lock ? { lock: transaction.LOCK.UPDATE } : {}) } : {});
  if (!intake) throw new RangeError(`There is no intake ${id}`);
  return intake;
}
