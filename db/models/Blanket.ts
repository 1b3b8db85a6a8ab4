import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { MakingOrder } from '../../src/lib/joining/makingOrder';
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
  /** In which order its motifs are made, and when that was last said. */
  declare makingOrder: CreationOptional<MakingOrder>;
  declare makingOrderAt: CreationOptional<Date | null>;
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
      makingOrder: { ...textColumn(), defaultValue: 'row-by-row' },
      makingOrderAt: DataTypes.DATE,
      deletedAt: DataTypes.DATE,
      ...editedColumns(),
    },
    { sequelize, tableName: 'blankets', underscored: true },
  );
}
