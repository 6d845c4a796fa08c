import { DataTypes, type Attributes, type Model, type ModelAttributes, type ModelStatic, type Optional, type Sequelize } from 'sequelize';

/** A row of a table: its columns, and Sequelize's way to save them. `Given` names the columns that have a default. */
export type Row<Columns extends object, Given extends keyof Columns> = Model<Columns, Optional<Columns, Given>> & Columns;

type Declared<Columns extends object, Given extends keyof Columns> = ModelAttributes<Row<Columns, Given>, Attributes<Row<Columns, Given>>>;

/** Declares one table for Sequelize. Its real shape and constraints are in the migrations; names are snake_case there. */
export function table<Columns extends object, Given extends keyof Columns>(
  sequelize: Sequelize, name: string, columns: Declared<Columns, Given>,
): ModelStatic<Row<Columns, Given>> {
  // Sequelize writes each column's name into its declaration, so every column needs one of its own.
  const own = Object.entries(columns).map(([id, declared]) => [id, { ...(declared as object) }]);
  return sequelize.define<Row<Columns, Given>>(name, Object.fromEntries(own) as Declared<Columns, Given>, {
    tableName: name, underscored: true, timestamps: false,
  });
}

/** Kinds of columns. */
export const column = {
  id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
  uuid: { type: DataTypes.UUID },
  text: { type: DataTypes.TEXT },
  integer: { type: DataTypes.INTEGER },
  boolean: { type: DataTypes.BOOLEAN },
  bytes: { type: DataTypes.BLOB },
  json: { type: DataTypes.JSONB },
  texts: { type: DataTypes.ARRAY(DataTypes.TEXT) },
  time: { type: DataTypes.DATE },
  now: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
} as const;
