import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { MadeMotifInput } from '../../src/schemas/madeMotif';
import {
  countedColumn,
  editedColumns,
  idColumn,
  jsonColumn,
  textColumn,
  uuidColumn,
} from './columns';

/** A motif that was made and measured. Named a row because `MadeMotif` is the library's. */
export class MadeMotifRow extends Model<
  InferAttributes<MadeMotifRow>,
  InferCreationAttributes<MadeMotifRow>
> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare motifKey: string;
  declare motifVersion: number | null;
  /** A day, "2026-11-30". */
  declare madeOn: string;
  declare rounds: number;
  declare swatchId: string | null;
  declare weightCategory: MadeMotifInput['weightCategory'];
  declare putUpMassG: number | null;
  declare putUpLengthM: number | null;
  declare sizes: MadeMotifInput['sizes'];
  /** The four of a weight are filled together, or none. */
  declare weighedCount: number | null;
  declare weighedMassG: number | null;
  declare weighedResolutionG: number | null;
  declare weighedYarns: number | null;
  declare blocked: boolean;
  declare notes: string;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  MadeMotifRow.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      motifKey: textColumn(),
      motifVersion: DataTypes.INTEGER,
      madeOn: { type: DataTypes.DATEONLY, allowNull: false },
      rounds: countedColumn(),
      swatchId: DataTypes.UUID,
      weightCategory: countedColumn(),
      putUpMassG: DataTypes.DOUBLE,
      putUpLengthM: DataTypes.DOUBLE,
      sizes: jsonColumn(),
      weighedCount: DataTypes.INTEGER,
      weighedMassG: DataTypes.DOUBLE,
      weighedResolutionG: DataTypes.DOUBLE,
      weighedYarns: DataTypes.INTEGER,
      blocked: { type: DataTypes.BOOLEAN, allowNull: false },
      notes: textColumn(),
      ...editedColumns(),
    },
    { sequelize, tableName: 'made_motifs', underscored: true },
  );
}
