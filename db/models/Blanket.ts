import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { PlanInput } from '../../src/schemas/plan';
import {
  countedColumn,
  editedColumns,
  idColumn,
  jsonColumn,
  textColumn,
  uuidColumn,
} from './columns';
import type { BlanketColourLink } from './BlanketColourLink';

export class Blanket extends Model<InferAttributes<Blanket>, InferCreationAttributes<Blanket>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare title: string;
  declare plan: PlanInput;
  /** Which edition of the plan's schema wrote `plan`. */
  declare schemaVersion: number;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  /** Deleted, but can be restored. */
  declare deletedAt: CreationOptional<Date | null>;
  declare colourLinks?: NonAttribute<BlanketColourLink[]>;
}

export function init(sequelize: Sequelize): void {
  Blanket.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      title: textColumn(),
      plan: jsonColumn(),
      schemaVersion: countedColumn(),
      deletedAt: DataTypes.DATE,
      ...editedColumns(),
    },
    { sequelize, tableName: 'blankets', underscored: true },
  );
}
