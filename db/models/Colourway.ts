import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import { editedColumns, idColumn, textColumn, uuidColumn } from './columns';
import type { DyeLot } from './DyeLot';
import type { Yarn } from './Yarn';

export class Colourway extends Model<
  InferAttributes<Colourway>,
  InferCreationAttributes<Colourway>
> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare yarnId: string;
  declare name: string;
  declare hex: string;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  declare yarn?: NonAttribute<Yarn>;
  declare dyeLots?: NonAttribute<DyeLot[]>;
}

export function init(sequelize: Sequelize): void {
  Colourway.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      yarnId: uuidColumn(),
      name: textColumn(),
      hex: textColumn(),
      ...editedColumns(),
    },
    { sequelize, tableName: 'colourways', underscored: true },
  );
}
