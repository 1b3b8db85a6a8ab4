import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { countedColumn, idColumn, textColumn, uuidColumn } from './columns';

/** One measurement; the columns that are filled follow from its kind. */
export class SwatchMeasurement extends Model<
  InferAttributes<SwatchMeasurement>,
  InferCreationAttributes<SwatchMeasurement>
> {
  declare id: CreationOptional<string>;
  declare swatchId: string;
  declare position: number;
  /** A day, "2026-11-30". */
  declare measuredOn: string;
  declare kind: 'size' | 'weight' | 'length';
  declare widthMm: CreationOptional<number | null>;
  declare heightMm: CreationOptional<number | null>;
  declare blocked: CreationOptional<boolean | null>;
  declare massG: CreationOptional<number | null>;
  declare resolutionG: CreationOptional<number | null>;
  declare lengthM: CreationOptional<number | null>;
  declare errorM: CreationOptional<number | null>;
}

export function init(sequelize: Sequelize): void {
  SwatchMeasurement.init(
    {
      id: idColumn(),
      swatchId: uuidColumn(),
      position: countedColumn(),
      measuredOn: { type: DataTypes.DATEONLY, allowNull: false },
      kind: textColumn(),
      widthMm: DataTypes.DOUBLE,
      heightMm: DataTypes.DOUBLE,
      blocked: DataTypes.BOOLEAN,
      massG: DataTypes.DOUBLE,
      resolutionG: DataTypes.DOUBLE,
      lengthM: DataTypes.DOUBLE,
      errorM: DataTypes.DOUBLE,
    },
    { sequelize, tableName: 'swatch_measurements', underscored: true, timestamps: false },
  );
}
