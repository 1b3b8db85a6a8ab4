import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { MakingWeighingInput } from '../../src/schemas/making';
import { countedColumn, jsonColumn, measuredColumn, textColumn } from './columns';

/** What was left of a colour, and what had been worked in it by then. */
export class MakingWeighing extends Model<
  InferAttributes<MakingWeighing>,
  InferCreationAttributes<MakingWeighing>
> {
  declare id: string;
  declare blanketId: string;
  declare colour: string;
  declare leftG: number;
  declare resolutionG: number;
  declare made: MakingWeighingInput['made'];
  declare tails: number;
  /** Taken back; kept so that no device brings it up again. */
  declare gone: boolean;
  declare at: Date;
}

export function init(sequelize: Sequelize): void {
  MakingWeighing.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      blanketId: { type: DataTypes.UUID, primaryKey: true },
      colour: textColumn(),
      leftG: measuredColumn(),
      resolutionG: measuredColumn(),
      made: jsonColumn(),
      tails: countedColumn(),
      gone: { type: DataTypes.BOOLEAN, allowNull: false },
      at: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'making_weighings', underscored: true, timestamps: false },
  );
}
