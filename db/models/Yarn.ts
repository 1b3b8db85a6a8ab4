import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import {
  countedColumn,
  editedColumns,
  idColumn,
  measuredColumn,
  textColumn,
  uuidColumn,
} from './columns';
import type { Colourway } from './Colourway';

export class Yarn extends Model<InferAttributes<Yarn>, InferCreationAttributes<Yarn>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare name: string;
  declare maker: string;
  declare fibre: string;
  declare weightCategory: number;
  declare putUpMassG: number;
  declare putUpLengthM: number;
  /** Price of one skein and its currency: both or neither. */
  declare priceMinor: number | null;
  declare currency: string | null;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  declare colourways?: NonAttribute<Colourway[]>;
}

export function init(sequelize: Sequelize): void {
  Yarn.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      name: textColumn(),
      maker: textColumn(),
      fibre: textColumn(),
      weightCategory: countedColumn(),
      putUpMassG: measuredColumn(),
      putUpLengthM: measuredColumn(),
      priceMinor: DataTypes.INTEGER,
      currency: DataTypes.TEXT,
      ...editedColumns(),
    },
    { sequelize, tableName: 'yarns', underscored: true },
  );
}
