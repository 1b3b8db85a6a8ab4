import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { MotifRow } from './MotifRow';
import { patternColumns } from './patternColumns';

/** A motif as it was saved; never changed afterwards. */
export class MotifVersion extends Model<
  InferAttributes<MotifVersion>,
  InferCreationAttributes<MotifVersion>
> {
  declare motifId: string;
  declare version: number;
  declare name: string;
  declare text: string;
  declare terms: MotifRow['terms'];
  declare sides: MotifRow['sides'];
  declare size: number;
  declare stitches: MotifRow['stitches'];
  declare ring: MotifRow['ring'];
  declare rounds: MotifRow['rounds'];
  declare errors: number;
  declare warnings: number;
  declare savedAt: Date;
}

export function init(sequelize: Sequelize): void {
  MotifVersion.init(
    {
      motifId: { type: DataTypes.UUID, primaryKey: true },
      version: { type: DataTypes.INTEGER, primaryKey: true },
      ...patternColumns(),
      savedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'motif_versions', underscored: true, timestamps: false },
  );
}
