import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import { countedColumn, editedColumns, idColumn, textColumn, uuidColumn } from './columns';
import type { SwatchMeasurement } from './SwatchMeasurement';
import type { Yarn } from './Yarn';

export class Swatch extends Model<InferAttributes<Swatch>, InferCreationAttributes<Swatch>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare yarnId: string | null;
  declare name: string;
  /** US abbreviation. */
  declare stitch: string;
  declare stitches: number;
  declare rows: number;
  declare hookMm: number | null;
  declare notes: string;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  declare yarn?: NonAttribute<Yarn | null>;
  declare measurements?: NonAttribute<SwatchMeasurement[]>;
}

export function init(sequelize: Sequelize): void {
  Swatch.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      yarnId: DataTypes.UUID,
      name: textColumn(),
      stitch: textColumn(),
      stitches: countedColumn(),
      rows: countedColumn(),
      hookMm: DataTypes.DOUBLE,
      notes: textColumn(),
      ...editedColumns(),
    },
    { sequelize, tableName: 'swatches', underscored: true },
  );
}
