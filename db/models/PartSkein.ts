import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { countedColumn, idColumn, measuredColumn, uuidColumn } from './columns';

/** An opened skein of a dye lot, by its weight. */
export class PartSkein extends Model<
  InferAttributes<PartSkein>,
  InferCreationAttributes<PartSkein>
> {
  declare id: CreationOptional<string>;
  declare dyeLotId: string;
  declare position: number;
  declare massG: number;
}

export function init(sequelize: Sequelize): void {
  PartSkein.init(
    { id: idColumn(), dyeLotId: uuidColumn(), position: countedColumn(), massG: measuredColumn() },
    { sequelize, tableName: 'part_skeins', underscored: true, timestamps: false },
  );
}
