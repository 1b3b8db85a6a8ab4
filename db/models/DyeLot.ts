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
import type { Colourway } from './Colourway';
import type { PartSkein } from './PartSkein';

/** What a person has of one colourway in one dye lot. */
export class DyeLot extends Model<InferAttributes<DyeLot>, InferCreationAttributes<DyeLot>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare colourwayId: string;
  /** As printed on the band; empty when not known. */
  declare lotCode: string;
  declare location: string;
  declare pricePaidMinor: number | null;
  declare currency: string | null;
  declare wholeSkeins: number;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  declare colourway?: NonAttribute<Colourway>;
  declare partSkeins?: NonAttribute<PartSkein[]>;
}

export function init(sequelize: Sequelize): void {
  DyeLot.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      colourwayId: uuidColumn(),
      lotCode: textColumn(),
      location: textColumn(),
      pricePaidMinor: DataTypes.INTEGER,
      currency: DataTypes.TEXT,
      wholeSkeins: countedColumn(),
      ...editedColumns(),
    },
    { sequelize, tableName: 'dye_lots', underscored: true },
  );
}
