import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { PlanInput } from '../../src/schemas/plan';
import { countedColumn, jsonColumn, textColumn } from './columns';

/** A blanket as it was saved; never changed afterwards. */
export class BlanketRevision extends Model<
  InferAttributes<BlanketRevision>,
  InferCreationAttributes<BlanketRevision>
> {
  declare blanketId: string;
  declare version: number;
  declare title: string;
  declare plan: PlanInput;
  declare schemaVersion: number;
  declare savedAt: Date;
}

export function init(sequelize: Sequelize): void {
  BlanketRevision.init(
    {
      blanketId: { type: DataTypes.UUID, primaryKey: true },
      version: { type: DataTypes.INTEGER, primaryKey: true },
      title: textColumn(),
      plan: jsonColumn(),
      schemaVersion: countedColumn(),
      savedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'blanket_revisions', underscored: true, timestamps: false },
  );
}
