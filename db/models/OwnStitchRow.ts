import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { OwnSymbol } from '../../src/lib/stitches/ownStitch';
import { countedColumn, editedColumns, idColumn, textColumn, uuidColumn } from './columns';

/** A stitch of one's own. Named a row because `OwnStitch` is the library's. */
export class OwnStitchRow extends Model<
  InferAttributes<OwnStitchRow>,
  InferCreationAttributes<OwnStitchRow>
> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare abbreviation: string;
  declare name: string;
  declare wraps: number;
  declare draws: number;
  declare throughs: number;
  declare heightOverWidth: number | null;
  declare takes: number;
  declare symbol: OwnSymbol | null;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  OwnStitchRow.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      abbreviation: textColumn(),
      name: textColumn(),
      wraps: countedColumn(),
      draws: countedColumn(),
      throughs: countedColumn(),
      heightOverWidth: DataTypes.DOUBLE,
      takes: countedColumn(),
      symbol: DataTypes.JSON,
      ...editedColumns(),
    },
    { sequelize, tableName: 'own_stitches', underscored: true },
  );
}
