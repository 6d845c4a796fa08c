import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { QuoteDocument } from '../../shared/quote';
import { readDocument } from './read-document';

export interface StoredQuote {
  readonly id: string;
  readonly intakeId: string;
  readonly document: QuoteDocument;
  readonly createdAt: Date;
  readonly withdrawnAt: Date | null;
}

type Row = Omit<StoredQuote, 'document'> & { readonly document: string };

const columns = 'id, intake_id AS "intakeId", document, created_at AS "createdAt", withdrawn_at AS "withdrawnAt"';

const read = (row: Row | undefined): StoredQuote | null => (row ? { ...row, document: readDocument(row) } : null);

/** A frozen quote by its id, withdrawn or not; null when there is none. */
export async function findQuote(sequelize: Sequelize, id: string, transaction?: Transaction): Promise<StoredQuote | null> {
  const [row] = await sequelize.query<Row>(`SELECT ${columns} FROM quotes WHERE id = $id`, { type: QueryTypes.SELECT, transaction: transaction ?? null, bind: { id } });
  return read(row);
}

/** A frozen quote that must be there. @throws RangeError when it is not */
export async function readQuote(sequelize: Sequelize, id: string, transaction?: Transaction): Promise<StoredQuote> {
  const quote = await findQuote(sequelize, id, transaction);
  if (!quote) throw new RangeError(`There is no quote ${id}`);
  return quote;
}

/** The quote of an intake that stands: of its paid deposit when there is one, else the one that is not withdrawn; null when neither is. */
export async function findStandingQuote(sequelize: Sequelize, intakeId: string, transaction?: Transaction): Promise<StoredQuote | null> {
  const [row] = await sequelize.query<Row>(
    `SELECT ${columns} FROM quotes
     WHERE id = coalesce((SELECT quote_id FROM deposits WHERE intake_id = $intakeId AND state = 'paid'),
                         (SELECT id FROM quotes WHERE intake_id = $intakeId AND withdrawn_at IS NULL))`,
    { type: QueryTypes.SELECT, transaction: transaction ?? null, bind: { intakeId } },
  );
  return read(row);
}
